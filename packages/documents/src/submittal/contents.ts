import { Paragraph, TextRun, type FileChild } from 'docx'
import type { Captions } from '../docx/captions.ts'
import { asParagraphChildren, fieldBegin, fieldEnd, fieldRuns, tabRun, textRun } from '../docx/field.ts'
import { paragraph, type Headings } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { xmlElement } from '../docx/xml-element.ts'
import { pageToken } from '../pages/page-tokens.ts'

interface Entry {
  readonly text: string
  readonly style: 'TOC1' | 'TOC2' | 'TableofFigures'
  readonly anchor: string
}

/** A list as one field over its entries: each links to its place, and behind it stands the page where pages are known. */
const list = (instruction: string, entries: readonly Entry[], pages: boolean, width: number): Paragraph[] =>
  entries.map(
    ({ text, style, anchor }, index) =>
      new Paragraph({
        style,
        ...(pages ? { tabStops: [{ type: 'right', position: width, leader: 'dot' }] as const } : {}),
        children: asParagraphChildren([
          ...(index === 0 ? fieldBegin(instruction) : []),
          xmlElement('w:hyperlink', { 'w:anchor': anchor, 'w:history': '1' }, [
            textRun(text),
            ...(pages ? [tabRun(), ...fieldRuns(`PAGEREF ${anchor} \\h`, pageToken(anchor))] : []),
          ]),
          ...(index === entries.length - 1 ? [fieldEnd()] : []),
        ]),
      }),
  )

/**
 * Contents, tables and figures as fields with their entries written out, so that they are complete before any program
 * updates them and no program asks to. Written last, when every heading and caption is known.
 */
export const contents = (headings: Headings, captions: Captions, pages: boolean, width: number): FileChild[] => {
  const entries = headings.entries
    .filter((entry) => entry.level <= 2)
    .map(({ text, level, anchor }): Entry => ({ text, style: level === 1 ? 'TOC1' : 'TOC2', anchor }))
  const captioned = (label: 'Table' | 'Figure') =>
    captions.entries
      .filter((entry) => entry.label === label)
      .map(({ text, anchor }): Entry => ({ text, style: 'TableofFigures', anchor }))
  const without = (levels: string) => (pages ? '' : levels)
  return [
    new Paragraph({ style: 'TOCHeading', children: [new TextRun('Contents')] }),
    ...list(`TOC \\o "1-2" \\h${without(' \\n "1-2"')}`, entries, pages, width),
    ...(['Table', 'Figure'] as const).flatMap((label) => {
      const found = captioned(label)
      if (found.length === 0) return []
      return [
        paragraph(`${label}s`.toUpperCase(), STYLE.zone),
        ...list(`TOC \\h \\c "${label}"${without(' \\n')}`, found, pages, width),
      ]
    }),
  ]
}

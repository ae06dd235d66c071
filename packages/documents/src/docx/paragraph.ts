import { Bookmark, Paragraph, Tab, TextRun, type ParagraphChild } from 'docx'
import type { Box } from '@coldfill/formula'
import { displayEquation, inlineEquation } from './omml.ts'
import { plainText } from './plain-text.ts'
import { SOURCE_STYLE, STYLE } from './styles.ts'

type Style = (typeof STYLE)[keyof typeof STYLE] | 'Title' | 'Subtitle' | 'Caption' | 'Normal'

export const paragraph = (text: string, style: Style = 'Normal'): Paragraph =>
  new Paragraph({ style, children: [new TextRun(plainText(text))] })

/** A paragraph that stays on the page of what it leads to. */
export const leadIn = (text: string): Paragraph =>
  new Paragraph({ style: 'Normal', keepNext: true, children: [new TextRun(plainText(text))] })

/** A paragraph of words and fields, one after the other. */
export const runningText = (
  parts: readonly (string | readonly ParagraphChild[])[],
  style: Style = 'Normal',
): Paragraph =>
  new Paragraph({
    style,
    children: parts.flatMap((part) => (typeof part === 'string' ? [new TextRun(plainText(part))] : part)),
  })

/** A paragraph with some words in the built-in style Strong. */
export const strongThenText = (strong: string, text: string, style: Style = 'Normal'): Paragraph =>
  new Paragraph({
    style,
    children: [new TextRun({ text: plainText(strong), style: 'Strong' }), new TextRun(plainText(text))],
  })

/** A note behind its number, on a hanging indent. */
export const numberedNote = (number: string, text: string): Paragraph =>
  new Paragraph({
    style: STYLE.note,
    children: [new TextRun({ children: [plainText(number), new Tab(), plainText(text)] })],
  })

/** The name of a step, and behind it where its formula comes from. */
export const stepParagraph = (name: string, source: string): Paragraph =>
  new Paragraph({
    style: STYLE.step,
    children: [
      new TextRun({ text: plainText(name), style: 'Strong' }),
      new TextRun({ text: plainText(`   ${source}`), style: SOURCE_STYLE }),
    ],
  })

/** An equation and behind it, on the same line, what is said of it. */
export const equationThenText = (box: Box, text: string): Paragraph =>
  new Paragraph({ style: STYLE.equation, children: [inlineEquation(box), new TextRun(plainText(`   ${text}`))] })

export const equationParagraph = (box: Box, keepNext: boolean): Paragraph =>
  new Paragraph({
    style: STYLE.equation,
    keepNext,
    children: [displayEquation(box)],
  })

export interface HeadingEntry {
  readonly text: string
  readonly level: 1 | 2 | 3
  readonly anchor: string
}

/** Headings of a document with the anchors that its contents list points to. */
export class Headings {
  readonly entries: HeadingEntry[] = []

  heading(text: string, level: 1 | 2 | 3, newPage = false): Paragraph {
    const anchor = `_Toc${String(100_000 + this.entries.length)}`
    this.entries.push({ text: plainText(text), level, anchor })
    return new Paragraph({
      style: `Heading${level}`,
      ...(newPage ? { pageBreakBefore: true } : {}),
      children: [new Bookmark({ id: anchor, children: [new TextRun(plainText(text))] })],
    })
  }
}

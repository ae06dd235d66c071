import type { ProjectResult } from '@coldfill/sizing'
import { Document, Packer, type FileChild, type ISectionOptions } from 'docx'
import { fixedArchive } from '../archive/fixed-archive.ts'
import { dateOf, revisionWords, type DocumentOptions } from '../document-options.ts'
import { coverHeader, footer, header, pageProperties, textWidth, type Orientation } from '../docx/page.ts'
import { Headings } from '../docx/paragraph.ts'
import { plainText } from '../docx/plain-text.ts'
import { settled } from '../docx/settled-part.ts'
import { stylesXml } from '../docx/styles.ts'
import { Captions } from '../docx/table.ts'
import { scheduleWords } from '../schedules/schedule-words.ts'
import { assumptions } from './assumptions.ts'
import { calculations } from './calculations.ts'
import { cautions } from './cautions.ts'
import { contents } from './contents.ts'
import { cover } from './cover.ts'
import { findings } from './findings.ts'
import { schedules } from './schedules.ts'
import type { Section } from './section.ts'
import { sources } from './sources.ts'
import { summary } from './summary.ts'

/** The submittal as a .docx file. The same result and options give the same bytes. */
export const writeSubmittal = async (result: ProjectResult, options: DocumentOptions): Promise<Uint8Array> => {
  const { project } = result
  const { titleBlock } = options
  const headings = new Headings()
  const captions = new Captions()
  const shown = scheduleWords(result, options.units)
  const children = (orientation: Orientation, sections: readonly Section[]): FileChild[] =>
    sections.flatMap((section) =>
      section({ result, options, headings, captions, shown, width: textWidth(options, orientation) }),
    )
  const page = (orientation: Orientation, content: readonly FileChild[]): ISectionOptions => ({
    properties: pageProperties(options, orientation),
    headers: { default: header(project, options, orientation) },
    footers: { default: footer(options, orientation) },
    children: content,
  })

  const first = children('portrait', [cover])
  // The contents list stands before the headings it lists, so the body is written first.
  const overview = children('portrait', [summary])
  const body = [
    ...(result.vessels.length > 0 ? [page('landscape', children('landscape', [schedules]))] : []),
    page('portrait', children('portrait', [calculations, assumptions, findings, sources, cautions])),
  ].filter((section) => section.children.length > 0)
  const frontProperties = pageProperties(options, 'portrait')

  const author = plainText(titleBlock.preparedBy || titleBlock.office)
  const document = new Document({
    title: plainText(`${project.number} ${project.title}: submittal`),
    subject: 'Vessel schedules and calculations',
    creator: author,
    lastModifiedBy: author,
    keywords: plainText(`${project.number}, ${revisionWords(titleBlock.revision)}`),
    description: options.contentHash === undefined ? '' : `Content hash ${options.contentHash}`,
    revision: 1,
    customProperties: [
      { name: 'Revision', value: revisionWords(titleBlock.revision) },
      { name: 'Status', value: plainText(titleBlock.status) },
      { name: 'Units', value: options.units },
      { name: 'Engine', value: result.engine },
      ...(options.contentHash === undefined ? [] : [{ name: 'Content hash', value: options.contentHash }]),
    ],
    externalStyles: stylesXml,
    sections: [
      {
        properties: frontProperties,
        headers: { default: coverHeader(options) },
        footers: { default: footer(options, 'portrait') },
        children: first,
      },
      page('portrait', [...contents(headings), ...overview]),
      ...body,
    ],
  })
  const bytes = new Uint8Array(await Packer.toArrayBuffer(document))
  return fixedArchive(bytes, settled(dateOf(titleBlock)))
}

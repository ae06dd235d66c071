import type { ProjectResult } from '@coldfill/sizing'
import { Document, Packer, type FileChild, type ISectionOptions } from 'docx'
import { fixedArchive } from '../archive/fixed-archive.ts'
import { dateOf, revisionWords, type DocumentOptions } from '../document-options.ts'
import { coverHeader, footer, header, pageProperties, textWidth, type Orientation } from '../docx/page.ts'
import { Headings } from '../docx/paragraph.ts'
import { plainText } from '../docx/plain-text.ts'
import { ReviewComments } from '../docx/review-comments.ts'
import { settled } from '../docx/settled-part.ts'
import { stylesXml } from '../docx/styles.ts'
import { Captions } from '../docx/captions.ts'
import { withPages, type PageFinder } from '../pages/page-tokens.ts'
import { scheduleWords } from '../schedules/schedule-words.ts'
import { assumptions } from './assumptions.ts'
import { calculations } from './calculations.ts'
import { cautions } from './cautions.ts'
import { comparison } from './comparison.ts'
import { contents } from './contents.ts'
import { cover } from './cover.ts'
import { findings } from './findings.ts'
import { drawPictures, type Pictures } from './pictures.ts'
import { pressures } from './pressures.ts'
import { redlines } from './redlines.ts'
import { schedules } from './schedules.ts'
import type { Section } from './section.ts'
import { sources } from './sources.ts'
import { summary } from './summary.ts'
import { verification } from './verification.ts'

/** Every part of the submittal; page numbers stand as tokens where `pages` asks for them, and are left out elsewhere. */
const documentOf = (
  result: ProjectResult,
  options: DocumentOptions,
  pictures: Pictures,
  pages: boolean,
  comments: ReviewComments | null = null,
): Document => {
  const { project } = result
  const { titleBlock } = options
  const headings = new Headings()
  const captions = new Captions()
  const shown = scheduleWords(result, options.units)
  const children = (orientation: Orientation, sections: readonly Section[]): FileChild[] =>
    sections.flatMap((section) =>
      section({
        result,
        options,
        headings,
        captions,
        shown,
        pictures,
        comments,
        width: textWidth(options, orientation),
      }),
    )
  const page = (orientation: Orientation, content: readonly FileChild[]): ISectionOptions => ({
    properties: pageProperties(options, orientation),
    headers: { default: header(project, options, orientation) },
    footers: { default: footer(options, orientation) },
    children: content,
  })

  const first = children('portrait', [cover])
  // The contents list stands before the headings it lists, so the body is written first.
  const overview = children('portrait', [summary, comparison])
  const body = [
    ...(result.vessels.length > 0 ? [page('landscape', children('landscape', [schedules]))] : []),
    page(
      'portrait',
      children('portrait', [pressures, calculations, assumptions, findings, redlines, sources, cautions]),
    ),
    page('landscape', children('landscape', [verification])),
  ].filter((section) => section.children.length > 0)
  const frontProperties = pageProperties(options, 'portrait')

  const author = plainText(titleBlock.preparedBy || titleBlock.office)
  return new Document({
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
    ...(comments ? { comments: comments.options() } : {}),
    sections: [
      {
        properties: frontProperties,
        headers: { default: coverHeader(options) },
        footers: { default: footer(options, 'portrait') },
        children: first,
      },
      page('portrait', [...contents(headings, captions, pages, textWidth(options, 'portrait')), ...overview]),
      ...body,
    ],
  })
}

const packed = async (document: Document): Promise<Uint8Array> => new Uint8Array(await Packer.toArrayBuffer(document))

const archived = async (document: Document, options: DocumentOptions, pictures: Pictures): Promise<Uint8Array> => {
  const bytes = await packed(document)
  return fixedArchive(bytes, settled(dateOf(options.titleBlock)), await pictures.dots)
}

export interface SubmittalSurroundings {
  /**
   * Lays a .docx file out and says on which page each bookmark stands. With it the contents list has page numbers;
   * without it, or where it fails or leaves one out, the list has links and no numbers, for a guess could be wrong.
   */
  readonly findPages?: PageFinder | null
  /** Told why the numbers were left out although there is a finder. */
  readonly onNoPages?: (why: string) => void
}

/** Archive with the pages in the lists, or null where not all of them were found. */
const withFoundPages = async (
  result: ProjectResult,
  options: DocumentOptions,
  pictures: Pictures,
  findPages: PageFinder,
  onNoPages: (why: string) => void,
): Promise<Uint8Array | null> => {
  const bytes = await packed(documentOf(result, options, pictures, true))
  const settle = settled(dateOf(options.titleBlock))
  const dots = await pictures.dots
  const archive = (page: (anchor: string) => string) =>
    fixedArchive(
      bytes,
      (name, xml) => (name === 'word/document.xml' ? withPages(settle(name, xml), page) : settle(name, xml)),
      dots,
    )
  let pages: ReadonlyMap<string, number>
  try {
    // Two digits are what most numbers will take, so that the lists break as they will in the end.
    pages = await findPages(archive(() => '00'))
  } catch (error) {
    onNoPages(error instanceof Error ? error.message : String(error))
    return null
  }
  let missing = false
  const found = archive((anchor) => {
    const page = pages.get(anchor)
    missing ||= page === undefined
    return String(page ?? '')
  })
  if (missing) onNoPages('The page of a heading was not found.')
  return missing ? null : found
}

/** The submittal as a .docx file. The same result, options and page numbers give the same bytes. */
export const writeSubmittal = async (
  result: ProjectResult,
  options: DocumentOptions,
  { findPages, onNoPages = () => undefined }: SubmittalSurroundings = {},
): Promise<Uint8Array> => {
  const pictures = drawPictures(result, options)
  const numbered = findPages ? await withFoundPages(result, options, pictures, findPages, onNoPages) : null
  return numbered ?? archived(documentOf(result, options, pictures, false), options, pictures)
}

/**
 * The submittal as a review copy: the same content, each redline as a comment on its row, its answers below it, closed ones
 * resolved. Redlines on the spec, or on what is no longer there, stand at their row of the list of redlines.
 */
export const writeReviewCopy = async (result: ProjectResult, options: DocumentOptions): Promise<Uint8Array> => {
  const redlines = options.redlines ?? []
  const pictures = drawPictures(result, options)
  const comments = redlines.length > 0 ? new ReviewComments(redlines) : null
  return archived(documentOf(result, { ...options, redlines }, pictures, false, comments), options, pictures)
}

import {
  Footer,
  Header,
  PageNumber,
  PageOrientation,
  Paragraph,
  Tab,
  TextRun,
  type ISectionPropertiesOptions,
} from 'docx'
import { draftWarning, revisionWords, type DocumentOptions } from '../document-options.ts'
import { paperOf } from '../paper.ts'
import { plainText } from './plain-text.ts'
import { STYLE } from './styles.ts'

/** Twips. */
const PAPER = { Letter: { width: 12_240, height: 15_840 }, A4: { width: 11_906, height: 16_838 } } as const

const MARGIN = { left: 1300, right: 1100, top: 1300, bottom: 1150, header: 560, footer: 520 }
const LANDSCAPE_MARGIN = { left: 900, right: 900, top: 1300, bottom: 1000, header: 560, footer: 460 }

export type Orientation = 'portrait' | 'landscape'

/** Width of the text in twips. */
export const textWidth = (options: DocumentOptions, orientation: Orientation): number => {
  const paper = PAPER[paperOf(options)]
  return orientation === 'portrait'
    ? paper.width - MARGIN.left - MARGIN.right
    : paper.height - LANDSCAPE_MARGIN.left - LANDSCAPE_MARGIN.right
}

/** Page set-up of a section. The library swaps width and height of a landscape page itself. */
export const pageProperties = (
  options: DocumentOptions,
  orientation: Orientation,
  cover = false,
): ISectionPropertiesOptions => ({
  ...(cover ? { titlePage: true } : {}),
  page: {
    size: {
      ...PAPER[paperOf(options)],
      orientation: orientation === 'portrait' ? PageOrientation.PORTRAIT : PageOrientation.LANDSCAPE,
    },
    margin: orientation === 'portrait' ? MARGIN : LANDSCAPE_MARGIN,
  },
})

const draft = (options: DocumentOptions): Paragraph[] => {
  const warning = draftWarning(options.titleBlock)
  return warning === null ? [] : [new Paragraph({ style: STYLE.draft, children: [new TextRun(plainText(warning))] })]
}

/** Header of the cover: only what no page of a draft may be without. */
export const coverHeader = (options: DocumentOptions): Header => {
  const warning = draft(options)
  return new Header({ children: warning.length > 0 ? warning : [new Paragraph({})] })
}

export const header = (
  project: { number: string; title: string },
  options: DocumentOptions,
  orientation: Orientation,
): Header => {
  const { status, revision } = options.titleBlock
  return new Header({
    children: [
      ...draft(options),
      new Paragraph({
        style: 'Header',
        tabStops: [{ type: 'right', position: textWidth(options, orientation) }],
        children: [
          new TextRun({
            children: [
              plainText(`${project.number}  ${project.title}`),
              new Tab(),
              plainText(`${revisionWords(revision)}  ·  ${status}`),
            ],
          }),
        ],
      }),
    ],
  })
}

export const footer = (options: DocumentOptions, orientation: Orientation): Footer => {
  const { office, date } = options.titleBlock
  const width = textWidth(options, orientation)
  const hash = options.contentHash === undefined ? [] : [`content ${options.contentHash.slice(0, 16)}`]
  return new Footer({
    children: [
      new Paragraph({
        style: 'Footer',
        tabStops: [{ type: 'right', position: width }],
        children: [
          new TextRun({
            children: [
              plainText([office, date.slice(0, 10), ...hash].filter((part) => part !== '').join('  ·  ')),
              new Tab(),
              'Page ',
              PageNumber.CURRENT,
              ' of ',
              PageNumber.TOTAL_PAGES,
            ],
          }),
        ],
      }),
    ],
  })
}

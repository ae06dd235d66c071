import type { Alignment, Borders, Fill, Font, Row, Workbook, Worksheet } from 'exceljs'
import { draftWarning, revisionWords, type DocumentOptions } from '../document-options.ts'
import { lineWidth } from '../docx/letter-widths.ts'
import { paperOf } from '../paper.ts'
import { BODY_FONT, HAIR, INK, OCHRE, PENCIL, SHEET, WELL } from '../look.ts'
import { putCell } from './put-cell.ts'
import type { CellLook, SheetXml } from './sheet-xml.ts'

const argb = (rgb: string) => ({ argb: `FF${rgb}` })

export const font = (size: number, extra: Partial<Font> = {}, color = INK): Partial<Font> => ({
  name: BODY_FONT,
  size,
  color: argb(color),
  ...extra,
})

export const fill = (rgb: string): Fill => ({ type: 'pattern', pattern: 'solid', fgColor: argb(rgb) })
export const WELL_FILL = fill(WELL)
export const SHEET_FILL = fill(SHEET)

export const line = (rgb: string, style: 'thin' | 'medium' | 'hair' = 'thin') => ({ style, color: argb(rgb) })
export const HEAD_BORDERS: Partial<Borders> = { top: line(INK, 'medium'), bottom: line(INK, 'thin') }
export const ROW_BORDERS: Partial<Borders> = { bottom: line(HAIR, 'thin') }

/** Wrapped text with a little air beside it; numbers stand flush right under their head. */
export const wrapped = (
  horizontal: 'left' | 'right' | 'center' = 'left',
  vertical: 'top' | 'middle' | 'bottom' = 'middle',
): Partial<Alignment> => ({ horizontal, vertical, wrapText: true, ...(horizontal === 'left' ? { indent: 1 } : {}) })

/** A paper size code of the file format. */
const PAPER = { Letter: 1, A4: 9 } as const
/** Tabloid and A3. */
const LARGE_PAPER = { Letter: 3, A4: 8 } as const

/** User text inside a footer: `&` starts a code there. */
const footerText = (text: string, most: number): string =>
  text.replace(/\s+/g, ' ').slice(0, most).replaceAll('&', '&&')

export interface SheetOptions {
  readonly orientation: 'portrait' | 'landscape'
  /** Characters. */
  readonly widths: readonly number[]
}

/** Characters of all columns beyond which the usual page would set the type too small to read: then it takes the next larger. */
const WIDEST = 205

/** A sheet set up for the printer: fitted to the width, page x of y, project and revision in the footer. */
export const addSheet = (
  workbook: Workbook,
  name: string,
  project: { number: string; title: string },
  options: DocumentOptions,
  { orientation, widths }: SheetOptions,
): Worksheet => {
  const { titleBlock, contentHash } = options
  const wide = widths.reduce((sum, width) => sum + width, 0) > WIDEST
  const sheet = workbook.addWorksheet(name, {
    pageSetup: {
      paperSize: (wide ? LARGE_PAPER : PAPER)[paperOf(options)] as never,
      orientation,
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      margins: { left: 0.8, right: 0.4, top: 0.6, bottom: 0.7, header: 0.3, footer: 0.3 },
    },
    views: [{ showGridLines: false, zoomScale: 100 }],
  })
  const left = footerText(`${project.number} ${project.title}`, 60)
  const hash = contentHash === undefined ? '' : ` · ${contentHash.slice(0, 16)}`
  const middle = footerText(
    `${revisionWords(titleBlock.revision)} · ${titleBlock.status} · ${titleBlock.date.slice(0, 10)}${hash}`,
    90,
  )
  const small = `&"${BODY_FONT},Regular"&8`
  sheet.headerFooter.oddFooter = `&L${small} ${left}&C${small} ${middle}&R${small} Page &P of &N`
  const warning = draftWarning(titleBlock)
  if (warning !== null) sheet.headerFooter.oddHeader = `&C&"${BODY_FONT},Bold"&9 ${footerText(warning, 80)}`
  widths.forEach((width, index) => {
    sheet.getColumn(index + 1).width = width
  })
  return sheet
}

/** Title in A1 and one line of purpose in A2; below them a draft says that it is one. Returns the next free row. */
export const writeTitle = (sheet: Worksheet, title: string, purpose: string, options: DocumentOptions): number => {
  const [a1, a2, a3] = [sheet.getCell('A1'), sheet.getCell('A2'), sheet.getCell('A3')]
  putCell(a1, { text: title })
  a1.font = font(16, { bold: true })
  sheet.getRow(1).height = 24
  putCell(a2, { text: purpose })
  a2.font = font(9, {}, PENCIL)
  const warning = draftWarning(options.titleBlock)
  if (warning !== null) {
    putCell(a3, { text: warning })
    a3.font = font(9, { bold: true }, OCHRE)
  }
  return 5
}

const TITLE_LOOK: CellLook = { font: font(16, { bold: true }) }
const PURPOSE_LOOK: CellLook = { font: font(9, {}, PENCIL) }
const WARNING_LOOK: CellLook = { font: font(9, { bold: true }, OCHRE) }

/** The same title for a sheet that is written as text. */
export const writeTitleRows = (xml: SheetXml, title: string, purpose: string, options: DocumentOptions): number => {
  const warning = draftWarning(options.titleBlock)
  xml.row(1, 24, [{ content: { text: title }, look: TITLE_LOOK }])
  xml.row(2, null, [{ content: { text: purpose }, look: PURPOSE_LOOK }])
  if (warning !== null) xml.row(3, null, [{ content: { text: warning }, look: WARNING_LOOK }])
  return 5
}

/** Points of a character by which the widths of columns are counted, and of the indent and edges of a cell. */
export const CHARACTER = 5.25
export const CELL_EDGES = 10.75

/** Lines that a wrapped text takes in a column, so that a row can be given its height: no program fits it by itself on opening. */
const lines = (text: string, width: number, size: number): number => {
  const perLine = Math.max(1, (width * CHARACTER - CELL_EDGES) / size)
  // No letter is wider than an em, and most texts are short.
  if (text.length <= perLine && !text.includes('\n')) return 1
  const space = lineWidth(' ')
  return text.split('\n').reduce((all, part) => {
    if (lineWidth(part) * 1.06 <= perLine) return all + 1
    let [count, used] = [1, 0]
    for (const word of part.split(' ')) {
      // A little wider than regular type, for heads and first columns are bold.
      const length = lineWidth(word) * 1.06
      if (used === 0 || used + space + length <= perLine) used += length + (used > 0 ? space : 0)
      else {
        count += 1
        used = length
      }
      while (used > perLine) {
        count += 1
        used -= perLine
      }
    }
    return all + count
  }, 0)
}

/** Height of a row in points from the texts of its wrapped cells. */
export const rowHeight = (texts: readonly string[], widths: readonly number[], size: number): number => {
  const most = texts.reduce((height, text, index) => Math.max(height, lines(text, widths[index] ?? 10, size)), 1)
  return Math.max(15, most * (size * 1.28) + 4)
}

export const fitHeight = (row: Row, texts: readonly string[], widths: readonly number[], size: number): void => {
  row.height = rowHeight(texts, widths, size)
}

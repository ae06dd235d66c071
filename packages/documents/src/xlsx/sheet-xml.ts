import type { Alignment, Borders, Fill, Font, Style, Worksheet } from 'exceljs'
import { cellText } from './plain-text.ts'
import type { CellContent } from './put-cell.ts'

/** The look of a cell. Made once and shared: cells of one look hold the same object. */
export interface CellLook {
  readonly font: Partial<Font>
  readonly border?: Partial<Borders>
  readonly fill?: Fill
  readonly alignment?: Partial<Alignment>
}

const escaped = (text: string): string => (/[&<>"]/.test(text) ? replaced(text) : text)

const replaced = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')

/** The looks that the sheets of a workbook use, each with its number format. */
export class Palette {
  readonly #places = new Map<CellLook, Map<string, number>>()
  readonly styles: Partial<Style>[] = []

  /** Place of a look in the palette. */
  place(look: CellLook, format: string): number {
    const formats = this.#places.get(look) ?? new Map<string, number>()
    this.#places.set(look, formats)
    const known = formats.get(format)
    if (known !== undefined) return known
    const place = this.styles.length
    formats.set(format, place)
    this.styles.push({ ...look, ...(format === '' ? {} : { numFmt: format }) })
    return place
  }

  /** Puts one cell of each look into a sheet, from the first row of column A down, so that the library gives each a number. */
  writeInto(sheet: Worksheet): void {
    this.styles.forEach((style, index) => {
      const cell = sheet.getCell(index + 1, 1)
      cell.value = 0
      cell.style = style
    })
  }
}

/** Numbers that the library gave to the looks of a palette, from the sheet it was written into. */
export const paletteNumbers = (sheetXml: string): Map<string, string> =>
  new Map(
    [...sheetXml.matchAll(/<c r="A(\d+)"(?: s="(\d+)")?/g)].map(([, row, s]) => [String(Number(row) - 1), s ?? '0']),
  )

const contentXml = (content: CellContent, where: string): { type: string; inside: string } => {
  if ('formula' in content) {
    // oxlint-disable-next-line no-control-regex
    if (/^=|[\u0000-\u001f]/.test(content.formula)) throw new Error(`not a formula for a cell: ${content.formula}`)
    const formula = `<f>${escaped(content.formula)}</f>`
    if (typeof content.result === 'string') {
      return { type: ' t="str"', inside: `${formula}<v>${escaped(cellText(content.result))}</v>` }
    }
    return Number.isFinite(content.result)
      ? { type: '', inside: `${formula}<v>${content.result}</v>` }
      : { type: ' t="e"', inside: `${formula}<v>#NUM!</v>` }
  }
  if ('number' in content) {
    if (!Number.isFinite(content.number)) throw new Error(`${where} is given ${content.number}`)
    return { type: '', inside: `<v>${content.number}</v>` }
  }
  if (content.text === '') return { type: '', inside: '' }
  const words = cellText(content.text)
  // Only blanks at the ends, or more than one of them, need the mark: it is a tenth of a sheet.
  const space = /^\s|\s$|\s\s|[\n\t]/.test(words) ? ' xml:space="preserve"' : ''
  return { type: ' t="inlineStr"', inside: `<is><t${space}>${escaped(words)}</t></is>` }
}

const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ'

/**
 * Rows of a large sheet as the text of the file, written row by row from the top. A workbook of many sheets holds them so
 * in a tenth of the memory that cells of the library take. Looks stand as places in the palette until they have numbers.
 */
export class SheetXml {
  readonly #palette: Palette
  readonly #rows: string[] = []

  constructor(palette: Palette) {
    this.#palette = palette
  }

  /** `cells` from column A on, at most 26; null leaves one out. Height in points. */
  row(at: number, height: number | null, cells: readonly ({ content: CellContent; look: CellLook } | null)[]): void {
    const written = cells.map((cell, index) => {
      if (cell === null) return ''
      const address = `${LETTERS.charAt(index)}${at}`
      const { content, look } = cell
      const format = 'format' in content && content.format !== undefined ? content.format : ''
      const { type, inside } = contentXml(content, address)
      return `<c r="${address}" s="{${this.#palette.place(look, format)}}"${type}${inside === '' ? '/>' : `>${inside}</c>`}`
    })
    this.#rows.push(
      `<row r="${at}"${height === null ? '' : ` ht="${Math.round(height * 100) / 100}" customHeight="1"`}>${written.join('')}</row>`,
    )
  }

  /** The rows so far, as one text; this keeps none of them. */
  take(): string {
    return this.#rows.splice(0).join('')
  }
}

/** The part of a sheet with these rows in place of its own, their looks by the numbers of the palette. */
export const withRows = (
  sheetXml: string,
  rows: string,
  numbers: ReadonlyMap<string, string>,
  range: string,
): string => {
  const data = `<sheetData>${rows.replace(/ s="\{(\d+)\}"/g, (_, place: string) => ` s="${numbers.get(place) ?? '0'}"`)}</sheetData>`
  return sheetXml
    .replace(/<sheetData\/>|<sheetData>.*<\/sheetData>/s, () => data)
    .replace(/<dimension ref="[^"]*"\/>/, `<dimension ref="${range}"/>`)
}

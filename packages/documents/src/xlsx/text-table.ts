import type { Style, Worksheet } from 'exceljs'
import { tableName } from './sheet-names.ts'
import { putCell, type CellContent } from './put-cell.ts'
import { fitHeight, font, HEAD_BORDERS, ROW_BORDERS, WELL_FILL, wrapped } from './sheet.ts'

export interface SheetColumn {
  readonly heading: string
  readonly width: number
  readonly align?: 'left' | 'right' | 'center'
}

export interface SheetTable {
  readonly name: string
  readonly columns: readonly SheetColumn[]
  readonly rows: readonly (readonly CellContent[])[]
  /** Row of the head, counted from 1. */
  readonly at: number
  readonly size?: number
}

const textOf = (content: CellContent): string => ('text' in content ? content.text : '')

/** Looks of the cells of a column, one object a number format: the library is much quicker where cells share theirs. */
class ColumnLooks {
  readonly #look: Partial<Style>
  readonly #formats = new Map<string, Partial<Style>>()

  constructor(align: 'left' | 'right' | 'center', size: number, bold: boolean) {
    this.#look = { font: font(size, bold ? { bold } : {}), border: ROW_BORDERS, alignment: wrapped(align) }
  }

  of(format: string | undefined): Partial<Style> {
    const known = this.#formats.get(format ?? '')
    if (known) return known
    const look = format ? { ...this.#look, numFmt: format } : this.#look
    this.#formats.set(format ?? '', look)
    return look
  }
}

/**
 * A flat, marked-up table: one head row with unique names, a filter, nothing merged. Head and first column stay in view,
 * the head repeats on every printed page. Returns the row after the last.
 */
export const writeTable = (sheet: Worksheet, { name, columns, rows, at, size = 9 }: SheetTable): number => {
  const widths = columns.map((column) => column.width)
  if (rows.length > 0) {
    sheet.addTable({
      name: tableName(name),
      ref: `A${at}`,
      headerRow: true,
      // Without a style of the program's own: the cells carry the look.
      style: { theme: null as never, showRowStripes: false },
      columns: columns.map((column) => ({ name: column.heading, filterButton: true })),
      rows: rows.map((row) => row.map(() => null)),
    })
  }
  const head = sheet.getRow(at)
  columns.forEach((column, index) => {
    const cell = head.getCell(index + 1)
    putCell(cell, { text: column.heading })
    cell.font = font(size, { bold: true })
    cell.fill = WELL_FILL
    cell.border = HEAD_BORDERS
    cell.alignment = wrapped(column.align ?? 'left', 'top')
  })
  const headings = columns.map((column) => column.heading)
  fitHeight(head, headings, widths, size)
  // The filter button takes the lower right corner of a head cell: the words stand above it.
  head.height += 14
  const looks = columns.map((column, index) => new ColumnLooks(column.align ?? 'left', size, index === 0))
  rows.forEach((contents, offset) => {
    const row = sheet.getRow(at + 1 + offset)
    contents.forEach((content, index) => {
      const cell = row.getCell(index + 1)
      putCell(cell, content)
      cell.style = looks[index]?.of(cell.numFmt) ?? {}
    })
    fitHeight(row, contents.map(textOf), widths, size)
  })
  sheet.views = [{ state: 'frozen', xSplit: 1, ySplit: at, showGridLines: false, zoomScale: 100, activeCell: 'A1' }]
  sheet.pageSetup.printTitlesRow = `${at}:${at}`
  return at + 1 + rows.length
}

/** Prints from A1 to the last column of the table, down to `lastRow`. */
export const setPrintArea = (sheet: Worksheet, columns: number, lastRow: number): void => {
  sheet.pageSetup.printArea = `A1:${sheet.getColumn(columns).letter}${lastRow}`
}

import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import type { DocumentOptions } from '../document-options.ts'
import { longestWord } from '../docx/letter-widths.ts'
import { PENCIL } from '../look.ts'
import { headerText, type ScheduleTable } from '@coldfill/presentation'
import type { EntryCells } from './calculation-sheet.ts'
import { decimalsFormat, putCell, sheetReference, type CellContent } from './put-cell.ts'
import { addSheet, CELL_EDGES, CHARACTER, fitHeight, font, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

/** Where the numbers of a vessel stand: its calculation sheet, and the cell of each trace entry there. */
export interface VesselCells {
  readonly sheet: string
  readonly cells: EntryCells
}

/** Points of type in a table. */
const TYPE = 9

/** Characters of width in which no word of a text is broken: its longest word, the indent and the edges of a cell. */
const wordRoom = (text: string, bold: boolean): number =>
  Math.min(40, (longestWord(text, bold) * TYPE + CELL_EDGES) / CHARACTER)

/** One flat schedule of one kind of vessel; its numbers are live references to the calculation sheets. */
export const writeScheduleSheet = (
  workbook: Workbook,
  name: string,
  schedule: ScheduleTable,
  vessels: ReadonlyMap<string, VesselCells>,
  project: ProjectResult['project'],
  options: DocumentOptions,
): void => {
  const columns = schedule.columns.map((column) => ({
    heading: headerText(column),
    width: Math.max(
      column.align === 'right' ? column.width - 0.5 : column.width + 1,
      wordRoom(headerText(column), true),
      ...schedule.rows.map((row) => wordRoom(row.cells[column.key]?.text ?? '', column.key === 'mark')),
    ),
    align: column.align,
  }))
  const sheet = addSheet(workbook, name, project, options, {
    orientation: 'landscape',
    widths: columns.map((column) => column.width),
  })
  const section = project.specSections[schedule.kind]
  const purpose = section ? `Spec section ${section}. ${schedule.purpose}` : schedule.purpose
  const at = writeTitle(sheet, `${schedule.title} schedule`, purpose, options)

  const rows = schedule.rows.map((row) => {
    const found = vessels.get(`${row.system}/${row.mark}`)
    return schedule.columns.map((column): CellContent => {
      const cell = row.cells[column.key]
      if (!cell || cell.value === null) return { text: cell?.text ?? '' }
      const format = decimalsFormat(column.decimals ?? 0)
      const address = cell.entry === null ? undefined : found?.cells.get(cell.entry)
      if (!found || address === undefined) return { number: cell.value, format }
      return { formula: `${sheetReference(found.sheet)}!${address}`, result: cell.value, format }
    })
  })
  let next = writeTable(sheet, { name: `${schedule.title} schedule`, columns, rows, at })

  const widths = columns.map((column) => column.width)
  const total = widths.reduce((sum, width) => sum + width, 0)
  const note = (text: string, pencil = false) => {
    const cell = sheet.getCell(next, 1)
    putCell(cell, { text })
    cell.font = font(9, {}, ...(pencil ? [PENCIL] : []))
    // The text runs on over the empty cells to its right; it only needs a taller row where it is longer than the table.
    fitHeight(sheet.getRow(next), [text], [total], 9)
    next += 1
  }
  next += 1
  note('Numbers are live: they follow the calculation sheets. — does not apply; ? an input is missing.', true)
  for (const { number, text } of schedule.notes) note(`${number}  ${text}`)
  setPrintArea(sheet, columns.length, next - 1)
}

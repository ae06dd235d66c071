import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import type { DocumentOptions } from '../document-options.ts'
import { FROM_MEMORY, numberedSources } from '../words/source-words.ts'
import { addSheet, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

const COLUMNS = [
  { heading: 'No.', width: 7 },
  { heading: 'Publisher', width: 28 },
  { heading: 'Title', width: 70 },
  { heading: 'Edition', width: 50 },
]

/** Every publication cited, under the number it is cited by. */
export const writeSources = (
  workbook: Workbook,
  name: string,
  result: ProjectResult,
  options: DocumentOptions,
): void => {
  const sheet = addSheet(workbook, name, result.project, options, {
    orientation: 'landscape',
    widths: COLUMNS.map((column) => column.width),
  })
  const at = writeTitle(sheet, 'Sources', `Where a place is marked "from memory", read: ${FROM_MEMORY}.`, options)
  const next = writeTable(sheet, {
    name: 'Sources',
    columns: COLUMNS,
    at,
    rows: [...numberedSources(result).values()].map((source) =>
      [source.number, source.publisher || '—', source.title, source.edition || '—'].map((text) => ({ text })),
    ),
  })
  setPrintArea(sheet, COLUMNS.length, next)
}

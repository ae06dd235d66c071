import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import { revisionWords, type ChangedEntry, type DocumentOptions } from '../document-options.ts'
import { changedNumber, changedWords, changeInPercent, comparisonTitle } from '../words/change-words.ts'
import { significantFormat } from './number-format.ts'
import type { CellContent } from './put-cell.ts'
import { addSheet, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

const COLUMNS = [
  { heading: 'Mark', width: 14 },
  { heading: 'System', width: 14 },
  { heading: 'Δ', width: 7 },
  { heading: 'Result', width: 30 },
  { heading: 'Was', width: 16, align: 'right' as const },
  { heading: 'Now', width: 16, align: 'right' as const },
  { heading: 'Unit', width: 10 },
  { heading: 'Change', width: 12, align: 'right' as const },
]

/** Results that differ from the issue before this one, if there is one; the letter of this revision stands beside each. */
export const writeChanges = (
  workbook: Workbook,
  name: string,
  { project }: ProjectResult,
  options: DocumentOptions,
): void => {
  const { comparison } = options
  const changed = comparison?.changed ?? []
  const sheet = addSheet(workbook, name, project, options, {
    orientation: 'landscape',
    widths: COLUMNS.map((column) => column.width),
  })
  const at = writeTitle(
    sheet,
    comparison ? comparisonTitle(comparison.revision) : 'Revision changes',
    !comparison
      ? 'There is no issue before this one to compare with.'
      : changed.length === 0
        ? 'No result of any vessel differs.'
        : `Every result that differs, as of ${revisionWords(options.titleBlock.revision)}. What is not listed has not changed.`,
    options,
  )
  const side = (value: ChangedEntry['was'], kind: string): CellContent => {
    const number = changedNumber(value, kind, options.units)
    return number && Number.isFinite(number.value)
      ? { number: number.value, format: significantFormat(number.value, 4) }
      : { text: changedWords(value, kind, options.units) }
  }
  const next = writeTable(sheet, {
    name: 'Revision changes',
    columns: COLUMNS,
    at,
    rows: changed.map((entry) => [
      { text: entry.mark },
      { text: entry.system },
      { text: options.titleBlock.revision || '–' },
      { text: entry.name },
      side(entry.was, entry.kind),
      side(entry.now, entry.kind),
      {
        text:
          (changedNumber(entry.now, entry.kind, options.units) ?? changedNumber(entry.was, entry.kind, options.units))
            ?.unit ?? '',
      },
      { text: changeInPercent(entry) },
    ]),
  })
  setPrintArea(sheet, COLUMNS.length, next)
}

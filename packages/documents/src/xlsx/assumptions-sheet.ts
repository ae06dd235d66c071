import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import type { DocumentOptions } from '../document-options.ts'
import { changedBy } from '../words/assumption-words.ts'
import { citationWords } from '../words/source-words.ts'
import { sentenceCase } from '@coldfill/presentation'
import { addSheet, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

const COLUMNS = [
  { heading: 'No.', width: 6 },
  { heading: 'Assumption', width: 26 },
  { heading: 'Value', width: 14 },
  { heading: 'Default', width: 12 },
  { heading: 'Source', width: 34 },
  { heading: 'Why', width: 38 },
  { heading: 'Reason for the change', width: 24 },
  { heading: 'Changed by', width: 16 },
  { heading: 'Used by', width: 18 },
]

/** The numbered register of the defaults that the results lean on. */
export const writeAssumptions = (
  workbook: Workbook,
  name: string,
  result: ProjectResult,
  options: DocumentOptions,
): void => {
  const sheet = addSheet(workbook, name, result.project, options, {
    orientation: 'landscape',
    widths: COLUMNS.map((column) => column.width),
  })
  const at = writeTitle(
    sheet,
    'Assumptions',
    'Each stands in where the spec is silent, or was changed there with a reason. The numbers are those of the schedules.',
    options,
  )
  const next = writeTable(sheet, {
    name: 'Assumptions',
    columns: COLUMNS,
    at,
    rows: result.assumptions.map((assumption) =>
      [
        assumption.number,
        sentenceCase(assumption.name),
        assumption.value,
        assumption.defaultValue,
        citationWords(assumption.source, result),
        assumption.because,
        assumption.reason ?? '',
        changedBy(assumption, options),
        assumption.usedBy.join(', '),
      ].map((text) => ({ text })),
    ),
  })
  setPrintArea(sheet, COLUMNS.length, next)
}

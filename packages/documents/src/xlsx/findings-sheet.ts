import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import type { DocumentOptions } from '../document-options.ts'
import { pathWords } from '../words/path-words.ts'
import { findingWords, sentenceCase } from '@coldfill/presentation'
import { addSheet, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

const COLUMNS = [
  { heading: 'Code', width: 11 },
  { heading: 'Severity', width: 11 },
  { heading: 'Where', width: 34 },
  { heading: 'Finding', width: 46 },
  { heading: 'What to do', width: 40 },
  { heading: 'Accepted because', width: 30 },
]

/** What the checks found, and the reasons for which a person accepted a warning. */
export const writeFindings = (
  workbook: Workbook,
  name: string,
  result: ProjectResult,
  options: DocumentOptions,
): void => {
  const sheet = addSheet(workbook, name, result.project, options, {
    orientation: 'landscape',
    widths: COLUMNS.map((column) => column.width),
  })
  const { findings } = result
  const at = writeTitle(
    sheet,
    'Checks',
    findings.length === 0 ? 'No check found anything.' : 'What the checks of the spec and of the sizing found.',
    options,
  )
  const next = writeTable(sheet, {
    name: 'Checks',
    columns: COLUMNS,
    at,
    rows: findings.map((finding) => {
      const { message, hint } = findingWords(finding, options.units)
      return [
        finding.code,
        sentenceCase(finding.severity),
        pathWords(finding.path),
        message,
        hint,
        finding.accepted ?? '',
      ].map((text) => ({ text }))
    }),
  })
  setPrintArea(sheet, COLUMNS.length, next)
}

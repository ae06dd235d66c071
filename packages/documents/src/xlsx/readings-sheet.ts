import type { ProjectResult } from '@coldfill/sizing'
import { unitLabel } from '@coldfill/units'
import type { DataValidation, Style, Workbook, Worksheet } from 'exceljs'
import { displayNumber, sentenceCase } from '@coldfill/presentation'
import type { DocumentOptions } from '../document-options.ts'
import { RULE } from '../look.ts'
import { significantFormat } from './number-format.ts'
import { sheetReference, type CellContent } from './put-cell.ts'
import type { VesselCells } from './schedule-sheet.ts'
import { addSheet, line, SHEET_FILL, writeTitle } from './sheet.ts'
import { setPrintArea, writeTable } from './text-table.ts'

/** Results that somebody can read off a gauge on site. */
const READABLE = ['precharge', 'fill-pressure', 'cut-in-pressure'] as const

/** A reading is a gauge pressure between a full vacuum and far above any rating. */
const REACH = { US: [-15, 1000], SI: [-102, 7000] } as const

/** Water that freezes, and water hotter than any that is read by hand. */
const TEMPERATURES = { US: [0, 400], SI: [-20, 205] } as const

interface EntryColumn {
  readonly column: string
  readonly validation: DataValidation
}

const rule = (
  title: string,
  prompt: string,
  error: string,
  rest: Pick<DataValidation, 'type' | 'formulae'> & { operator?: 'between' | 'lessThanOrEqual' },
): DataValidation => ({
  allowBlank: true,
  showInputMessage: true,
  promptTitle: title,
  prompt,
  showErrorMessage: true,
  errorStyle: 'stop',
  errorTitle: title,
  error,
  ...rest,
})

const entryColumns = (options: DocumentOptions): EntryColumn[] => {
  const [least, most] = REACH[options.units]
  const [coldest, hottest] = TEMPERATURES[options.units]
  const pressure = unitLabel('gauge pressure', options.units)
  const temperature = unitLabel('temperature', options.units)
  return [
    {
      column: 'F',
      validation: rule(
        'Gauge reading',
        `The reading in ${pressure}, a number.`,
        `A number from ${least} to ${most} ${pressure} is expected.`,
        { type: 'decimal', operator: 'between', formulae: [least, most] },
      ),
    },
    {
      column: 'H',
      validation: rule(
        'Isolated and drained',
        'A precharge is only read on a vessel that is isolated and drained.',
        'Yes or No is expected.',
        { type: 'list', formulae: ['"Yes,No"'] },
      ),
    },
    {
      column: 'I',
      validation: rule(
        'Water temperature',
        `The water temperature beside the reading, in ${temperature}.`,
        `A number from ${coldest} to ${hottest} ${temperature} is expected.`,
        { type: 'decimal', operator: 'between', formulae: [coldest, hottest] },
      ),
    },
    {
      column: 'J',
      validation: rule('Date', 'The day of the reading.', 'A date is expected.', {
        type: 'date',
        operator: 'between',
        formulae: [new Date(Date.UTC(2000, 0, 1)), new Date(Date.UTC(2199, 11, 31))],
      }),
    },
    {
      column: 'K',
      validation: rule('Initials', 'Who read it, in at most five letters.', 'At most five letters are expected.', {
        type: 'textLength',
        operator: 'lessThanOrEqual',
        formulae: [5],
      }),
    },
    {
      column: 'L',
      validation: rule('Remarks', 'Anything that bears on the reading.', 'At most 500 letters are expected.', {
        type: 'textLength',
        operator: 'lessThanOrEqual',
        formulae: [500],
      }),
    },
  ]
}

/** Marks the cells that a person fills in: outlined, on a ground of their own, with a rule and a word of help. */
const openForEntry = (sheet: Worksheet, options: DocumentOptions, first: number, last: number): void => {
  const edge = line(RULE)
  for (const { column, validation } of entryColumns(options)) {
    const look: Partial<Style> = {
      ...sheet.getCell(`${column}${first}`).style,
      border: { top: edge, bottom: edge, left: edge, right: edge },
      fill: SHEET_FILL,
      ...(column === 'J' ? { numFmt: 'yyyy-mm-dd' } : {}),
    }
    for (let row = first; row <= last; row += 1) sheet.getCell(`${column}${row}`).style = look
    // The library takes rules by range; its types do not list this.
    const rules = (sheet as unknown as { dataValidations: { add(range: string, rule: DataValidation): void } })
      .dataValidations
    rules.add(`${column}${first}:${column}${last}`, validation)
  }
}

/** What is to be read on site, with cells to write it into. The row key finds the row again when the sheet comes back. */
export const writeReadings = (
  workbook: Workbook,
  name: string,
  result: ProjectResult,
  options: DocumentOptions,
  vessels: ReadonlyMap<string, VesselCells>,
): void => {
  const pressure = unitLabel('gauge pressure', options.units)
  const columns = [
    { heading: 'Mark', width: 11 },
    { heading: 'Serves', width: 20 },
    { heading: 'Location', width: 16 },
    { heading: 'Reading', width: 18 },
    { heading: `Required (${pressure})`, width: 11, align: 'right' as const },
    { heading: `Read (${pressure})`, width: 11, align: 'right' as const },
    { heading: `Read less required (${pressure})`, width: 12, align: 'right' as const },
    { heading: 'Isolated and drained', width: 11 },
    { heading: `Water temp. (${unitLabel('temperature', options.units)})`, width: 11, align: 'right' as const },
    { heading: 'Date', width: 12 },
    { heading: 'Initials', width: 10 },
    { heading: 'Remarks', width: 24 },
    { heading: 'Row key', width: 24 },
  ]
  const sheet = addSheet(workbook, name, result.project, options, {
    orientation: 'landscape',
    widths: columns.map((column) => column.width),
  })
  const at = writeTitle(
    sheet,
    'Readings',
    'For the field: write into the outlined cells. Isolate, depressurise and drain a vessel before its precharge is read.',
    options,
  )
  const rows: CellContent[][] = []
  for (const vessel of result.vessels) {
    const found = vessels.get(`${vessel.system}/${vessel.mark}`)
    for (const key of READABLE) {
      const value = vessel.results[key]
      // A number that is not finite becomes null where a result has been stored as JSON.
      if (value?.kind !== 'gauge pressure' || !Number.isFinite(value.value)) continue
      const number = displayNumber(value.value, value.kind, options.units)
      const format = significantFormat(number, 3)
      const address = found?.cells.get(value.entry)
      const row = at + 1 + rows.length
      rows.push([
        { text: vessel.mark },
        { text: vessel.serves },
        { text: vessel.location },
        { text: sentenceCase(value.name) },
        found && address !== undefined
          ? { formula: `${sheetReference(found.sheet)}!${address}`, result: number, format }
          : { number, format },
        { text: '' },
        { formula: `IF(ISNUMBER(F${row}),F${row}-E${row},"")`, result: '', format },
        ...Array.from({ length: 5 }, (): CellContent => ({ text: '' })),
        { text: `${vessel.system}/${vessel.mark}/${key}` },
      ])
    }
  }
  const next = writeTable(sheet, { name: 'Readings', columns, rows, at })
  if (rows.length > 0) openForEntry(sheet, options, at + 1, next - 1)
  setPrintArea(sheet, columns.length, next)
}

import type { Fluid } from '@coldfill/engine'
import { layout, toPlainText } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { Cell, Workbook } from 'exceljs'
import { methodChecks } from '../calculation/method-checks.ts'
import type { StepLine, VesselCalculation } from '../calculation/vessel-calculation.ts'
import type { DocumentOptions } from '../document-options.ts'
import { INK, PENCIL, RULE } from '../look.ts'
import { sentenceCase } from '../words/vessel-words.ts'
import { emitFormula } from './emit-formula.ts'
import type { FluidCells } from './fluid-data-sheet.ts'
import { FluidCalls } from './fluid-calls.ts'
import type { SharedInputs } from './shared-inputs.ts'
import { putCell, type CellContent } from './put-cell.ts'
import {
  addSheet,
  fitHeight,
  font,
  HEAD_BORDERS,
  line,
  ROW_BORDERS,
  SHEET_FILL,
  WELL_FILL,
  wrapped,
  writeTitle,
} from './sheet.ts'
import { inputFormat, significantFormat, stepFormat } from './number-format.ts'

type Vessel = ProjectResult['vessels'][number]

const COLUMNS = [
  { heading: 'Symbol', width: 9 },
  { heading: 'Name', width: 38 },
  { heading: 'Value', width: 15 },
  { heading: 'Unit', width: 12 },
  { heading: 'Formula', width: 44 },
  { heading: 'Source', width: 52 },
]
const WIDTHS = COLUMNS.map((column) => column.width)

/** Where a trace entry stands in the workbook. */
export type EntryCells = ReadonlyMap<string, string>

export interface CalculationSheet {
  readonly name: string
  readonly vessel: Vessel
  readonly calculation: VesselCalculation
  readonly fluid: Fluid
}

const symbolText = (symbol: string): string =>
  toPlainText(layout({ type: 'symbol', name: symbol, at: { start: 0, end: 0 } }))

/** Writes the calculation of one vessel; returns the address of each value by the id of its trace entry. */
export const writeCalculation = (
  workbook: Workbook,
  { name, vessel, calculation, fluid }: CalculationSheet,
  project: ProjectResult['project'],
  options: DocumentOptions,
  fluidCells: FluidCells,
  inputs: SharedInputs,
): EntryCells => {
  const sheet = addSheet(workbook, name, project, options, { orientation: 'landscape', widths: WIDTHS })
  const purpose =
    vessel.status === 'sized'
      ? `${vessel.methodTitle}. Outlined values are inputs: change one and the sheet follows.`
      : `No size: ${vessel.reason ?? ''}`
  const first = writeTitle(sheet, `${vessel.mark}  ${sentenceCase(vessel.kind)}, ${vessel.serves}`, purpose, options)
  const answers = new Set(Object.values(vessel.results).map((result) => result.entry))

  const row = (at: number, contents: readonly CellContent[]) => {
    contents.forEach((content, index) => {
      const cell = sheet.getCell(at, index + 1)
      putCell(cell, content)
      cell.font = font(9)
      cell.border = ROW_BORDERS
      cell.alignment = wrapped(index === 2 ? 'right' : 'left')
    })
    fitHeight(
      sheet.getRow(at),
      contents.map((content) => ('text' in content ? content.text : '')),
      WIDTHS,
      9,
    )
  }
  const heading = (at: number, text: string) => {
    const cell = sheet.getCell(at, 1)
    putCell(cell, { text })
    cell.font = font(9, { bold: true }, PENCIL)
    for (let column = 1; column <= COLUMNS.length; column += 1) sheet.getCell(at, column).border = { bottom: line(INK) }
    sheet.getRow(at).height = 20
    cell.alignment = { vertical: 'bottom' }
  }

  COLUMNS.forEach((column, index) => {
    const cell = sheet.getCell(first, index + 1)
    putCell(cell, { text: column.heading })
    cell.font = font(9, { bold: true })
    cell.fill = WELL_FILL
    cell.border = HEAD_BORDERS
    cell.alignment = wrapped(index === 2 ? 'right' : 'left', 'bottom')
  })

  // Rows are numbered before they are written: a fluid property stands below the steps that use it.
  const rowOf = new Map<string, number>()
  let at = first + 1
  for (const section of calculation.sections) {
    at += 1
    for (const { symbol } of section.lines) {
      rowOf.set(symbol, at)
      at += 1
    }
  }
  const checks = methodChecks(vessel, calculation, options.units)
  const checkRows = checks.length > 0 ? checks.length + 1 : 0
  const calls = new FluidCalls(fluid, fluidCells, calculation, options.units, at + checkRows + 1)
  const cellOf = (symbol: string): string => {
    const found = rowOf.get(symbol)
    if (found === undefined) throw new Error(`${vessel.mark}: ${symbol} is not in the trace`)
    return `$C$${found}`
  }
  const formulaOf = (step: StepLine): string =>
    emitFormula(step.inUnits, { symbol: cellOf, call: (tree, args) => calls.cell(tree, args) })

  const cells = new Map<string, string>()
  at = first + 1
  for (const section of calculation.sections) {
    heading(at, section.title)
    at += 1
    for (const current of section.lines) {
      const shared = current.is === 'input' ? inputs.find(current) : undefined
      const value: CellContent =
        current.is === 'step'
          ? { formula: formulaOf(current), result: current.value, format: stepFormat(current.value) }
          : shared
            ? { formula: shared.from(name), result: current.value, format: 'General' }
            : { number: current.value, format: inputFormat(current.value) }
      row(at, [
        { text: symbolText(current.symbol) },
        { text: sentenceCase(current.name) },
        value,
        { text: current.unit },
        { text: current.is === 'step' ? toPlainText(layout(current.inUnits, { functions: fluid.functions })) : '' },
        {
          text: current.is === 'input' && current.authored ? `${current.source} (${current.authored})` : current.source,
        },
      ])
      if (current.is === 'input' && !shared) {
        outline(sheet.getCell(at, 3))
        inputs.add(current, name, `$C$${at}`)
      }
      if (answers.has(current.id)) {
        for (const column of [1, 2, 3, 4]) sheet.getCell(at, column).font = font(9, { bold: true })
      }
      cells.set(current.id, `$C$${at}`)
      at += 1
    }
  }

  if (checks.length > 0) {
    heading(at, 'Checks of the method')
    at += 1
    for (const check of checks) {
      const condition = emitFormula(check.inUnits, { symbol: cellOf, call: (tree, args) => calls.cell(tree, args) })
      row(at, [
        { text: '' },
        { text: 'Condition' },
        { formula: `IF(${condition},"holds","does not hold")`, result: check.holds ? 'holds' : 'does not hold' },
        { text: '' },
        { text: toPlainText(layout(check.inUnits, { functions: fluid.functions })) },
        { text: `where it does not hold: ${check.message}` },
      ])
      at += 1
    }
  }

  if (calls.rows.length > 0) {
    heading(at, `Properties of ${fluid.label} used above, in SI units`)
    calls.rows.forEach((fluidRow, index) => {
      row(at + 1 + index, [
        { text: fluidRow.symbol },
        { text: sentenceCase(fluidRow.name) },
        { formula: fluidRow.formula, result: fluidRow.value, format: significantFormat(fluidRow.value, 8) },
        { text: fluidRow.unit },
        { text: `for ${fluidRow.of}` },
        { text: fluidRow.source },
      ])
    })
    at += calls.rows.length + 1
  }

  sheet.views = [{ state: 'frozen', xSplit: 0, ySplit: first, showGridLines: false, zoomScale: 100, activeCell: 'A1' }]
  sheet.pageSetup.printTitlesRow = `${first}:${first}`
  sheet.pageSetup.printArea = `A1:F${at - 1}`
  return cells
}

/** An input a reader may change. */
const outline = (cell: Cell): void => {
  const edge = line(RULE)
  cell.border = { top: edge, bottom: edge, left: edge, right: edge }
  cell.fill = SHEET_FILL
}

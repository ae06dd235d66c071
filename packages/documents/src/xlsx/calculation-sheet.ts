import type { Fluid } from '@coldfill/engine'
import { layout, toPlainText } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import { methodChecks } from '../calculation/method-checks.ts'
import type { StepLine, VesselCalculation } from '../calculation/vessel-calculation.ts'
import type { DocumentOptions } from '../document-options.ts'
import { INK, PENCIL, RULE } from '../look.ts'
import { sentenceCase } from '@coldfill/presentation'
import { emitFormula } from './emit-formula.ts'
import type { FluidCells } from './fluid-data-sheet.ts'
import { FluidCalls } from './fluid-calls.ts'
import type { SharedInputs } from './shared-inputs.ts'
import type { CellContent } from './put-cell.ts'
import {
  addSheet,
  font,
  HEAD_BORDERS,
  line,
  ROW_BORDERS,
  rowHeight,
  SHEET_FILL,
  WELL_FILL,
  wrapped,
  writeTitleRows,
} from './sheet.ts'
import { SheetXml, type CellLook, type Palette } from './sheet-xml.ts'
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

const TEXT: CellLook = { font: font(9), border: ROW_BORDERS, alignment: wrapped() }
const VALUE: CellLook = { ...TEXT, alignment: wrapped('right') }
const STRONG: CellLook = { ...TEXT, font: font(9, { bold: true }) }
const STRONG_VALUE: CellLook = { ...VALUE, font: font(9, { bold: true }) }
/** An input a reader may change. */
const EDGE = line(RULE)
const ENTRY: CellLook = {
  ...VALUE,
  border: { top: EDGE, bottom: EDGE, left: EDGE, right: EDGE },
  fill: SHEET_FILL,
}
const HEADING: CellLook = {
  font: font(9, { bold: true }, PENCIL),
  border: { bottom: line(INK) },
  alignment: { vertical: 'bottom' },
}
const HEAD: CellLook = {
  font: font(9, { bold: true }),
  fill: WELL_FILL,
  border: HEAD_BORDERS,
  alignment: wrapped('left', 'bottom'),
}
const HEAD_VALUE: CellLook = { ...HEAD, alignment: wrapped('right', 'bottom') }

export interface WrittenCalculation {
  readonly cells: EntryCells
  /** The rows of its sheet, as text of the file in UTF-8: outside the heap and a byte a letter. */
  readonly rows: Uint8Array
  readonly range: string
}

/** Writes the calculation of one vessel; says the address of each value by the id of its trace entry. */
export const writeCalculation = (
  workbook: Workbook,
  { name, vessel, calculation, fluid }: CalculationSheet,
  project: ProjectResult['project'],
  options: DocumentOptions,
  fluidCells: FluidCells,
  inputs: SharedInputs,
  palette: Palette,
): WrittenCalculation => {
  const sheet = addSheet(workbook, name, project, options, { orientation: 'landscape', widths: WIDTHS })
  const purpose =
    vessel.status === 'sized'
      ? `${vessel.methodTitle}. Outlined values are inputs: change one and the sheet follows.`
      : `No size: ${vessel.reason ?? ''}`
  const xml = new SheetXml(palette)
  const first = writeTitleRows(xml, `${vessel.mark}  ${sentenceCase(vessel.kind)}, ${vessel.serves}`, purpose, options)
  const answers = new Set(Object.values(vessel.results).map((result) => result.entry))

  const row = (at: number, contents: readonly CellContent[], strong = false, entry = false) => {
    const texts = contents.map((content) => ('text' in content ? content.text : ''))
    xml.row(
      at,
      rowHeight(texts, WIDTHS, 9),
      contents.map((content, index) => ({
        content,
        look: index === 2 ? (entry ? ENTRY : strong ? STRONG_VALUE : VALUE) : strong && index < 4 ? STRONG : TEXT,
      })),
    )
  }
  const heading = (at: number, text: string) => {
    xml.row(
      at,
      20,
      COLUMNS.map((_, index) => ({ content: { text: index === 0 ? text : '' }, look: HEADING })),
    )
  }

  xml.row(
    first,
    null,
    COLUMNS.map((column, index) => ({ content: { text: column.heading }, look: index === 2 ? HEAD_VALUE : HEAD })),
  )

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
      const entry = current.is === 'input' && !shared
      const contents = [
        { text: symbolText(current.symbol) },
        { text: sentenceCase(current.name) },
        value,
        { text: current.unit },
        { text: current.is === 'step' ? toPlainText(layout(current.inUnits, { functions: fluid.functions })) : '' },
        {
          text: current.is === 'input' && current.authored ? `${current.source} (${current.authored})` : current.source,
        },
      ]
      row(at, contents, answers.has(current.id), entry)
      if (current.is === 'input' && entry) inputs.add(current, name, `$C$${at}`)
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
        { text: `at ${fluidRow.at}` },
        { text: fluidRow.source },
      ])
    })
    at += calls.rows.length + 1
  }

  sheet.views = [{ state: 'frozen', xSplit: 0, ySplit: first, showGridLines: false, zoomScale: 100, activeCell: 'A1' }]
  sheet.pageSetup.printTitlesRow = `${first}:${first}`
  sheet.pageSetup.printArea = `A1:F${at - 1}`
  return { cells, rows: new TextEncoder().encode(xml.take()), range: `A1:F${at - 1}` }
}

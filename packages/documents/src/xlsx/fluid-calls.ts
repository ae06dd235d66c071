import type { Fluid, FluidFunctionName } from '@coldfill/engine'
import { compile, functionsInUnits, layout, toPlainText, type Tree } from '@coldfill/formula'
import { displayUnit, toSi, type Unit, type UnitSystem } from '@coldfill/units'
import type { VesselCalculation } from '../calculation/vessel-calculation.ts'
import type { FluidCells } from './fluid-data-sheet.ts'
import { fluidRows, type FluidRow } from './fluid-rows.ts'

type Call = Extract<Tree, { type: 'call' }>

export interface CallRow extends FluidRow {
  /** The property that the row leads to, as in `v_sat(t_h)`. */
  readonly of: string
}

/** A conversion number without the noise of its last digits. */
const plain = (value: number): string => {
  const short = Number(value.toPrecision(10))
  return String(Math.abs(short - value) <= 1e-13 * Math.abs(value) ? short : value)
}

/** Formula text of the SI number of a temperature shown in `unit`. */
const inKelvin = (text: string, { factor, offset }: Unit): string => {
  const shifted = `${text}+${plain(offset / factor)}`
  return factor === 1 ? shifted : `(${shifted})/${plain(1 / factor)}`
}

/**
 * The fluid properties that the formulas of a sheet ask for, each worked out once in rows of its own below the steps.
 * Formulas are in display units, the rows in SI.
 */
export class FluidCalls {
  readonly rows: CallRow[] = []
  readonly #cells = new Map<string, string>()
  readonly #fluid: Fluid
  readonly #data: FluidCells
  readonly #units: UnitSystem
  readonly #calculation: VesselCalculation
  readonly #firstRow: number

  /** Rows are written from `firstRow` on. */
  constructor(fluid: Fluid, data: FluidCells, calculation: VesselCalculation, units: UnitSystem, firstRow: number) {
    this.#fluid = fluid
    this.#data = data
    this.#units = units
    this.#calculation = calculation
    this.#firstRow = firstRow
  }

  /** Formula text of a call in display units, over arguments that are already emitted. */
  cell(call: Call, args: readonly string[]): string {
    const name = call.name as FluidFunctionName
    const property = this.#fluid.functions[name]
    const [argument] = args
    if (!property || argument === undefined) throw new Error(`no cells for the function ${call.name}`)
    const key = `${name}(${argument})`
    const known = this.#cells.get(key)
    if (known !== undefined) return known

    const from = this.#firstRow + this.rows.length
    const drafts = fluidRows(
      name,
      inKelvin(argument, displayUnit('temperature', this.#units)),
      this.#kelvin(call),
      this.#fluid,
      this.#data,
      (index) => `$C$${from + index}`,
    )
    const of = toPlainText(layout(call, { functions: this.#calculation.scope.functions }))
    this.rows.push(...drafts.map((draft) => ({ ...draft, of })))
    const last = `$C$${from + drafts.length - 1}`
    const { factor } = displayUnit(property.result, this.#units)
    const cell = factor === 1 ? last : `(${last}/${plain(factor)})`
    this.#cells.set(key, cell)
    return cell
  }

  #kelvin(call: Call): number {
    const argument = call.args[0]
    if (!argument) return Number.NaN
    const { scope, sections } = this.#calculation
    const values = Object.fromEntries(
      sections.flatMap((section) => section.lines.map((line) => [line.symbol, line.value])),
    )
    const shown = compile(argument, functionsInUnits(scope.functions, this.#units))(values)
    return toSi(shown, displayUnit('temperature', this.#units))
  }
}

import type { Fluid } from '@coldfill/engine'
import { compile, functionsInUnits, layout, toPlainText, type Tree } from '@coldfill/formula'
import { displayUnit, toSi, type Unit, type UnitSystem } from '@coldfill/units'
import type { VesselCalculation } from '../calculation/vessel-calculation.ts'
import type { FluidCells } from './fluid-data-sheet.ts'
import { propertyLaws } from './property-laws.ts'
import { within, type PropertyLaw } from './property-row.ts'

type Call = Extract<Tree, { type: 'call' }>

/** A row as it is written. */
export interface CallRow {
  readonly symbol: string
  readonly name: string
  readonly unit: string
  readonly source: string
  readonly formula: string
  /** Shown until a program recalculates. */
  readonly value: number
  /** The argument that the row holds for, as in `t_h`. */
  readonly at: string
}

/** The rows at one argument: each is written once, after those it needs. */
interface Block {
  readonly at: string
  readonly law: PropertyLaw
  readonly cells: Map<string, { readonly address: string; readonly value: number }>
}

/** A conversion number without the noise of its last digits. */
const plain = (value: number): string => {
  const short = Number(value.toPrecision(10))
  return String(Math.abs(short - value) <= 1e-13 * Math.abs(value) ? short : value)
}

const times = (text: string, factor: number): string => {
  if (factor === 1) return text
  return factor > 1 ? `${text}*${plain(factor)}` : `${text}/${plain(1 / factor)}`
}

const bracketed = (text: string): string => (/[-+*/^]/.test(text.slice(1)) ? `(${text})` : text)

/** Formula text, in SI units over `scale`, of a number shown in `unit`. */
const inSi = (text: string, { factor, offset }: Unit, scale: number): string =>
  offset === 0
    ? times(bracketed(text), factor / scale)
    : times(
        factor === scale ? `${text}+${plain(offset / factor)}` : `(${text}+${plain(offset / factor)})`,
        factor / scale,
      )

/** Formula text, in `unit`, of a cell that holds SI units. */
const shownIn = (cell: string, { factor, offset }: Unit): string => {
  const scaled = times(cell, 1 / factor)
  if (offset === 0) return factor === 1 ? cell : `(${scaled})`
  return `(${scaled}-${plain(offset / factor)})`
}

/**
 * The fluid properties that the formulas of a sheet ask for, each worked out once in rows of its own below the steps.
 * Formulas are in display units, the rows in SI.
 */
export class FluidCalls {
  readonly rows: CallRow[] = []
  #values: Readonly<Record<string, number>> | undefined
  readonly #blocks = new Map<string, Block>()
  readonly #laws: ReadonlyMap<string, PropertyLaw>
  readonly #units: UnitSystem
  readonly #calculation: VesselCalculation
  readonly #firstRow: number

  /** Rows are written from `firstRow` on. */
  constructor(fluid: Fluid, data: FluidCells, calculation: VesselCalculation, units: UnitSystem, firstRow: number) {
    this.#laws = propertyLaws(fluid, data)
    this.#units = units
    this.#calculation = calculation
    this.#firstRow = firstRow
  }

  /** Formula text of a call in display units, over arguments that are already emitted. */
  cell(call: Call, args: readonly string[]): string {
    const property = this.#calculation.scope.functions[call.name]
    const law = this.#laws.get(call.name)
    const [argument] = args
    if (!property || !law || argument === undefined) throw new Error(`no cells for the function ${call.name}`)
    const block = this.#block(call, argument, law)
    return shownIn(this.#need(block, law.property).address, displayUnit(property.result, this.#units))
  }

  #block(call: Call, text: string, law: PropertyLaw): Block {
    const { argument } = law
    const key = `${argument.symbol} ${argument.most} ${text}`
    const known = this.#blocks.get(key)
    if (known) return known
    const [tree] = call.args
    const kind = this.#calculation.scope.functions[call.name]?.parameters[0]
    if (!tree || !kind) throw new Error(`${call.name} takes one argument`)
    const unit = displayUnit(kind, this.#units)
    const { functions } = this.#calculation.scope
    const block: Block = { at: toPlainText(layout(tree, { functions })), law, cells: new Map() }
    this.#blocks.set(key, block)
    const converted = inSi(text, unit, argument.scale)
    this.#put(
      block,
      argument,
      within(converted, argument.least / argument.scale, argument.most / argument.scale),
      toSi(this.#shown(tree), unit) / argument.scale,
    )
    return block
  }

  /** The cell of a row of the block, written with all that it needs where it is not there yet. */
  #need(block: Block, symbol: string): { readonly address: string; readonly value: number } {
    const known = block.cells.get(symbol)
    if (known) return known
    const row = block.law.rows.find((candidate) => candidate.symbol === symbol)
    if (!row) throw new Error(`no row ${symbol} at ${block.at}`)
    const formula = row.formula((other) => this.#need(block, other).address)
    return this.#put(
      block,
      row,
      formula,
      row.value((other) => this.#need(block, other).value),
    )
  }

  #put(
    block: Block,
    { symbol, name, unit, source = 'definition' }: { symbol: string; name: string; unit: string; source?: string },
    formula: string,
    value: number,
  ): { readonly address: string; readonly value: number } {
    const cell = { address: `$C$${this.#firstRow + this.rows.length}`, value }
    this.rows.push({ symbol, name, unit, source, formula, value, at: block.at })
    block.cells.set(symbol, cell)
    return cell
  }

  /** Value of an argument in display units. */
  #shown(tree: Tree): number {
    const { scope, sections } = this.#calculation
    this.#values ??= Object.fromEntries(
      sections.flatMap((section) => section.lines.map((line) => [line.symbol, line.value])),
    )
    return compile(tree, functionsInUnits(scope.functions, this.#units))(this.#values)
  }
}

import type { Kind } from '@coldfill/units'

/**
 * A function a formula may call beside the built-in ones: a fluid property. It has the same faces as an operator:
 * its value and exact partial derivatives, its words and its drawing. The live spreadsheet face of each is written in packages/documents.
 */
export interface FormulaFunction {
  readonly name: string
  readonly parameters: readonly Kind[]
  readonly result: Kind
  /** Said before the arguments by a screen reader: `specific volume of the saturated liquid at`. */
  readonly words: string
  /** Drawn symbol with a subscript after `_`, as in `v_sat`. */
  readonly symbol: string
  /** Arguments and value in SI units. Outside its validity it returns NaN; the caller has checked validity first. */
  readonly evaluate: (...values: number[]) => number
  /** One partial derivative an argument, in SI units. */
  readonly partials: (...values: number[]) => readonly number[]
}

/** Names that formulas may use: symbols with their kinds, and functions beside the built-in ones. */
export interface Scope {
  readonly symbols: Readonly<Record<string, Kind>>
  readonly functions: Readonly<Record<string, FormulaFunction>>
}

import {
  equationBox,
  formulaTree,
  inUnits,
  layout,
  layoutSymbol,
  shownLine,
  toMathML,
  type Scope,
} from '@coldfill/formula'
import { displayUnit, formatQuantity, fromSi, unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import type { TraceEntry, TraceStep } from '#lib/sized-project.ts'
import { fluidFunctions } from './fluid-functions.ts'

export interface DrawnStep {
  /** MathML of the line in symbols: `V_e = V_s · e_n`. */
  readonly symbols: string
  /** MathML of the right side with its numbers put in, in the units shown. */
  readonly numbers: string
  /** The result as shown, with its unit. */
  readonly result: string
}

export const drawnSymbol = (symbol: string): string => toMathML(layoutSymbol(symbol))

/**
 * A step drawn in display units. The digits shown are enough that computing from them gives the shown result again.
 * Null where the formula cannot be drawn in these units; its text is then shown as it stands.
 */
export const drawStep = (step: TraceStep, entries: readonly TraceEntry[], units: UnitSystem): DrawnStep | null => {
  const inDisplay = (entry: { readonly kind: Kind; readonly value: number }) =>
    fromSi(entry.value, displayUnit(entry.kind, units))
  const scope: Scope = {
    symbols: Object.fromEntries(entries.map((entry) => [entry.symbol, entry.kind])),
    functions: fluidFunctions,
  }
  try {
    const tree = inUnits(formulaTree(step.formula), scope, units, step.kind)
    const values = Object.fromEntries(entries.map((entry) => [entry.symbol, inDisplay(entry)]))
    const line = shownLine({ tree, values, result: inDisplay(step) })
    const left = layoutSymbol(step.symbol)
    return {
      symbols: toMathML(equationBox(left, layout(line.tree, { functions: fluidFunctions })), { display: true }),
      numbers: toMathML(layout(line.tree, { numbers: line.numbers, functions: fluidFunctions }), { display: true }),
      result: `${line.result} ${unitLabel(step.kind, units)}`.trimEnd(),
    }
  } catch {
    return null
  }
}

export const shownValue = (entry: { readonly kind: Kind; readonly value: number }, units: UnitSystem): string =>
  formatQuantity(entry, units)

import { equationBox, functionsInUnits, layout, layoutSymbol, shownLine, type Box } from '@coldfill/formula'
import type { UnitSystem } from '@coldfill/units'
import type { StepLine, VesselCalculation } from './vessel-calculation.ts'

export interface StepEquations {
  /** `V_e = V_s · e_n` */
  readonly symbols: Box
  /** `V_e = 310.6 · 0.02811 = 8.73 gal` */
  readonly numbers: Box
}

const written = (text: string, unit: string): Box => ({
  box: 'row',
  items: [
    { box: 'number', text: text.replace(/^-/, '−') },
    ...(unit === '' ? [] : [{ box: 'word', text: `\u00A0${unit}` } as const]),
  ],
})

/**
 * A step as two drawn equations: in symbols, as its method has it, and with its numbers in the units shown. The digits of
 * the second are raised until they give the result that is shown.
 */
export const stepEquations = (step: StepLine, calculation: VesselCalculation, units: UnitSystem): StepEquations => {
  const { functions } = calculation.scope
  const left = layoutSymbol(step.symbol)
  const lines = calculation.sections.flatMap((section) => section.lines)
  const shown = shownLine({
    tree: step.inUnits,
    values: Object.fromEntries(lines.map((line) => [line.symbol, line.value])),
    result: step.value,
    functions: functionsInUnits(functions, units),
  })
  const result = Number.isFinite(step.value) ? written(shown.result, step.unit) : written('no finite value', '')
  const property = step.inUnits.type === 'call' && Object.hasOwn(functions, step.inUnits.name)
  // A property is looked up at a reading, so the reading keeps its unit; elsewhere units would only crowd the line.
  const numbers = property
    ? Object.fromEntries(
        Object.entries(shown.numbers).map(([symbol, number]) => [
          symbol,
          `${number} ${lines.find((line) => line.symbol === symbol)?.unit ?? ''}`.trimEnd(),
        ]),
      )
    : shown.numbers
  return {
    symbols: equationBox(left, layout(step.formula, { functions })),
    numbers:
      step.inUnits.type === 'symbol'
        ? equationBox(left, result)
        : equationBox(equationBox(left, layout(shown.tree, { numbers, functions })), result),
  }
}

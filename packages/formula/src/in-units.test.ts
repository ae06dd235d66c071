import { type Kind, type UnitSystem, displayUnit, fromSi } from '@coldfill/units'
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { differentiate } from './derivative.ts'
import { compile } from './evaluate.ts'
import { functionsInUnits, inUnits } from './in-units.ts'
import { layout } from './layout.ts'
import { formulaTree } from './parse.ts'
import { toPlainText } from './plain.ts'
import { bounded } from './testing/error-bound.ts'
import {
  displayValues,
  functions,
  randomFormula,
  randomKinds,
  randomValues,
  scope as randomScope,
} from './testing/random-formula.ts'

const symbols: Record<string, Kind> = {
  V: 'volume',
  V_s: 'volume',
  A: 'area',
  L: 'length',
  d: 'diameter',
  x: 'ratio',
  t_l: 'temperature',
  t_h: 'temperature',
  dt: 'temperature difference',
  alpha: 'per temperature difference',
  p_f: 'gauge pressure',
  p_max: 'gauge pressure',
  p_a: 'absolute pressure',
  P_1: 'absolute pressure',
  P_2: 'absolute pressure',
  dp: 'pressure difference',
  rho: 'density',
  h: 'length',
  Q: 'power',
  u: 'volume per power',
  v_l: 'specific volume',
  v_h: 'specific volume',
  q: 'flow',
  tau: 'time',
  c_p: 'specific heat',
}
const scope = { symbols, functions }
const drawn = (text: string, system: UnitSystem, kind?: Kind): string =>
  toPlainText(layout(inUnits(formulaTree(text), scope, system, kind), { functions }))

describe('where units cancel nothing appears, and where they do not a factor does', () => {
  it.each<[string, Kind | undefined, string, string]>([
    [
      'v_h / v_l - 1 - 3 * alpha * (t_h - t_l)',
      'ratio',
      'v_h / v_l − 1 − 3 · α · (t_h − t_l)',
      'v_h / v_l − 1 − 3 · α · (t_h − t_l)',
    ],
    ['V_s / (1 - P_1 / P_2)', 'volume', 'V_s / (1 − P_1 / P_2)', 'V_s / (1 − P_1 / P_2)'],
    ['absolute(p_f, p_a)', 'absolute pressure', 'p_f + p_a', 'p_f + p_a'],
    ['v_sat(t_h)', 'specific volume', 'v_sat(t_h)', 'v_sat(t_h)'],
    ['v_sat(t_h - 10[K])', 'specific volume', 'v_sat(t_h − 18)', 'v_sat(t_h − 10)'],
    ['Q * u', 'volume', 'Q · u', 'Q · u'],
    ['A * L', 'volume', '7.48052 · A · L', '1000 · A · L'],
    ['pi / 4 * d^2 * L', 'volume', 'π / 4 · d^2 · L / 19.25', 'π / 4 · d^2 · L / 1000'],
    ['V + A * L', 'volume', 'V + 7.48052 · A · L', 'V + 1000 · A · L'],
    ['A * L + V', 'volume', '7.48052 · A · L + V', '1000 · A · L + V'],
    ['rho * 9.80665[m/s2] * h', 'pressure difference', 'ρ · h / 144', '0.00980665 · ρ · h'],
    [
      'p_f + rho * 9.80665[m/s2] * h + 5[psi]',
      'gauge pressure',
      'p_f + ρ · h / 144 + 5',
      'p_f + 0.00980665 · ρ · h + 34.4738',
    ],
    ['max(3[gal], 0.02 * V_s)', 'volume', 'max(3, 0.02 · V_s)', 'max(11.3562, 0.02 · V_s)'],
    ['V - 3[L]', 'volume', 'V − 0.792516', 'V − 3'],
    ['3[L] - V', 'volume', '0.792516 − V', '3 − V'],
    ['t_l + dt', 'temperature', 't_l + dt', 't_l + dt'],
    ['t_l - 20[°C]', 'temperature difference', 't_l − 68', 't_l − 20'],
    ['celsius(t_l)', 'ratio', '(t_l − 32) / 1.8', 't_l'],
    ['fahrenheit(t_l)', 'ratio', 't_l', '1.8 · t_l + 32'],
    ['(1.8 * celsius(t_h) + 32)^x', 'ratio', 't_h^x', '(1.8 · t_h + 32)^x'],
    ['0.5 * fahrenheit(t_l) - 30', 'ratio', '0.5 · t_l − 30', '0.9 · t_l − 14'],
    [
      'x * (3.24 * celsius(t_h)^2 + 9 * celsius(t_h) - 2708.3)',
      'ratio',
      'x · ((t_h − 32)^2 + 5 · t_h − 2868.3)',
      'x · (3.24 · t_h^2 + 9 · t_h − 2708.3)',
    ],
    ['t_h > 60[°C]', undefined, 't_h > 140', 't_h > 60'],
    ['P_2 - P_1 >= 4[psi]', undefined, 'P_2 − P_1 ≥ 4', 'P_2 − P_1 ≥ 27.579'],
    ['q * tau', 'volume', 'q · τ', '60 · q · τ'],
    ['when(x > 1, V, A * L)', 'volume', 'when(x > 1, V, 7.48052 · A · L)', 'when(x > 1, V, 1000 · A · L)'],
  ])('%s', (text, kind, us, si) => expect([drawn(text, 'US', kind), drawn(text, 'SI', kind)]).toEqual([us, si]))
})

/** The value of a formula two ways: in SI and then converted, and rewritten for display numbers. */
const bothWays = (text: string, kind: Kind, values: Record<string, number>, system: UnitSystem) => {
  const tree = formulaTree(text)
  const unit = displayUnit(kind, system)
  const rewritten = compile(inUnits(tree, randomScope, system, kind), functionsInUnits(functions, system))
  const si = bounded(tree, values, functions)
  return {
    si,
    unit,
    converted: fromSi(compile(tree, functions)(values), unit),
    shown: rewritten(displayValues(values, system)),
  }
}
const formula = fc.constantFrom(...randomKinds).chain((kind) => randomFormula(kind, 3).map((text) => ({ kind, text })))

// 1e-12 of the value, and beside that only what cancellation within the formula makes of rounding (bounded in SI, and
// below 1e-10 of the value or the formula is left out), as for a temperature near the zero of its scale.
it.each(['US', 'SI'] as const)('gives for the numbers shown in %s what the SI formula gives', (system) => {
  fc.assert(
    fc.property(formula, randomValues, ({ kind, text }, values) => {
      const { si, unit, converted, shown } = bothWays(text, kind, values, system)
      fc.pre(!si.undecided && Number.isFinite(si.value) && si.error <= 1e-10 * Math.abs(si.value))
      const cancelled = (8 * si.error) / unit.factor
      expect(Math.abs(shown - converted)).toBeLessThanOrEqual(1e-12 * Math.abs(converted) + cancelled)
    }),
    { numRuns: 1000 },
  )
})

it('keeps the slope of functions in display units', () => {
  const wrapped = functionsInUnits(functions, 'US')
  const tree = formulaTree('v_sat(t)')
  const factor = 5 / 9 / displayUnit('specific volume', 'US').factor
  expect(differentiate(tree, wrapped)({ t: 220 }, { t: 1 }).derivative).toBeCloseTo(
    functions.v_sat!.partials(377.594444)[0]! * factor,
    12,
  )
})

// ASHRAE Handbook, HVAC Systems and Equipment, chapter on hydronic heating and cooling, expansion tank example, from
// memory: 3000 gal, 40 to 220 °F, 10 psig fill, 25 psig maximum, v 0.01602 and 0.01677 ft3/lb, alpha 6.5e-6 per °F,
// 14.7 psia at sea level; prints 578 gal for a plain steel tank and 344 gal for a diaphragm tank. Half a unit in the last digit.
describe('the handbook example', () => {
  const given: Record<string, number> = {
    V_s: 3000,
    t_l: 40,
    t_h: 220,
    v_l: 0.01602,
    v_h: 0.01677,
    alpha: 6.5e-6,
    p_f: 10,
    p_max: 25,
    p_a: 14.7,
  }
  const expansion = '(v_h / v_l - 1 - 3 * alpha * (t_h - t_l))'
  const diaphragm = `V_s * ${expansion} / (1 - absolute(p_f, p_a) / absolute(p_max, p_a))`
  const plain = `V_s * ${expansion} / (p_a / absolute(p_f, p_a) - p_a / absolute(p_max, p_a))`
  const inSi = Object.fromEntries(
    Object.entries(given).map(([name, value]) => {
      const { factor, offset } = displayUnit(symbols[name]!, 'US')
      return [name, value * factor + offset]
    }),
  )
  const { factor: gallon } = displayUnit('volume', 'US')
  it.each([
    ['diaphragm', diaphragm, 344],
    ['plain steel', plain, 578],
  ])('gives the printed size of the %s tank, in US units and in SI', (_, text, printed) => {
    const us = compile(inUnits(formulaTree(text), scope, 'US', 'volume'), {})(given)
    const si = compile(formulaTree(text), {})(inSi) / gallon
    expect(Math.abs(us - printed)).toBeLessThan(0.5)
    expect(Math.abs(si - printed)).toBeLessThan(0.5)
    expect(si).toBeCloseTo(us, 8)
  })
})

import type { Kind } from '@coldfill/units'
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkDimensions } from './dimensions.ts'
import { formulaTree } from './parse.ts'
import { randomFormula, randomKinds, scope as randomScope, functions } from './testing/random-formula.ts'

const symbols: Record<string, Kind> = {
  V: 'volume',
  L: 'length',
  d: 'diameter',
  n: 'count',
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
  g: 'acceleration',
  h: 'length',
  Q: 'power',
  v: 'specific volume',
}
const scope = { symbols, functions }
const problems = (text: string, expected?: Kind): string[] =>
  checkDimensions(formulaTree(text), scope, expected).problems.map(
    ({ message, at }) => `${at.start}-${at.end} ${message}`,
  )

describe('formulas that mean something', () => {
  it.each<[string, Kind | undefined]>([
    ['t_h - t_l', 'temperature difference'],
    ['t_l + dt', 'temperature'],
    ['dt + t_l', 'temperature'],
    ['t_l - 5[K]', 'temperature'],
    ['max(t_l, 4[°C])', 'temperature'],
    ['v_sat(t_h) / v_sat(t_l) - 1 - 3 * alpha * (t_h - t_l)', 'ratio'],
    ['p_max - p_f', 'pressure difference'],
    ['p_f + dp', 'gauge pressure'],
    ['p_f + rho * g * h', 'gauge pressure'],
    ['rho * g * h + p_f', 'gauge pressure'],
    ['0.9 * p_max', 'gauge pressure'],
    ['p_max * 0.9 / x', 'gauge pressure'],
    ['-p_f', 'gauge pressure'],
    ['max(0[psig], p_f)', 'gauge pressure'],
    ['absolute(p_f, p_a)', 'absolute pressure'],
    ['gauge(P_1 + dp, p_a)', 'gauge pressure'],
    ['P_2 - P_1', 'pressure difference'],
    ['P_1 - dp', 'absolute pressure'],
    ['P_1 * V / (V - 3[L])', 'absolute pressure'],
    ['P_1 / P_2', 'ratio'],
    ['V / (1 - P_1 / P_2)', 'volume'],
    ['rho * g * h', 'pressure difference'],
    ['rho * 9.80665[m/s2] * h', 'pressure difference'],
    ['pi / 4 * d^2 * L', 'volume'],
    ['sqrt(V / L)', 'diameter'],
    ['(V / L)^(1 / 2)', 'length'],
    ['n * x', 'count'],
    ['2^x', 'ratio'],
    ['when(P_2 > P_1, V, 0[L])', 'volume'],
    ['celsius(t_l) / 100', 'ratio'],
    ['1 / v', 'density'],
    ['P_2 > P_1', undefined],
    ['p_f <= 30[psig]', undefined],
    ['dp > 5[kPa]', undefined],
  ])('%s (%s)', (text, expected) => expect(problems(text, expected)).toEqual([]))
})

describe('mistakes, with their columns', () => {
  const reading =
    'A temperature reading cannot be multiplied or divided, as its zero is a convention; take a difference first.'
  const gauge =
    'A gauge pressure cannot be multiplied or divided here; write absolute(p, p_a), or take a difference first.'
  it.each<[string, Kind | undefined, string[]]>([
    ['V + L', undefined, ['0-5 A volume and a length cannot be added.']],
    ['x * (V - P_1)', undefined, ['5-12 An absolute pressure cannot be subtracted from a volume.']],
    ['t_h / t_l', undefined, [`0-9 ${reading}`]],
    ['3 * alpha * t_h', undefined, [`0-15 ${reading}`]],
    ['-t_h', undefined, [`0-4 ${reading}`]],
    ['t_h + t_l', undefined, ['0-9 Two temperature readings cannot be added; one of them must be a difference.']],
    ['dt - t_l', undefined, ['0-8 A temperature reading cannot be subtracted from a temperature difference.']],
    ['t_h - t_l', 'temperature', ['0-9 The formula gives a temperature difference, not a temperature reading.']],
    ['1 - p_f / p_max', undefined, [`4-15 ${gauge}`]],
    ['p_f / p_a', undefined, [`0-9 ${gauge}`]],
    ['p_f * V', undefined, [`0-7 ${gauge}`]],
    ['p_f^2', undefined, [`0-5 ${gauge}`]],
    [
      'p_f + p_max',
      undefined,
      ['0-11 Two gauge pressures cannot be added; one of them must be a pressure difference.'],
    ],
    [
      'P_1 + P_2',
      undefined,
      ['0-9 Two absolute pressures cannot be added; one of them must be a pressure difference.'],
    ],
    [
      'p_f + p_a',
      undefined,
      ['0-9 A gauge and an absolute pressure do not mix; write absolute(p, p_a) or gauge(P, p_a).'],
    ],
    [
      'P_1 - p_f',
      undefined,
      ['0-9 A gauge and an absolute pressure do not mix; write absolute(p, p_a) or gauge(P, p_a).'],
    ],
    ['dp - P_1', undefined, ['0-8 An absolute pressure cannot be subtracted from a pressure difference.']],
    ['rho * g * h', 'gauge pressure', ['0-11 The formula gives a pressure difference, not a gauge pressure.']],
    ['absolute(P_1, p_a)', undefined, ['9-12 absolute() takes a gauge pressure here, not an absolute pressure.']],
    ['v_sat(dt)', undefined, ['6-8 v_sat() takes a temperature reading here, not a temperature difference.']],
    ['v_sat(t_l, t_h)', undefined, ['0-15 v_sat() takes 1 value, not 2.']],
    ['exp(V)', undefined, ['4-5 exp() takes a pure number here, not a volume.']],
    ['2^L', undefined, ['2-3 An exponent is a pure number, not a length.']],
    ['V^x', undefined, ['2-3 The exponent of a quantity with a unit must be a fixed number.']],
    ['max(V, L, V)', undefined, ['7-8 A length stands beside a volume; both must be of one kind.']],
    ['p_f > P_1', undefined, ['6-9 An absolute pressure stands beside a gauge pressure; both must be of one kind.']],
    [
      'when(V, V, L)',
      undefined,
      [
        '5-6 when() takes a condition here, not a volume.',
        '11-12 A length stands beside a volume; both must be of one kind.',
      ],
    ],
    ['1 + (V > V)', undefined, ['0-11 A condition has no place in arithmetic; write when(condition, a, b).']],
    ['V > V', 'volume', ['0-5 The formula gives a condition, not a volume.']],
    ['V + nope + also', undefined, ['4-8 The symbol "nope" is not known.', '11-15 The symbol "also" is not known.']],
    ['tan(x)', undefined, ['0-6 The function "tan" is not known.']],
    ['sqrt(t_l)', undefined, ['0-9 sqrt() takes a quantity with a true zero, not a temperature reading.']],
    ['V * V', 'volume', ['0-5 The formula gives a quantity in m^6, not a volume.']],
  ])('%s', (text, expected, found) => expect(problems(text, expected)).toEqual(found))
})

it('accepts every random formula made by the rules', () => {
  const formula = fc
    .constantFrom(...randomKinds)
    .chain((kind) => randomFormula(kind, 3).map((text) => ({ kind, text })))
  fc.assert(
    fc.property(formula, ({ kind, text }) => {
      expect(checkDimensions(formulaTree(text), randomScope, kind).problems).toEqual([])
    }),
    { numRuns: 400 },
  )
})

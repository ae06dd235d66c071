import { type Kind, displayUnit, fromSi } from '@coldfill/units'
import * as fc from 'fast-check'
import type { FormulaFunction, Scope } from '../function.ts'

/** An invented liquid: smooth, and of the size of water. */
export const functions: Readonly<Record<string, FormulaFunction>> = {
  v_sat: {
    name: 'v_sat',
    parameters: ['temperature'],
    result: 'specific volume',
    words: 'specific volume of the saturated liquid at',
    symbol: 'v_sat',
    evaluate: (t) => 1e-3 * (1 + 4e-6 * (t - 277) ** 2),
    partials: (t) => [8e-9 * (t - 277)],
  },
  q_mix: {
    name: 'q_mix',
    parameters: ['volume', 'temperature difference'],
    result: 'energy',
    words: 'heat held by',
    symbol: 'Q',
    evaluate: (v, dt) => 4.18e6 * v * dt * (1 + 1e-3 * dt),
    partials: (v, dt) => [4.18e6 * dt * (1 + 1e-3 * dt), 4.18e6 * v * (1 + 2e-3 * dt)],
  },
}

/** A usual size of each kind in SI, between which random values are drawn. */
const RANGES: Partial<Record<Kind, readonly [number, number]>> = {
  ratio: [0.2, 3],
  volume: [0.05, 20],
  length: [1, 40],
  area: [0.1, 5],
  mass: [10, 2000],
  density: [900, 1100],
  'specific volume': [9e-4, 1.1e-3],
  temperature: [275, 400],
  'temperature difference': [2, 90],
  'per temperature difference': [5e-6, 3e-5],
  'gauge pressure': [2e4, 9e5],
  'absolute pressure': [8e4, 1e6],
  'pressure difference': [1e3, 2e5],
  power: [1e3, 1e6],
  'volume per power': [1e-6, 2e-5],
  flow: [1e-5, 1e-2],
  time: [60, 7200],
  energy: [1e6, 1e9],
  'specific heat': [3000, 4300],
  acceleration: [9, 10],
}
export const randomKinds = Object.keys(RANGES) as Kind[]

/** Two symbols a kind: `temperature` has `temperature_1` and `temperature_2`. */
const symbolOf = (kind: Kind, index: number): string => `${kind.replaceAll(' ', '_')}_${index}`
export const scope: Scope = {
  symbols: Object.fromEntries(randomKinds.flatMap((kind) => [1, 2].map((index) => [symbolOf(kind, index), kind]))),
  functions,
}

/** A value in SI for every symbol of the scope. */
export const randomValues: fc.Arbitrary<Record<string, number>> = fc.record(
  Object.fromEntries(
    Object.entries(scope.symbols).map(([name, kind]) => {
      const [min, max] = RANGES[kind]!
      return [name, fc.double({ min, max, noNaN: true })]
    }),
  ),
)

/** Right-hand sides by kind; a kind in angle brackets stands for any formula of that kind. */
const ANY = ['min(<>, <>)', 'max(<>, <>, <>)', 'when(<ratio> < <ratio>, <>, <>)', 'when(<> >= <>, <>, <>)']
const SCALED = ['<ratio> * <>', '<> / <ratio>', '<> * <ratio>', '<> * <ratio> / <ratio>']
const PLAIN = ['<> + <>', '<> - <>', '-<>', 'abs(<>)', ...SCALED]
const RULES: Partial<Record<Kind, readonly string[]>> = {
  ratio: [
    '2.5',
    '3',
    '0.04',
    '<volume> / <volume>',
    '<absolute pressure> / <absolute pressure>',
    '1 - <specific volume> / <specific volume>',
    '<per temperature difference> * <temperature difference>',
    '<density> * <specific volume>',
    '<ratio>^2',
    '<ratio>^3 / 100',
    'celsius(<temperature>) / 100',
    'fahrenheit(<temperature>) / 100',
    'sqrt(<volume> * <mass> / (<mass> * <volume>))',
    'exp(-<ratio>)',
    '<pressure difference> / <absolute pressure>',
    'ln(1 + (<volume> / <volume>)^2)',
    '10[%]',
    'pi / 4',
    '(<volume> / <volume>)^<ratio>',
    '<mass> * <specific volume> / <volume>',
  ],
  volume: [
    '<area> * <length>',
    '<mass> * <specific volume>',
    '<mass> / <density>',
    '<flow> * <time>',
    '<volume per power> * <power>',
    '3[L]',
    '12.5[gal]',
    '<length>^3',
    '<area>^1.5',
    '<energy> / <pressure difference>',
    'pi / 4 * <length>^2 * <length>',
    '<volume> - 2[L]',
    '5[gal] + <volume>',
    '<length> * (<area> + <length>^2)',
  ],
  length: [
    '<volume> / <area>',
    'sqrt(<area>)',
    '4[in]',
    '<pressure difference> / (<density> * 9.80665[m/s2])',
    '3.5[m]',
  ],
  area: ['<length>^2', '<volume> / <length>', '<length> * 2[ft]'],
  mass: ['<volume> * <density>', '<volume> / <specific volume>'],
  density: ['1 / <specific volume>', '<mass> / <volume>', '1 / v_sat(<temperature>)'],
  'specific volume': ['v_sat(<temperature>)', '1 / <density>', '<volume> / <mass>'],
  temperature: [
    '<temperature> + <temperature difference>',
    '<temperature> - <temperature difference>',
    '<temperature difference> + <temperature>',
    '20[°C]',
    '140[°F]',
    '<temperature> + 10[K]',
  ],
  'temperature difference': [
    '<temperature> - <temperature>',
    '10[K]',
    '18[Δ°F]',
    '<temperature> - 4[°C]',
    '200[°F] - <temperature>',
    '<energy> / (<mass> * <specific heat>)',
  ],
  'per temperature difference': ['6.5e-6[1/Δ°F]', '<ratio> / <temperature difference>'],
  'gauge pressure': [
    '<gauge pressure> + <pressure difference>',
    '<pressure difference> + <gauge pressure>',
    '<gauge pressure> - <pressure difference>',
    'gauge(<absolute pressure>, <absolute pressure>)',
    '12[psig]',
    '0.9 * <gauge pressure>',
    '1.5[bar g]',
  ],
  'absolute pressure': [
    'absolute(<gauge pressure>, <absolute pressure>)',
    '<absolute pressure> + <pressure difference>',
    '14.696[psia]',
    '<absolute pressure> * <volume> / <volume>',
    '101.325[kPa abs]',
  ],
  'pressure difference': [
    '<absolute pressure> - <absolute pressure>',
    '<gauge pressure> - <gauge pressure>',
    '<density> * 9.80665[m/s2] * <length>',
    '5[psi]',
    '<energy> / <volume>',
    '<acceleration> * <length> * <density>',
    '<gauge pressure> - 1[psig]',
  ],
  power: ['<energy> / <time>', '<volume> / <volume per power>'],
  flow: ['<volume> / <time>'],
  energy: [
    '<power> * <time>',
    '<mass> * <specific heat> * <temperature difference>',
    'q_mix(<volume>, <temperature difference>)',
    '<volume> * <pressure difference>',
  ],
}
const SORTED = new Set<Kind>(['temperature', 'gauge pressure', 'absolute pressure'])

/** A formula of the kind as text, which keeps every dimension rule. `smooth` leaves out min, max, when and abs. */
export const randomFormula = (kind: Kind, depth: number, smooth = false): fc.Arbitrary<string> => {
  const leaf = fc.constantFrom(symbolOf(kind, 1), symbolOf(kind, 2))
  if (depth === 0) return leaf
  const rules = [...(RULES[kind] ?? []), ...(SORTED.has(kind) ? [] : PLAIN), ...ANY].filter(
    (rule) => !smooth || !/min|max|when|abs\(/.test(rule),
  )
  const branch = fc.constantFrom(...rules).chain((rule) => {
    const parts = rule.split(/<([a-z ]*)>(?!=)/)
    const holes = parts.filter((_, index) => index % 2 === 1)
    return fc
      .tuple(...holes.map((hole) => randomFormula(hole === '' ? kind : (hole as Kind), depth - 1, smooth)))
      .map((inner) => parts.map((part, index) => (index % 2 === 1 ? `(${inner[(index - 1) / 2]!})` : part)).join(''))
  })
  return fc.oneof({ weight: 1, arbitrary: leaf }, { weight: 4, arbitrary: branch })
}

export const displayValues = (values: Readonly<Record<string, number>>, system: 'US' | 'SI'): Record<string, number> =>
  Object.fromEntries(
    Object.entries(values).map(([name, value]) => [name, fromSi(value, displayUnit(scope.symbols[name]!, system))]),
  )

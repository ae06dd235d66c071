import { describe, expect, it } from 'vitest'
import { compile } from './evaluate.ts'
import { MAX_FORMULA_DEPTH, formulaTree, parseFormula } from './parse.ts'
import { symbolsIn } from './symbols-in.ts'

const value = (text: string, values: Record<string, number> = {}): number => compile(formulaTree(text), {})(values)
const problems = (text: string): string[] => {
  const { tree, problems: found } = parseFormula(text)
  if (found.length > 0) expect(tree).toBeNull()
  return found.map(({ message, at }) => `${at.start}-${at.end} ${message}`)
}

describe('precedence, by the rules of ECMAScript and of algebra', () => {
  it.each([
    ['-2^2', -4],
    ['2^3^2', 512],
    ['2^-1', 0.5],
    ['-2^-2', -0.25],
    ['(-2)^2', 4],
    ['2 - 3 - 4', -5],
    ['2 - (3 - 4)', 3],
    ['12 / 3 / 2', 2],
    ['12 / (3 / 2)', 8],
    ['2 + 3 * 4', 14],
    ['-3 * -2', 6],
    ['--3', 3],
    ['+3', 3],
    ['1.5e3 + .5 + 2.', 1502.5],
    ['6.5e-6 * 1E6', 6.5],
  ])('%s is %d', (text, expected) => expect(value(text)).toBe(expected))

  it.each([
    ['1 < 2', 1],
    ['1 + 1 >= 3 - 1', 1],
    ['2 <= 1', 0],
    ['2 = 2', 1],
    ['2 > 2', 0],
    ['when(1 < 2, 5, 1 / 0)', 5],
    ['when(1 > 2, 5, 6)', 6],
    ['min(3, 1, 2) + max(3, 9)', 10],
    ['sqrt(9) + abs(-2) + exp(0) + ln(1) + log10(1000)', 9],
    ['ceil(1.2) + floor(1.8) + round(2.5) + round(-2.5)', 3],
    ['absolute(100, 50) - gauge(150, 50)', 50],
    ['celsius(273.15)', 0],
    ['round(fahrenheit(373.15))', 212],
  ])('%s is %d', (text, expected) => expect(value(text)).toBeCloseTo(expected, 12))

  it('knows pi, and does not ask for its value', () => {
    expect(value('pi / 4 * d^2', { d: 2 })).toBe(Math.PI)
    expect(symbolsIn(formulaTree('pi / 4 * d^2 + d - L_1'))).toEqual(['d', 'L_1'])
  })

  it('takes typeset signs and Greek letters as drawn', () => {
    expect(value('2·3 − 4 ÷ 2 × 1')).toBe(4)
    expect(value('3 ≥ 2')).toBe(1)
    expect(symbolsIn(formulaTree('α · Δt_h / ρ_c'))).toEqual(['alpha', 'Delta_t_h', 'rho_c'])
  })
})

describe('numbers with a unit', () => {
  it.each([
    ['3[L]', 0.003],
    ['1[m3/W]', 1],
    ['0.5[bar]', 50_000],
    ['0.5[bar g]', 50_000],
    ['1[bar abs]', 1e5],
    ['10[kPa]', 1e4],
    ['9.80665[m/s2]', 9.80665],
    ['20[°C]', 293.15],
    ['20[K]', 20],
    ['9[Δ°F]', 5],
    ['32[°F]', 273.15],
    ['5[%]', 0.05],
    ['1 [m³]', 1],
  ])('%s is %d in SI', (text, expected) => expect(value(text)).toBeCloseTo(expected, 12))

  it('holds the pound-force by definition: 14.696 psi are 101 325 Pa to the printed digits', () => {
    expect(Math.abs(value('14.696[psia]') / 101_325 - 1)).toBeLessThan(0.0005 / 14.696)
  })
})

describe('problems', () => {
  it.each([
    ['', ['0-0 The formula ends where a value is due.']],
    ['a +', ['3-3 The formula ends where a value is due.']],
    ['a * / b', ['4-5 A value is missing before "/".']],
    ['(a + b', ['0-1 This bracket is not closed.']],
    ['a + b)', ['5-6 Unexpected ")".']],
    ['2 a', ['2-3 An operator is missing here; a product is written with *.']],
    ['2^3 a', ['4-5 An operator is missing here; a product is written with *.']],
    ['3[qq] + 4[zz]', ['1-5 The unit "qq" is not known.', '9-13 The unit "zz" is not known.']],
    ['a[L]', ['1-4 A unit belongs behind a number.']],
    [
      'a ? b',
      [
        '2-3 The character "?" does not belong in a formula.',
        '4-5 An operator is missing here; a product is written with *.',
      ],
    ],
    ['a < b < c', ['6-7 Only two values can be compared at a time.']],
    ['sqrt(a, b)', ['0-10 sqrt() takes 1 value, not 2.']],
    ['min(a)', ['0-6 min() takes 2 or more values, not 1.']],
    ['1e999', ['0-5 The number 1e999 is too large.']],
  ])('%j', (text, expected) => expect(problems(text)).toEqual(expected))

  it('gives every node its columns, brackets included', () => {
    const { tree } = parseFormula(' (a + b) * -sin(c) ')
    expect(tree).toMatchObject({
      at: { start: 1, end: 18 },
      left: { at: { start: 2, end: 7 } },
      right: {
        at: { start: 11, end: 18 },
        operand: { at: { start: 12, end: 18 }, args: [{ at: { start: 16, end: 17 } }] },
      },
    })
  })

  it('refuses text that is too deep or too long, without throwing', () => {
    const nested = (levels: number): string => '('.repeat(levels) + '1' + ')'.repeat(levels)
    expect(problems(nested(MAX_FORMULA_DEPTH - 1))).toEqual([])
    expect(problems(nested(MAX_FORMULA_DEPTH))).toEqual(['64-65 The formula is nested deeper than 64 levels.'])
    expect(problems('-'.repeat(2000))).toHaveLength(1)
    expect(problems('1+'.repeat(1024) + '1')).toEqual(['0-2049 A formula may have 2048 characters; this one has 2049.'])
    expect(value('1+'.repeat(1000) + '1')).toBe(1001)
  })

  it('throws on a problem in a formula of the program, and at a symbol without a value', () => {
    expect(() => formulaTree('a +')).toThrow('column 4')
    expect(() => value('a')).toThrow('no value for "a"')
    expect(() => value('nothing(1)')).toThrow('unknown function')
  })
})

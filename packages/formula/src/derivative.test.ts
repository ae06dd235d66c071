import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { differentiate } from './derivative.ts'
import { compile } from './evaluate.ts'
import { formulaTree } from './parse.ts'
import { functions, randomFormula, randomKinds, randomValues } from './testing/random-formula.ts'
import { bounded } from './testing/error-bound.ts'
import { symbolsIn } from './symbols-in.ts'

const slope = (text: string, values: Record<string, number>, seeds: Record<string, number> = { x: 1 }) =>
  differentiate(formulaTree(text), functions)(values, seeds).derivative

describe('derivatives known in closed form', () => {
  it.each([
    ['x^3', 2, 12],
    ['2^x', 3, 8 * Math.LN2],
    ['x^x', 2, 4 * (Math.LN2 + 1)],
    ['1 / x', 4, -1 / 16],
    ['-x * x + 3', 5, -10],
    ['sqrt(x)', 16, 1 / 8],
    ['ln(x) + log10(x)', 2, 0.5 + 0.5 / Math.LN10],
    ['exp(2 * x)', 0, 2],
    ['abs(x)', -3, -1],
    ['min(x, 2 * x, 9)', 3, 1],
    ['max(x, 2 * x, 4)', 3, 2],
    ['max(x, 2 * x, 7)', 3, 0],
    ['when(x > 2, x^2, 5 * x)', 3, 6],
    ['when(x > 2, x^2, 5 * x)', 1, 5],
    ['x > 2', 3, 0],
    ['ceil(x) + floor(x) + round(x)', 3.3, 0],
    ['absolute(x, 3 * x) + gauge(x, 2 * x)', 3, 3],
    ['celsius(x) + fahrenheit(x)', 300, 2.8],
    ['pi * x', 1, Math.PI],
    ['v_sat(x)', 377, 8e-7],
  ])('%s at %d moves by %d', (text, x, expected) => expect(slope(text, { x })).toBeCloseTo(expected, 12))

  it('adds up the seeds of several symbols, and leaves out what does not move', () => {
    expect(slope('x * y', { x: 3, y: 5 }, { x: 1, y: 10 })).toBe(35)
    expect(slope('x + sqrt(y) + y^0.5', { x: 3, y: 0 })).toBe(1)
    expect(slope('q_mix(x, y)', { x: 2, y: 10 }, { y: 1 })).toBeCloseTo(4.18e6 * 2 * 1.02, 3)
  })
})

// Central differences with h = x · 2^-17 err by about h² f''' / 6 (1e-10 of the scale of the formula) and by rounding / h.
it('agrees with central differences for random formulas', () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...randomKinds).chain((kind) => randomFormula(kind, 3, true)),
      randomValues,
      (text, values) => {
        const tree = formulaTree(text)
        const value = compile(tree, functions)
        const exact = differentiate(tree, functions)
        for (const symbol of symbolsIn(tree)) {
          const x = values[symbol]!
          const h = x * 2 ** -17
          const [low, high] = [x - h, x + h].map((moved) => bounded(tree, { ...values, [symbol]: moved }, functions))
          const numeric = (high!.value - low!.value) / (2 * h)
          const { value: at, derivative } = exact(values, { [symbol]: 1 })
          expect(at).toBe(value(values))
          const curvature =
            (differentiate(tree, functions)({ ...values, [symbol]: x + h }, { [symbol]: 1 }).derivative - derivative) /
            h
          const rounding = (high!.error + low!.error) / h
          fc.pre(
            Number.isFinite(curvature) &&
              Number.isFinite(rounding) &&
              Number.isFinite(numeric) &&
              Math.abs(curvature * x) < 1e2 * Math.abs(derivative),
          )
          const tolerance = 1e-6 * Math.abs(derivative) + rounding
          expect(Math.abs(derivative - numeric)).toBeLessThanOrEqual(tolerance)
        }
      },
    ),
    { numRuns: 400 },
  )
})

it('evaluates random formulas as a plain recursive evaluator does', () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...randomKinds).chain((kind) => randomFormula(kind, 3)),
      randomValues,
      (text, values) => {
        const tree = formulaTree(text)
        const { value, error, undecided } = bounded(tree, values, functions)
        fc.pre(!undecided && Number.isFinite(value) && Number.isFinite(error))
        expect(Math.abs(compile(tree, functions)(values) - value)).toBeLessThanOrEqual(error)
      },
    ),
    { numRuns: 400 },
  )
})

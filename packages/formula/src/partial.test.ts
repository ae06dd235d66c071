import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { differentiate } from './derivative.ts'
import { formulaTree } from './parse.ts'
import { partial } from './partial.ts'
import { symbolsIn } from './symbols-in.ts'
import { functions, randomFormula, randomKinds, randomValues } from './testing/random-formula.ts'

describe('partial derivatives', () => {
  it.each([
    ['x^3', 2, 12],
    ['2^x', 3, 8 * Math.LN2],
    ['1 / x', 4, -1 / 16],
    ['max(x, 2 * x, 4)', 3, 2],
    ['max(x, 2 * x, 7)', 3, 0],
    ['when(x > 2, x^2, 5 * x)', 1, 5],
    ['absolute(x, 3 * x) - gauge(x, 2 * x)', 3, 5],
    ['sqrt(x) + 7', 16, 1 / 8],
  ])('%s at %d moves by %d', (text, x, expected) => {
    expect(partial(formulaTree(text), 'x', functions)?.({ x }) ?? 0).toBeCloseTo(expected, 12)
  })

  it('are nothing where the symbol does not stand', () => {
    for (const text of ['7', 'y * 3', 'x > 2', 'when(x > 2, y, 3)', 'pi']) {
      expect(partial(formulaTree(text), text === 'pi' ? 'pi' : 'x', functions)).toBeNull()
    }
  })

  it('are those of the forward derivative for any formula', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...randomKinds).chain((kind) => randomFormula(kind, 3)),
        randomValues,
        (text, values) => {
          const tree = formulaTree(text)
          const apart = symbolsIn(tree).filter((symbol) => {
            const forward = differentiate(tree, functions)(values, { [symbol]: 1 }).derivative
            const own = partial(tree, symbol, functions)?.(values) ?? 0
            return Number.isFinite(forward) && !(Math.abs(own - forward) <= 1e-9 * Math.abs(forward) + 1e-300)
          })
          expect(apart).toEqual([])
        },
      ),
    )
  })
})

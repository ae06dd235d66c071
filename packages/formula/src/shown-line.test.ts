import type { Kind } from '@coldfill/units'
import * as fc from 'fast-check'
import { expect, it } from 'vitest'
import { compile } from './evaluate.ts'
import { functionsInUnits, inUnits } from './in-units.ts'
import { layout } from './layout.ts'
import { formulaTree, parseFormula } from './parse.ts'
import { toPlainText } from './plain.ts'
import { shownLine } from './shown-line.ts'
import { bounded } from './testing/error-bound.ts'
import { displayValues, functions, randomFormula, randomKinds, randomValues, scope } from './testing/random-formula.ts'

const line = (text: string, values: Record<string, number>, digits?: number) => {
  const tree = formulaTree(text)
  return shownLine({ tree, values, result: compile(tree, {})(values), ...(digits === undefined ? {} : { digits }) })
}

it('shows short numbers as they are, and four digits of others', () => {
  const { numbers, result } = line('V * e', { V: 3000, e: 1 / 23, unused: 7 })
  expect(numbers).toEqual({ V: '3000', e: '0.04348' })
  expect(result).toBe('130.4')
})

it('forgets what a conversion left in the sixteenth digit', () => {
  expect(line('t + 0', { t: 39.99999999999994 })).toMatchObject({ numbers: { t: '40' }, result: '40' })
})

it('raises the digits where the result is a small difference of large numbers', () => {
  // By hand: 0.0167734 / 0.0160215 − 1 = 0.046930…; with four digits each, 0.01677 / 0.01602 − 1 = 0.04682.
  const { numbers, result } = line('v_h / v_l - 1', { v_h: 0.01677341, v_l: 0.01602152 })
  expect(result).toBe('0.04693')
  expect(numbers.v_h!.length).toBeGreaterThan('0.01677'.length)
  const again = Number(numbers.v_h) / Number(numbers.v_l) - 1
  expect(again.toPrecision(4)).toBe('0.04693')
})

it('keeps the digits asked for', () => {
  expect(line('a / b', { a: 2, b: 3 }, 6).result).toBe('0.666667')
  expect(line('a / b', { a: 1e-6, b: 3 }).result).toBe('3.333e-7')
})

it('shows a line that it cannot recompute without raising digits', () => {
  const tree = formulaTree('v_sat(t) + 1')
  expect(shownLine({ tree, values: { t: 123.456789 }, result: 5 })).toMatchObject({
    numbers: { t: '123.5' },
    result: '5',
  })
  expect(shownLine({ tree: formulaTree('a'), values: { a: 1 }, result: Number.NaN })).toMatchObject({
    numbers: { a: '1' },
    result: '–',
  })
})

it('gives the shown result to somebody who reads the drawn line and computes it', () => {
  const formula = fc
    .constantFrom(...randomKinds)
    .chain((kind: Kind) => randomFormula(kind, 2).map((text) => ({ kind, text })))
  fc.assert(
    fc.property(formula, randomValues, fc.constantFrom('US', 'SI' as const), ({ kind, text }, si, system) => {
      const own = functionsInUnits(functions, system)
      const tree = inUnits(formulaTree(text), scope, system, kind)
      const values = displayValues(si, system)
      const result = compile(tree, own)(values)
      const { value, error, undecided } = bounded(formulaTree(text), si, functions)
      fc.pre(!undecided && Number.isFinite(result) && error < 1e-12 * Math.abs(value))
      const shown = shownLine({ tree, values, result, functions: own })
      const drawn = toPlainText(layout(shown.tree, { numbers: shown.numbers, functions }))
      const { tree: read, problems } = parseFormula(drawn.replaceAll('Q(', 'q_mix('))
      expect(problems).toEqual([])
      const again = compile(read!, own)({})
      // The last digit shown may still turn on rounding in the fifteenth.
      expect(Math.abs(Number(Number(again.toPrecision(13)).toPrecision(4)) - Number(shown.result))).toBeLessThanOrEqual(
        1e-9 * Math.abs(result),
      )
    }),
    { numRuns: 500 },
  )
})

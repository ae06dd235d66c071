import { checkDimensions, formulaTree, symbolsIn } from '@coldfill/formula'
import { describe, expect, it } from 'vitest'
import { assumptions } from '../assumptions/index.ts'
import { water } from '../fluids/index.ts'
import type { Method } from '../method.ts'
import { runExample } from '../run-example.ts'
import { sources } from '../sources/index.ts'
import { methods } from './index.ts'

const all = Object.values(methods)
const scopeOf = (method: Method) => ({
  symbols: Object.fromEntries(
    [...Object.entries(method.inputs), ...Object.entries(method.steps)].map(([symbol, { kind }]) => [symbol, kind]),
  ),
  functions: water.functions,
})

describe.each(all.map((method) => [method.id, method] as const))('%s', (_id, method) => {
  it('has a worked example that is not its own output', () => {
    expect(method.examples.length).toBeGreaterThan(0)
  })

  it('uses only symbols that are defined before', () => {
    const known = new Set(Object.keys(method.inputs))
    for (const [symbol, { formula }] of Object.entries(method.steps)) {
      for (const used of symbolsIn(formulaTree(formula))) expect(known, `${symbol} = ${formula}`).toContain(used)
      known.add(symbol)
    }
    for (const { condition } of [...method.checks, ...(method.validity ?? [])])
      for (const used of symbolsIn(formulaTree(condition))) expect(known, condition).toContain(used)
    for (const symbol of Object.values(method.results)) expect(known).toContain(symbol)
  })

  it('is right in its dimensions', () => {
    const scope = scopeOf(method)
    for (const [symbol, { formula, kind }] of Object.entries(method.steps)) {
      const { problems } = checkDimensions(formulaTree(formula), scope, kind)
      expect(problems, `${symbol} = ${formula}`).toEqual([])
    }
    for (const { condition } of [...method.checks, ...(method.validity ?? [])])
      expect(checkDimensions(formulaTree(condition), scope).problems, condition).toEqual([])
  })

  it('cites sources that are listed and leans on assumptions that are documented', () => {
    const cited = [...Object.values(method.steps), ...method.examples].map(({ source }) => source.source)
    for (const id of cited) expect(Object.keys(sources)).toContain(id)
    for (const input of Object.values(method.inputs)) {
      const { from } = input
      const id = from.at === 'assumption' ? from.id : 'assumption' in from ? from.assumption : undefined
      if (id !== undefined) expect(Object.keys(assumptions)).toContain(id)
    }
    if (method.checkBack !== undefined) expect(Object.keys(methods)).toContain(method.checkBack)
  })

  it.each(method.examples.map((example) => [example.title, example] as const))('reproduces: %s', (_title, example) => {
    for (const row of runExample(method, example, water.functions))
      expect(
        Math.abs(row.deviation),
        `${row.symbol}: expected ${row.expected}, computed ${row.computed}`,
      ).toBeLessThanOrEqual(example.tolerance)
  })
})

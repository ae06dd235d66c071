import { describe, expect, it } from 'vitest'
import type { TraceEntry } from '#lib/sized-project.ts'
import { operands, upstream } from './upstream.ts'

const input = (symbol: string): TraceEntry => ({
  entry: 'input',
  id: `ET-1/${symbol}`,
  symbol,
  name: symbol,
  kind: 'volume',
  value: 1,
  origin: { from: 'catalogue' },
})
const step = (symbol: string, formula: string): TraceEntry => ({
  entry: 'step',
  id: `ET-1/${symbol}`,
  symbol,
  name: symbol,
  kind: 'volume',
  value: 1,
  formula,
  source: { source: 's', locator: '' },
  method: 'm',
})
const trace = [
  { title: 'Contents', entries: [input('a'), input('b'), step('c', 'a + b')] },
  { title: 'Vessel', entries: [input('unused'), step('d', 'c * 2'), step('e', 'd + a')] },
]
const names = (id: string) => upstream(trace, id).map((entry) => entry.symbol)

describe('what a number comes from', () => {
  it('is every entry it depends on, in the order of the calculation', () => {
    expect(names('ET-1/e')).toEqual(['a', 'b', 'c', 'd', 'e'])
  })
  it('leaves out what it does not use', () => {
    expect(names('ET-1/c')).toEqual(['a', 'b', 'c'])
    expect(names('ET-1/unused')).toEqual(['unused'])
  })
  it('is nothing for an entry that is not there', () => {
    expect(names('ET-1/z')).toEqual([])
  })
  it('names the operands of one step alone', () => {
    const line = upstream(trace, 'ET-1/e')
    const last = line.at(-1)
    if (last?.entry !== 'step') throw new Error('e is a step')
    expect(operands(last, line).map((entry) => entry.symbol)).toEqual(['d', 'a'])
  })
})

import type { FormulaFunction } from '@coldfill/formula'
import { parseQuantity, type Kind } from '@coldfill/units'
import { Calculation, type GivenValue } from './calculation.ts'
import type { Method, WorkedExample } from './method.ts'

export interface ExampleRow {
  readonly symbol: string
  readonly kind: Kind
  /** SI units. */
  readonly expected: number
  readonly computed: number
  /** computed / expected − 1 */
  readonly deviation: number
}

const si = (text: string, kind: Kind): number => {
  const plain = kind === 'ratio' || kind === 'count' ? Number(text) : Number.NaN
  if (Number.isFinite(plain)) return plain
  const parsed = parseQuantity(text, [kind])
  if (!parsed.ok) throw new Error(`worked example: ${text} is no ${kind}: ${parsed.problem.message}`)
  return parsed.quantity.value
}

/** Runs a method on one of its worked examples and compares each expected value. */
export const runExample = (
  method: Method,
  example: WorkedExample,
  functions: Readonly<Record<string, FormulaFunction>>,
): readonly ExampleRow[] => {
  const kindOf = (symbol: string): Kind => {
    const entry = method.inputs[symbol] ?? method.steps[symbol]
    if (!entry) throw new Error(`${method.id}: example ${example.id} names ${symbol}, which the method does not have`)
    return entry.kind
  }
  const value = (symbol: string, text: string): GivenValue => ({
    value: si(text, kindOf(symbol)),
    origin: { from: 'table', citation: example.source },
    authored: text,
  })
  const entries = Object.entries(example.given).map(([symbol, text]) => [symbol, value(symbol, text)] as const)
  const calculation = new Calculation(example.id, functions)
  calculation.section(method.title)
  const inputs = Object.fromEntries(entries.filter(([symbol]) => method.inputs[symbol]))
  const stated = Object.fromEntries(entries.filter(([symbol]) => method.steps[symbol]))
  calculation.run(method, inputs, stated)
  return Object.entries(example.expected).map(([symbol, text]) => {
    const kind = kindOf(symbol)
    const expected = si(text, kind)
    const computed = calculation.value(symbol)
    return { symbol, kind, expected, computed, deviation: computed / expected - 1 }
  })
}

import type { FormulaFunction } from '@coldfill/formula'
import { compiled } from './compiled.ts'
import type { TraceEntry, TraceInput } from './trace.ts'

type Functions = Readonly<Record<string, FormulaFunction>>

const valuesOf = (entries: readonly TraceEntry[]): Record<string, number> => {
  const values: Record<string, number> = {}
  for (const entry of entries) values[entry.symbol] = entry.value
  return values
}

/**
 * Exact derivative of a result with respect to every input of its calculation, SI units of the one per SI unit of the other.
 * The chain rule is followed backwards through the steps, so that all inputs come out of one pass. `values` are those of the
 * symbols, where they are at hand already.
 */
export const sensitivities = (
  entries: readonly TraceEntry[],
  functions: Functions,
  result: string,
  values: Readonly<Record<string, number>> = valuesOf(entries),
): Readonly<Record<string, number>> => {
  const adjoint: Record<string, number> = { [result]: 1 }
  for (let n = entries.length - 1; n >= 0; n -= 1) {
    const entry = entries[n]
    if (!entry) continue
    const weight = adjoint[entry.symbol]
    if (entry.entry === 'input' || weight === undefined || weight === 0) continue
    for (const [symbol, slope] of compiled(entry.formula, functions).partials())
      adjoint[symbol] = (adjoint[symbol] ?? 0) + weight * slope(values)
  }
  const slopes: Record<string, number> = {}
  for (const { entry, symbol } of entries) {
    const slope = adjoint[symbol]
    if (entry === 'input' && slope !== undefined) slopes[symbol] = slope
  }
  return slopes
}

/** Computes the steps again with one input changed and returns the values of all symbols. */
export const recompute = (
  entries: readonly TraceEntry[],
  functions: Functions,
  symbol: string,
  value: number,
): Readonly<Record<string, number>> => {
  const values: Record<string, number> = {}
  for (const entry of entries) {
    if (entry.symbol === symbol) values[symbol] = value
    else
      values[entry.symbol] = entry.entry === 'input' ? entry.value : compiled(entry.formula, functions).evaluate(values)
  }
  return values
}

// How far an input is followed: a temperature by 120 K, anything else to a hundredth or a hundred times its value.
const TEMPERATURE_REACH = 120
const FACTOR_REACH = 100

const reach = (input: TraceInput, direction: 1 | -1): number => {
  if (input.kind === 'temperature') return input.value + direction * TEMPERATURE_REACH
  if (input.value === 0) return direction
  return direction === 1
    ? Math.max(input.value * FACTOR_REACH, input.value / FACTOR_REACH)
    : Math.min(input.value * FACTOR_REACH, input.value / FACTOR_REACH)
}

const STEPS = 60
const BISECTIONS = 80

/**
 * The value of an input nearest to the present one at which `isEnough` turns false, in SI units; null where none in reach
 * does. `isEnough` is asked about the values of all symbols, is true now, and null where they have no meaning (beyond the data
 * of the fluid): the input is not followed beyond. Found by following the input in the direction
 * that enlarges the vessel and bisecting the first step on which it fails.
 */
export const limitOf = (
  entries: readonly TraceEntry[],
  functions: Functions,
  input: TraceInput,
  direction: 1 | -1,
  isEnough: (values: Readonly<Record<string, number>>) => boolean | null,
): number | null => {
  const enoughAt = (value: number) => isEnough(recompute(entries, functions, input.symbol, value))
  const end = reach(input, direction)
  const geometric = input.kind !== 'temperature' && input.value !== 0
  const at = (part: number) =>
    geometric ? input.value * (end / input.value) ** (part ** 2) : input.value + (end - input.value) * part ** 2
  let good = input.value
  let bad: number | null = null
  for (let n = 1; n <= STEPS; n += 1) {
    const value = at(n / STEPS)
    const enough = enoughAt(value)
    if (enough === null) return null
    if (!enough) {
      bad = value
      break
    }
    good = value
  }
  if (bad === null) return null
  for (let n = 0; n < BISECTIONS; n += 1) {
    const middle: number = good + (bad - good) / 2
    if (middle === good || middle === bad) break
    if (enoughAt(middle)) good = middle
    else bad = middle
  }
  return good
}

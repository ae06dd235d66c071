import {
  limitOf,
  type Method,
  sensitivities,
  type TraceEntry,
  type TraceInput,
  type TraceSection,
} from '@coldfill/engine'
import type { HeadroomRow, SelectedVessel } from './result.ts'
import type { VesselContext } from './vessel-context.ts'

/** Constants of the material and published dimensions, which nobody moves. */
const isFixed = (input: TraceInput): boolean => input.symbol.startsWith('alpha') || input.origin.from === 'table'

/** Everything up to the symbol, in order. */
const chainTo = (answer: string, trace: readonly TraceSection[]): readonly TraceEntry[] => {
  const chain: TraceEntry[] = []
  for (const { entries } of trace)
    for (const entry of entries) {
      chain.push(entry)
      if (entry.symbol === answer) return chain
    }
  return chain
}

/**
 * How the required volume answers to each input, and where the chosen vessel stops being enough: by volume, or by the water
 * it can take up. Inputs that do not move the result are left out.
 */
export const headroomRows = (
  context: VesselContext,
  method: Method,
  selected: SelectedVessel | null,
): readonly HeadroomRow[] => {
  const answer = method.results['required-volume']
  const { calculation } = context
  if (answer === undefined || !calculation.has(answer)) return []
  const chain = chainTo(answer, calculation.trace)
  const slopes = sensitivities(chain, calculation.functions, answer, calculation.values)
  const expansion = method.results['expansion-volume']
  const reserve = method.results['water-reserve']
  const isEnough = (values: Readonly<Record<string, number>>): boolean | null => {
    const required = values[answer] ?? Number.NaN
    if (!selected || !Number.isFinite(required) || required <= 0) return null
    const takenUp = (expansion ? (values[expansion] ?? 0) : 0) + (reserve ? (values[reserve] ?? 0) : 0)
    const acceptance = selected.acceptance === undefined ? Infinity : selected.acceptance * selected.quantity
    return required <= selected.volume * selected.quantity && takenUp <= acceptance
  }
  const rows: HeadroomRow[] = []
  for (const input of chain) {
    if (input.entry !== 'input' || isFixed(input)) continue
    const { id: entry, symbol, name, kind, value } = input
    const sensitivity = slopes[symbol]
    if (sensitivity === undefined || sensitivity === 0 || !Number.isFinite(sensitivity)) continue
    const limit = selected ? limitOf(chain, calculation.functions, input, sensitivity > 0 ? 1 : -1, isEnough) : null
    rows.push({ entry, symbol, name, kind, value, sensitivity, limit })
  }
  return rows
}

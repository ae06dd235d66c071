import { limitOf, type Method, sensitivities, type TraceInput } from '@coldfill/engine'
import type { HeadroomRow, SelectedVessel } from './result.ts'
import type { VesselContext } from './vessel-context.ts'

/** Constants of the material and published dimensions, which nobody moves. */
const isFixed = (input: TraceInput): boolean => input.symbol.startsWith('alpha') || input.origin.from === 'table'

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
  const entries = calculation.trace.flatMap((section) => section.entries)
  const upTo = entries.findIndex((entry) => entry.symbol === answer)
  const chain = entries.slice(0, upTo + 1)
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
  return chain
    .filter((entry): entry is TraceInput => entry.entry === 'input' && !isFixed(entry))
    .flatMap((input) => {
      const sensitivity = slopes[input.symbol]
      if (sensitivity === undefined || sensitivity === 0 || !Number.isFinite(sensitivity)) return []
      const limit = selected ? limitOf(chain, calculation.functions, input, sensitivity > 0 ? 1 : -1, isEnough) : null
      const { id: entry, symbol, name, kind, value } = input
      return [{ entry, symbol, name, kind, value, sensitivity, limit }]
    })
}

import type { ProjectResult } from '@coldfill/contract'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import type { TraceEntry, Vessel } from '#lib/sized-project.ts'

const shown = (entry: { readonly kind: TraceEntry['kind']; readonly value: number }, units: UnitSystem): string =>
  formatQuantity({ kind: entry.kind, value: entry.value, authored: '' }, units)

const escaped = (symbol: string): string => symbol.replace(/[\\^$.*+?()[\]{}|/]/gu, '\\$&')

/** Inputs of a vessel that come from a path, each with the first step that uses it. */
const usesIn = (vessel: Vessel, path: string, units: UnitSystem): string[] => {
  const entries = vessel.trace.flatMap((section) => section.entries)
  return entries.flatMap((entry) => {
    if (entry.entry !== 'input' || entry.origin.from !== 'spec' || entry.origin.path !== path) return []
    const uses = new RegExp(`(?<![\\p{L}\\p{N}_])${escaped(entry.symbol)}(?![\\p{L}\\p{N}_])`, 'u')
    const step = entries.find((each) => each.entry === 'step' && uses.test(each.formula))
    const then = step ? ` → ${step.name} ${shown(step, units)}` : ''
    return [`${vessel.mark}: ${entry.name} ${shown(entry, units)}${then}`]
  })
}

const sizeOf = (vessel: Vessel, units: UnitSystem): string[] =>
  vessel.status === 'sized'
    ? Object.values(vessel.results).map((result) => `${result.name} ${shown(result, units)}`)
    : [`${vessel.status}${vessel.reason ? `: ${vessel.reason}` : ''}`]

const MOST = 6

/** What the last sizing made of a key: the results of a vessel at its mark, and what a value went into elsewhere. */
export const computedValues = (result: ProjectResult | null, path: string, units: UnitSystem): readonly string[] => {
  if (!result) return []
  const vessel = result.vessels.find((each) => each.path === path)
  if (vessel) return sizeOf(vessel, units)
  const all = result.vessels.flatMap((each) => usesIn(each, path, units))
  return all.length > MOST ? [...all.slice(0, MOST), `and ${all.length - MOST} more`] : all
}

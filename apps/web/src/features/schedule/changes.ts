import type { Results } from '@coldfill/contract'
import { displayUnit, fromSi, isKind, type UnitSystem } from '@coldfill/units'

type Changed = NonNullable<Results['changedSince']>['vessels'][number]

/** Changed results by row (`HWS/ET-1`) and by name of the result. */
export const changesByPlace = (changes: readonly Changed[]): ReadonlyMap<string, ReadonlyMap<string, Changed>> => {
  const rows = new Map<string, Map<string, Changed>>()
  for (const change of changes) {
    const row = `${change.system}/${change.mark}`
    const cells = rows.get(row) ?? new Map<string, Changed>()
    cells.set(change.key, change)
    rows.set(row, cells)
  }
  return rows
}

/** The value before, with as many decimals as the value now is shown with. */
export const changeWords = (change: Changed, units: UnitSystem, now: string): string => {
  const { was, kind } = change
  if (was === null) return '—'
  if (typeof was === 'string' || !isKind(kind)) return String(was)
  const decimals = /^-?\d+(?:\.(\d+))?$/.exec(now)?.[1]?.length ?? 0
  return fromSi(was, displayUnit(kind, units)).toFixed(decimals)
}

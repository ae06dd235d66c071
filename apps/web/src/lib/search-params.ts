import type { UnitSystem } from '@coldfill/units'
import { useCallback } from 'react'
import { useSearchParams } from 'react-router-dom'
import { createStore, useStore } from './store.ts'

type Changes = Readonly<Record<string, string | null>>

/** Reads and changes single parameters of the address. The view of a sheet lives there, so that links and Back work. */
export const useAddress = () => {
  const [search, setSearch] = useSearchParams()
  const change = useCallback(
    (changes: Changes, options: { readonly replace?: boolean } = {}) =>
      setSearch(
        (current) => {
          const next = new URLSearchParams(current)
          for (const [key, value] of Object.entries(changes)) {
            if (value === null) next.delete(key)
            else next.set(key, value)
          }
          return next
        },
        { replace: options.replace ?? false, preventScrollReset: true },
      ),
    [setSearch],
  )
  return { get: (key: string) => search.get(key), change }
}

/** What a link from one sheet to another keeps: the content that is looked at, and the units. */
export const useKept = () => {
  const { get } = useAddress()
  return { rev: get('rev'), units: get('units') }
}

export type UnitChoice = 'project' | UnitSystem
const KEY = 'coldfill.units'
const stored = (): UnitChoice => {
  try {
    const text = localStorage.getItem(KEY)
    return text === 'US' || text === 'SI' ? text : 'project'
  } catch {
    return 'project'
  }
}

/** Units this person prefers on this device, where the address does not say. */
export const unitPreference = createStore<UnitChoice>('project')
export const startUnits = (): void => unitPreference.set(stored())
export const preferUnits = (choice: UnitChoice): void => {
  unitPreference.set(choice)
  try {
    localStorage.setItem(KEY, choice)
  } catch {
    // Kept until the page is closed.
  }
}

/** Units to show: of the address, else of the person, else of the project. Only the display changes. */
export const useUnits = (ofProject: UnitSystem | undefined) => {
  const { get, change } = useAddress()
  const preferred = useStore(unitPreference)
  const asked = get('units')?.toUpperCase()
  const units: UnitSystem =
    asked === 'US' || asked === 'SI' ? asked : preferred === 'project' ? (ofProject ?? 'US') : preferred
  const setUnits = (next: UnitSystem) => change({ units: next.toLowerCase() }, { replace: true })
  return { units, setUnits }
}

import type { ChangedResult } from '@coldfill/contract'
import type { ProjectResult, VesselResult } from '@coldfill/sizing'

const keyOf = (vessel: VesselResult): string => `${vessel.system}/${vessel.mark}`

const chosenWords = (vessel: VesselResult | undefined): string | null => {
  const selected = vessel?.selected
  return selected
    ? `${selected.quantity > 1 ? `${selected.quantity} × ` : ''}${selected.maker} ${selected.model}`
    : null
}

/** Rounding of the last bit, as between two ways of writing a value, is no change. */
const same = (a: ChangedResult['was'], b: ChangedResult['was']): boolean =>
  a === b ||
  (typeof a === 'number' && typeof b === 'number' && Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b)))

const compareVessel = (was: VesselResult | undefined, now: VesselResult | undefined): ChangedResult[] => {
  const either = now ?? was
  if (!either) return []
  const { system, mark } = either
  const changed: ChangedResult[] = []
  const note = (
    key: string,
    name: string,
    kind: string,
    before: ChangedResult['was'],
    after: ChangedResult['now'],
  ): void => {
    if (!same(before, after)) changed.push({ system, mark, key, name, kind, was: before, now: after })
  }
  note('status', 'Status', 'words', was?.status ?? null, now?.status ?? null)
  for (const key of new Set([...Object.keys(was?.results ?? {}), ...Object.keys(now?.results ?? {})])) {
    const before = was?.results[key]
    const after = now?.results[key]
    note(
      key,
      (after ?? before)?.name ?? key,
      (after ?? before)?.kind ?? 'ratio',
      before?.value ?? null,
      after?.value ?? null,
    )
  }
  note('selected', 'Chosen vessel', 'words', chosenWords(was), chosenWords(now))
  return changed
}

/** Every result that differs between two results, in the order of the newer one; vessels that are gone come last. */
export const changedResults = (was: ProjectResult, now: ProjectResult): ChangedResult[] => {
  const before = new Map(was.vessels.map((vessel) => [keyOf(vessel), vessel]))
  const after = new Set(now.vessels.map(keyOf))
  return [
    ...now.vessels.flatMap((vessel) => compareVessel(before.get(keyOf(vessel)), vessel)),
    ...was.vessels.filter((vessel) => !after.has(keyOf(vessel))).flatMap((vessel) => compareVessel(vessel, undefined)),
  ]
}

import type { ProjectResult } from '@coldfill/contract'
import { displayUnit, formatQuantity, fromSi, type UnitSystem, unitLabel } from '@coldfill/units'
import type { Vessel } from '#lib/sized-project.ts'

/** One result of a vessel that is not the same in two contents. */
export interface ResultChange {
  readonly system: string
  readonly mark: string
  readonly key: string
  readonly name: string
  /** Null where it is not there. */
  readonly was: string | null
  readonly now: string | null
  /** By how much it moved, in the units shown; null where one of them is no number. */
  readonly moved: string | null
  /** As a part of the value before; null where that cannot be said. */
  readonly part: number | null
}

type Quantity = Vessel['results'][string]

const keyOf = ({ system, mark }: Vessel): string => `${system}/${mark}`

const chosenWords = ({ selected }: Vessel): string | null =>
  selected ? `${selected.quantity > 1 ? `${selected.quantity} × ` : ''}${selected.maker} ${selected.model}` : null

const wordChange = (
  either: Vessel,
  key: string,
  name: string,
  was: string | null,
  now: string | null,
): readonly ResultChange[] =>
  was === now ? [] : [{ system: either.system, mark: either.mark, key, name, was, now, moved: null, part: null }]

/** Rounding of the last bit is no movement. */
const same = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b))

const movedWords = (was: Quantity, now: Quantity, units: UnitSystem): string => {
  const unit = displayUnit(now.kind, units)
  // A difference has no zero point: 10 °C warmer is 18 °F warmer.
  const by = fromSi(now.value, unit) - fromSi(was.value, unit)
  const size = Math.abs(by)
  const digits = size >= 100 ? 0 : size >= 10 ? 1 : size >= 1 ? 2 : 3
  return `${by < 0 ? '−' : '+'}${size.toFixed(digits)} ${unitLabel(now.kind, units)}`.trimEnd()
}

/** Kinds whose zero is a convention: a share of them says nothing. */
const NO_SHARE: readonly string[] = ['temperature', 'gauge pressure']

const vesselChanges = (
  was: Vessel | undefined,
  now: Vessel | undefined,
  units: UnitSystem,
): readonly ResultChange[] => {
  const either = now ?? was
  if (!either) return []
  // A vessel that comes or goes is one change, whatever it had.
  if (!was || !now) return wordChange(either, 'status', 'Status', was?.status ?? null, now?.status ?? null)
  const keys = [...new Set([...Object.keys(now.results), ...Object.keys(was.results)])]
  return [
    ...wordChange(either, 'status', 'Status', was.status, now.status),
    ...keys.flatMap((key): readonly ResultChange[] => {
      const before = was.results[key]
      const after = now.results[key]
      if (before && after && same(before.value, after.value)) return []
      const both = before !== undefined && after !== undefined && before.kind === after.kind
      return [
        {
          system: either.system,
          mark: either.mark,
          key,
          name: (after ?? before)?.name ?? key,
          was: before ? formatQuantity(before, units) : null,
          now: after ? formatQuantity(after, units) : null,
          moved: both ? movedWords(before, after, units) : null,
          part: both && before.value !== 0 && !NO_SHARE.includes(after.kind) ? after.value / before.value - 1 : null,
        },
      ]
    }),
    ...wordChange(either, 'selected', 'Chosen vessel', chosenWords(was), chosenWords(now)),
  ]
}

/** What comes or goes stands before what only moves; of that, the largest first. */
const weight = ({ moved, part }: ResultChange): number =>
  moved === null ? Number.POSITIVE_INFINITY : Math.abs(part ?? 0)

/** Every result that differs between two contents, the largest change first. Marks may stand twice, in different systems. */
export const resultChanges = (was: ProjectResult, now: ProjectResult, units: UnitSystem): readonly ResultChange[] => {
  const before = new Map(was.vessels.map((vessel) => [keyOf(vessel), vessel]))
  const after = new Set(now.vessels.map(keyOf))
  return [
    ...now.vessels.flatMap((vessel) => vesselChanges(before.get(keyOf(vessel)), vessel, units)),
    ...was.vessels
      .filter((vessel) => !after.has(keyOf(vessel)))
      .flatMap((vessel) => vesselChanges(vessel, undefined, units)),
  ].toSorted((a, b) => {
    const [first, second] = [weight(a), weight(b)]
    return first === second ? 0 : second - first
  })
}

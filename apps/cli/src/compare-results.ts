import type { ProjectResult, ResultValue, VesselResult } from '@coldfill/sizing'
import type { Finding } from '@coldfill/spec'
import type { Kind } from '@coldfill/units'

/** A number before and after; null where there was none. Values in the SI unit of the kind. */
export interface ValueChange {
  /** Key of a result (`required-volume`) or name of an input. */
  readonly key: string
  readonly name: string
  readonly kind: Kind
  readonly was: number | null
  readonly now: number | null
  /** As the person wrote it, for inputs. */
  readonly wasAuthored?: string
  readonly nowAuthored?: string
  /** Path in the spec or id of the assumption that an input comes from. */
  readonly from?: string
}

export interface VesselChange {
  readonly change: 'added' | 'removed' | 'changed'
  readonly mark: string
  readonly system: string
  readonly kind: string
  readonly results: readonly ValueChange[]
  /** Status, method, fluid, chosen row and other words. */
  readonly words: readonly { readonly name: string; readonly was: string; readonly now: string }[]
  /** Inputs that the vessel is sized from and that are not the same. */
  readonly inputs: readonly ValueChange[]
}

export interface ResultChanges {
  readonly vessels: readonly VesselChange[]
  readonly findings: { readonly added: readonly Finding[]; readonly removed: readonly Finding[] }
}

/** Numbers that differ by less are the same: two ways of writing a value, as in gal and L, are no change. */
const SAME = 1e-9

const isSame = (a: number | undefined, b: number | undefined): boolean =>
  a === b || (a !== undefined && b !== undefined && Math.abs(a - b) <= SAME * Math.max(Math.abs(a), Math.abs(b)))

interface Input {
  readonly name: string
  readonly kind: Kind
  readonly value: number
  readonly authored?: string
  readonly from: string
}

const inputsOf = ({ trace, mark }: VesselResult): ReadonlyMap<string, Input> =>
  new Map(
    trace
      .flatMap(({ entries }) => entries)
      .flatMap((entry) => {
        if (entry.entry !== 'input') return []
        const { id, name, kind, value, authored, origin } = entry
        const from =
          origin.from === 'spec'
            ? origin.path
            : origin.from === 'assumption'
              ? `assumption ${origin.id}`
              : origin.from === 'table'
                ? origin.citation.locator
                : 'catalogue'
        return [
          [
            id.slice(mark.length + 1),
            { name, kind, value, from, ...(authored !== undefined && { authored }) },
          ] as const,
        ]
      }),
  )

const inputChanges = (was: VesselResult, now: VesselResult): ValueChange[] => {
  const before = inputsOf(was)
  const after = inputsOf(now)
  return [...new Set([...before.keys(), ...after.keys()])].flatMap((key) => {
    const [a, b] = [before.get(key), after.get(key)]
    const either = b ?? a
    if (!either || isSame(a?.value, b?.value)) return []
    return [
      {
        key,
        name: either.name,
        kind: either.kind,
        was: a?.value ?? null,
        now: b?.value ?? null,
        from: either.from,
        ...(a?.authored !== undefined && { wasAuthored: a.authored }),
        ...(b?.authored !== undefined && { nowAuthored: b.authored }),
      },
    ]
  })
}

const resultChanges = (was: VesselResult | null, now: VesselResult | null): ValueChange[] => {
  const keys = [...new Set([...Object.keys(was?.results ?? {}), ...Object.keys(now?.results ?? {})])]
  return keys.flatMap((key) => {
    const before: ResultValue | undefined = was?.results[key]
    const after: ResultValue | undefined = now?.results[key]
    const either = after ?? before
    if (!either || isSame(before?.value, after?.value)) return []
    return [{ key, name: either.name, kind: either.kind, was: before?.value ?? null, now: after?.value ?? null }]
  })
}

const chosen = ({ selected }: VesselResult): string =>
  selected ? `${selected.quantity > 1 ? `${selected.quantity} × ` : ''}${selected.maker} ${selected.model}` : ''

const words: Readonly<Record<string, (vessel: VesselResult) => string>> = {
  system: ({ system }) => system,
  kind: ({ kind }) => kind,
  status: ({ status }) => status,
  method: ({ method }) => method,
  construction: ({ construction }) => construction ?? '',
  fluid: ({ fluid }) => fluid,
  quantity: ({ quantity }) => `${quantity}`,
  chosen,
}

const wordChanges = (was: VesselResult, now: VesselResult): VesselChange['words'] =>
  Object.entries(words).flatMap(([name, read]) =>
    read(was) === read(now) ? [] : [{ name, was: read(was), now: read(now) }],
  )

const vesselChange = (was: VesselResult | undefined, now: VesselResult | undefined): VesselChange[] => {
  const either = now ?? was
  if (!either) return []
  const change = {
    change: was && now ? 'changed' : now ? 'added' : 'removed',
    mark: either.mark,
    system: either.system,
    kind: either.kind,
    results: resultChanges(was ?? null, now ?? null),
    words: was && now ? wordChanges(was, now) : [],
    inputs: was && now ? inputChanges(was, now) : [],
  } as const
  const same = change.change === 'changed' && [change.results, change.words, change.inputs].every((l) => l.length === 0)
  return same ? [] : [change]
}

const saying = ({ code, path, message }: Finding): string => `${code} ${path} ${message}`

/** What is not the same in two results: vessels by their marks, and findings that came or went. */
export const compareResults = (was: ProjectResult, now: ProjectResult): ResultChanges => {
  const before = new Map(was.vessels.map((vessel) => [vessel.mark, vessel]))
  const after = new Map(now.vessels.map((vessel) => [vessel.mark, vessel]))
  const saidBefore = new Set(was.findings.map(saying))
  const saidNow = new Set(now.findings.map(saying))
  return {
    vessels: [...new Set([...after.keys(), ...before.keys()])].flatMap((mark) =>
      vesselChange(before.get(mark), after.get(mark)),
    ),
    findings: {
      added: now.findings.filter((finding) => !saidBefore.has(saying(finding))),
      removed: was.findings.filter((finding) => !saidNow.has(saying(finding))),
    },
  }
}

/** Change in per cent of the old value. Null where a ratio says nothing: from zero, or on a scale whose zero is arbitrary. */
export const percent = ({ kind, was, now }: Pick<ValueChange, 'kind' | 'was' | 'now'>): number | null =>
  was === null || now === null || was === 0 || kind === 'temperature' ? null : ((now - was) / Math.abs(was)) * 100

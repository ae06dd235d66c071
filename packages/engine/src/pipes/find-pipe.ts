import { pipeFamilies, pipeFamilyAliases, type PipeFamily, type PipeRow } from './families.ts'
import { plainSize } from './spellings.ts'

export type PipeSearch =
  | { readonly ok: true; readonly family: PipeFamily; readonly row: PipeRow }
  /** No such family. */
  | { readonly ok: false; readonly missing: 'family' }
  /** The family does not have the size; it has these next to it, smaller first (all of them where the size says nothing). */
  | {
      readonly ok: false
      readonly missing: 'size'
      readonly family: PipeFamily
      readonly neighbours: readonly PipeRow[]
    }

/** The family by its name or an alias of it, in any case. */
export const findPipeFamily = (name: string): PipeFamily | undefined => {
  const typed = name.trim().replace(/\s+/gu, ' ').toLowerCase()
  const alias = Object.entries(pipeFamilyAliases).find(([other]) => other.toLowerCase() === typed)?.[1]
  return Object.values(pipeFamilies).find((family) => family.name === alias || family.name.toLowerCase() === typed)
}

/** Rough size in m of whatever is written, to find the neighbours only. */
const roughSize = (text: string): number | undefined => {
  const plain = plainSize(text)
  const fraction = /(?:(\d+)-)?(\d+)\/(\d+)/u.exec(plain)
  const number = /\d+(?:\.\d+)?/u.exec(plain)
  if (fraction) return (Number(fraction[1] ?? 0) + Number(fraction[2]) / Number(fraction[3])) * 0.0254
  if (!number) return undefined
  return Number(number[0]) * (/mm|dn|x|od|^d/u.test(plain) ? 0.001 : 0.0254)
}

const neighbours = (family: PipeFamily, size: string): readonly PipeRow[] => {
  const asked = roughSize(size)
  if (asked === undefined || !Number.isFinite(asked)) return family.rows
  const rough = (row: PipeRow): number => roughSize(row.size) ?? row.outsideDiameter
  const below = family.rows.filter((row) => rough(row) < asked).slice(-2)
  const above = family.rows.filter((row) => rough(row) >= asked).slice(0, 2)
  return [...below, ...above]
}

/** The row of a pipe by family and size as a person writes them. Never throws. */
export const findPipe = (name: string, size: string): PipeSearch => {
  const family = findPipeFamily(name)
  if (!family) return { ok: false, missing: 'family' }
  const typed = plainSize(size)
  const row = family.rows.find((each) =>
    [each.size, ...each.spellings].some((spelling) => plainSize(spelling) === typed),
  )
  return row ? { ok: true, family, row } : { ok: false, missing: 'size', family, neighbours: neighbours(family, size) }
}

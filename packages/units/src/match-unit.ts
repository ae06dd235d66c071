import { UNITS, unitsFor, type Unit } from './convert.ts'
import type { Kind } from './kind.ts'

/** Spaces, degree signs, brackets and multiplication dots do not tell units apart; superscripts are digits. */
const plain = (text: string): string =>
  text
    .replace(/[\s°()·*]/gu, '')
    .replace(/\.$/u, '')
    .replaceAll('²', '2')
    .replaceAll('³', '3')
    .replaceAll('∆', 'Δ')

/** In these units `m` and `M` are prefixes a factor of a thousand million apart, so the case of the letter is kept. */
const prefixed = /^(?:MPa|MJ|MWh?$|mbar|mm)/u

interface Spelled {
  readonly unit: Unit
  readonly exact: string
  readonly folded: string
}

const spelled = (unit: Unit): Spelled[] =>
  [unit.symbol, ...unit.spellings].map((text) => {
    const exact = plain(text)
    return {
      unit,
      exact,
      folded: prefixed.test(exact) ? exact.slice(0, 1) + exact.slice(1).toLowerCase() : exact.toLowerCase(),
    }
  })

const folded = (text: string, entry: Spelled): boolean =>
  prefixed.test(entry.exact)
    ? text.slice(0, 1) + text.slice(1).toLowerCase() === entry.folded
    : text.toLowerCase() === entry.folded

const find = (text: string, units: readonly Unit[]): Unit | undefined => {
  const typed = plain(text)
  if (typed === '') return undefined
  const entries = units.flatMap(spelled)
  const exact = entries.find((entry) => entry.exact === typed)
  if (exact) return exact.unit
  const others = new Set(entries.filter((entry) => folded(typed, entry)).map((entry) => entry.unit))
  return others.size === 1 ? [...others][0] : undefined
}

/** The unit of a kind that a person means by `text`: the exact spelling first, then one that differs in case only. */
export const matchUnit = (text: string, kind: Kind): Unit | undefined => find(text, unitsFor(kind))

/** The unit of any kind that a person means by `text`. Kinds that share a spelling: the first one in the list of units. */
export const matchAnyUnit = (text: string): Unit | undefined => {
  const typed = plain(text)
  const exact = UNITS.find((unit) => spelled(unit).some((entry) => entry.exact === typed))
  return exact ?? UNITS.find((unit) => spelled(unit).some((entry) => folded(typed, entry)))
}

/** Number of letters to put in, leave out, change or swap with a neighbour to make one text the other. */
const steps = (a: string, b: string): number => {
  const rows: number[][] = [Array.from({ length: b.length + 1 }, (_, j) => j)]
  const at = (i: number, j: number): number => rows[i]?.[j] ?? Infinity
  for (let i = 1; i <= a.length; i++) {
    const row = [i]
    rows.push(row)
    for (let j = 1; j <= b.length; j++) {
      const change = at(i - 1, j - 1) + (a[i - 1] === b[j - 1] ? 0 : 1)
      const swap = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1] ? at(i - 2, j - 2) + 1 : Infinity
      row.push(Math.min(at(i - 1, j) + 1, (row[j - 1] ?? Infinity) + 1, change, swap))
    }
  }
  return at(a.length, b.length)
}

/** The spelling of a unit of these kinds that is at most one slip away from `text`, case apart: the nearest, and of those the first. */
export const nearestSpelling = (text: string, kinds: readonly Kind[]): string | undefined => {
  const typed = plain(text).toLowerCase()
  let best: { spelling: string; slips: number } | undefined
  for (const kind of kinds)
    for (const unit of unitsFor(kind))
      for (const spelling of [unit.symbol, ...unit.spellings]) {
        const known = plain(spelling).toLowerCase()
        const slips = steps(typed, known)
        // One slip in a unit of one or two letters is another unit.
        if (slips <= (known.length > 2 ? 1 : 0) && slips < (best?.slips ?? Infinity)) best = { spelling, slips }
      }
  return best?.spelling
}

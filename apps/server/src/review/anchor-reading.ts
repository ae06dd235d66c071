import type { Anchor, AnchorState } from '@coldfill/contract'
import type { ProjectResult, VesselResult } from '@coldfill/sizing'
import { textIn, valueRange } from '@coldfill/spec'
import { formatQuantity } from '@coldfill/units'

/** Frozen content that an anchor is read in. */
export interface Content {
  readonly result: ProjectResult
  readonly specText: string
}

/** What stands at an anchor: `exact` to compare by, at full precision, and `shown` for people. */
export interface Reading {
  readonly exact: string
  readonly shown: string
}

/** Columns of a schedule that are words. */
const WORDS: Readonly<Record<string, (vessel: VesselResult) => string>> = {
  kind: (vessel) => vessel.kind,
  method: (vessel) => vessel.method,
  construction: (vessel) => vessel.construction ?? '',
  serves: (vessel) => vessel.serves,
  service: (vessel) => vessel.service,
  fluid: (vessel) => vessel.fluid,
  system: (vessel) => vessel.system,
  status: (vessel) => vessel.status,
  quantity: (vessel) => String(vessel.quantity),
  selected: ({ selected }) => (selected ? `${selected.maker} ${selected.model}` : ''),
  notes: (vessel) => vessel.notes.join(' '),
}

const words = (text: string): Reading => ({ exact: text, shown: text === '' ? '—' : text })

const readRow = (vessel: VesselResult, { result }: Content): Reading => {
  const answer = vessel.results['required-volume']
  const values = Object.entries(vessel.results).map(([key, { value }]) => [key, value] as const)
  return {
    exact: JSON.stringify([
      vessel.status,
      vessel.kind,
      vessel.construction ?? null,
      vessel.quantity,
      vessel.selected,
      values.toSorted(([a], [b]) => (a < b ? -1 : 1)),
    ]),
    shown: answer ? formatQuantity({ kind: answer.kind, value: answer.value }, result.project.units) : vessel.status,
  }
}

const readCell = (vessel: VesselResult, column: string, { result }: Content): Reading | null => {
  if (Object.hasOwn(vessel.results, column)) {
    const value = vessel.results[column]
    if (value)
      return {
        exact: JSON.stringify(value.value),
        shown: formatQuantity({ kind: value.kind, value: value.value }, result.project.units),
      }
  }
  const word = Object.hasOwn(WORDS, column) ? WORDS[column] : undefined
  return word ? words(word(vessel)) : null
}

/** What stands at the anchor; null where the place is gone. */
export const readAnchor = (anchor: Anchor, content: Content): Reading | null => {
  if (anchor.type === 'assumption') {
    const used = content.result.assumptions.find(({ id }) => id === anchor.assumption)
    return used ? words(used.value) : null
  }
  if (anchor.type === 'spec') {
    const range = valueRange(content.specText, anchor.path)
    return range ? words(textIn(content.specText, range).trim()) : null
  }
  const vessel = content.result.vessels.find(({ mark }) => mark === anchor.mark)
  if (!vessel) return null
  return anchor.type === 'row' ? readRow(vessel, content) : readCell(vessel, anchor.column, content)
}

/**
 * What stands at an anchor that was written on an earlier revision. A cell that has become empty, as when its vessel can no longer be
 * sized, is still a place: only a row that is gone leaves a redline adrift.
 */
export const readCarriedAnchor = (anchor: Anchor, content: Content): Reading | null => {
  const reading = readAnchor(anchor, content)
  if (reading || anchor.type !== 'cell') return reading
  return content.result.vessels.some(({ mark }) => mark === anchor.mark) ? words('') : null
}

/** How an anchor stands in `now`, written when `then` was in front of the reviewer. */
export const anchorState = (then: Reading | null, now: Reading | null): AnchorState => {
  if (!now) return 'adrift'
  return then?.exact === now.exact ? 'pinned' : 'moved'
}

/** Keys that could have been meant, for the answer to an anchor that does not exist: the nearest first. */
export const nearestKeys = (anchor: Anchor, { result }: Content): string[] => {
  if (anchor.type === 'assumption') return result.assumptions.map(({ id }) => id)
  if (anchor.type === 'spec') return result.vessels.map(({ path }) => path)
  const vessel = result.vessels.find(({ mark }) => mark === anchor.mark)
  if (anchor.type === 'row' || !vessel) return result.vessels.map(({ mark }) => mark)
  return [...Object.keys(vessel.results), ...Object.keys(WORDS)]
}

import type { Range } from '../finding.ts'
import { parseSpec, type ParsedSpec } from '../parse/parse-spec.ts'
import { differences } from './differences.ts'
import { flowText } from './flow-text.ts'
import type { Slot } from './slots.ts'

/** One difference between two specs. What is alike in both is not told, nor are comments, spacing and the order of keys. */
export interface SpecChange {
  readonly change: 'added' | 'removed' | 'changed'
  /** In the new spec; in the old one for what was removed. */
  readonly path: string
  /** The value on one line; null where there was none. */
  readonly was: string | null
  readonly now: string | null
  /** Where it stands in the old and the new text. */
  readonly wasRange: Range | null
  readonly nowRange: Range | null
}

const rangeOf = ({ lineIndex }: ParsedSpec, { value, keySpan }: Slot): Range =>
  lineIndex.range(value?.node === 'text' ? value.span : keySpan)

/** The differences between two specs by path. Null where one of them cannot be read. */
export const specChanges = (was: string, now: string): readonly SpecChange[] | null => {
  const old = parseSpec(was)
  const fresh = parseSpec(now)
  if (!old.tree || !fresh.tree) return null
  return differences(old.tree, fresh.tree).list.map(({ was: before, now: after }): SpecChange => ({
    change: before === null ? 'added' : after === null ? 'removed' : 'changed',
    path: (after ?? before)?.path ?? '',
    was: before && flowText(before.value),
    now: after && flowText(after.value),
    wasRange: before && rangeOf(old, before),
    nowRange: after && rangeOf(fresh, after),
  }))
}

import type { Range } from '../finding.ts'
import type { Span } from '../parse/line-index.ts'
import { parseSpec } from '../parse/parse-spec.ts'
import { below, entryOf, type SourceList, type SourceMap, type SourceNode } from '../parse/source-tree.ts'
import { alignItems } from './align-items.ts'
import { flowText } from './flow-text.ts'

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

interface Side {
  readonly path: string
  readonly keySpan: Span
  readonly value: SourceNode | null
}

/** The differences between two specs by path. Null where one of them cannot be read. */
export const specChanges = (was: string, now: string): readonly SpecChange[] | null => {
  const old = parseSpec(was)
  const fresh = parseSpec(now)
  if (!old.tree || !fresh.tree) return null
  const changes: SpecChange[] = []

  const tell = (before: Side | null, after: Side | null): void => {
    changes.push({
      change: before === null ? 'added' : after === null ? 'removed' : 'changed',
      path: (after ?? before)?.path ?? '',
      was: before && flowText(before.value),
      now: after && flowText(after.value),
      wasRange: before && old.lineIndex.range(before.value?.node === 'text' ? before.value.span : before.keySpan),
      nowRange: after && fresh.lineIndex.range(after.value?.node === 'text' ? after.value.span : after.keySpan),
    })
  }

  const maps = (before: SourceMap, after: SourceMap, paths: readonly [string, string]): void => {
    const [oldPath, newPath] = paths
    for (const { key, keySpan, value } of before.entries)
      if (!entryOf(after, key)) tell({ path: below(oldPath, key), keySpan, value }, null)
    for (const { key, keySpan, value } of after.entries) {
      const other = entryOf(before, key)
      const side = { path: below(newPath, key), keySpan, value }
      if (other) nodes({ path: below(oldPath, key), keySpan: other.keySpan, value: other.value }, side)
      else tell(null, side)
    }
  }

  const lists = (before: SourceList, after: SourceList, paths: readonly [string, string]): void => {
    const side = (list: SourceList, path: string, index: number): Side => {
      const item = list.items[index] ?? null
      return { path: below(path, index), keySpan: item?.span ?? list.span, value: item }
    }
    for (const pair of alignItems(before.items, after.items)) {
      const from = pair.was === null ? null : side(before, paths[0], pair.was)
      const to = pair.now === null ? null : side(after, paths[1], pair.now)
      if (from && to) nodes(from, to)
      else tell(from, to)
    }
  }

  const nodes = (before: Side, after: Side): void => {
    const paths = [before.path, after.path] as const
    if (before.value?.node === 'map' && after.value?.node === 'map') maps(before.value, after.value, paths)
    else if (before.value?.node === 'list' && after.value?.node === 'list') lists(before.value, after.value, paths)
    else if (flowText(before.value) !== flowText(after.value)) tell(before, after)
  }

  maps(old.tree, fresh.tree, ['', ''])
  return changes
}

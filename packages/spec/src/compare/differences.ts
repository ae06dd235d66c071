import type { SourceList, SourceMap } from '../parse/source-tree.ts'
import { alignItems } from './align-items.ts'
import { flowText } from './flow-text.ts'
import { type Slot, slotsIn } from './slots.ts'

/** One difference between two trees: a slot that is in one of them only, or that holds another value. */
export interface Difference {
  readonly was: Slot | null
  readonly now: Slot | null
}

export interface Differences {
  readonly list: readonly Difference[]
  /** Path in the old tree → path of the same thing in the new one; the root is the empty path. */
  readonly counterparts: ReadonlyMap<string, string>
}

/** What is not the same in two trees. A block that comes or goes is one difference. */
export const differences = (old: SourceMap, fresh: SourceMap): Differences => {
  const list: Difference[] = []
  const counterparts = new Map([['', '']])

  const both = (was: Slot, now: Slot): void => {
    counterparts.set(was.path, now.path)
    if (was.value?.node === 'map' && now.value?.node === 'map') maps(was.value, now.value, was.path, now.path)
    else if (was.value?.node === 'list' && now.value?.node === 'list') lists(was.value, now.value, was.path, now.path)
    else if (flowText(was.value) !== flowText(now.value)) list.push({ was, now })
  }

  const maps = (before: SourceMap, after: SourceMap, oldPath: string, newPath: string): void => {
    const olds = new Map(slotsIn(before, oldPath).map((slot) => [slot.key, slot]))
    const news = slotsIn(after, newPath)
    const kept = new Set(news.map(({ key }) => key))
    for (const was of olds.values()) if (!kept.has(was.key)) list.push({ was, now: null })
    for (const now of news) {
      const was = olds.get(now.key)
      if (was) both(was, now)
      else list.push({ was: null, now })
    }
  }

  const lists = (before: SourceList, after: SourceList, oldPath: string, newPath: string): void => {
    const [olds, news] = [slotsIn(before, oldPath), slotsIn(after, newPath)]
    for (const pair of alignItems(before.items, after.items)) {
      const was = pair.was === null ? null : (olds[pair.was] ?? null)
      const now = pair.now === null ? null : (news[pair.now] ?? null)
      if (was && now) both(was, now)
      else list.push({ was, now })
    }
  }

  maps(old, fresh, '', '')
  return { list, counterparts }
}

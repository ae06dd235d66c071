import type { SourceNode } from '../parse/source-tree.ts'
import { flowText } from './flow-text.ts'

/** Places in the old and in the new list that belong together; null where the item is in one of them only. */
export interface Pair {
  readonly was: number | null
  readonly now: number | null
}

/** What an item of a list is told by: its first key with its value. */
const leadOf = (item: SourceNode | null): string => {
  const first = item?.node === 'map' ? item.entries[0] : undefined
  return first ? `${first.key}: ${flowText(first.value)}` : flowText(item)
}

/** Longest list that is compared item by item; of a longer one the items are paired by place. */
const LONGEST = 500

/** Longest common subsequence, as pairs of places. */
const common = (a: readonly string[], b: readonly string[]): [number, number][] => {
  const lengths = Array.from({ length: a.length + 1 }, () => new Array<number>(b.length + 1).fill(0))
  const at = (i: number, j: number): number => lengths[i]?.[j] ?? 0
  for (let i = a.length - 1; i >= 0; i--)
    for (let j = b.length - 1; j >= 0; j--) {
      const row = lengths[i]
      if (row) row[j] = a[i] === b[j] ? at(i + 1, j + 1) + 1 : Math.max(at(i + 1, j), at(i, j + 1))
    }
  const pairs: [number, number][] = []
  for (let i = 0, j = 0; i < a.length && j < b.length;) {
    if (a[i] === b[j]) pairs.push([i++, j++])
    else if (at(i + 1, j) >= at(i, j + 1)) i += 1
    else j += 1
  }
  return pairs
}

/** Pairs what is left of two runs: items with the same lead first, then by place where both hold the same keys. */
const pairRun = (
  was: readonly number[],
  now: readonly number[],
  lead: (side: 'was' | 'now', index: number) => string,
): Pair[] => {
  const left = [...now]
  const pairs = was.map((index): Pair => {
    const same = left.findIndex((other) => lead('now', other) === lead('was', index))
    return { was: index, now: same < 0 ? null : (left.splice(same, 1)[0] ?? null) }
  })
  // One line that was written anew in its place is one change, not two.
  const alone = pairs.filter((pair) => pair.now === null)
  if (alone.length === 1 && left.length === 1) {
    const [pair] = alone
    return pairs.map((each) => (each === pair ? { ...each, now: left[0] ?? null } : each))
  }
  return [...pairs, ...left.map((index): Pair => ({ was: null, now: index }))]
}

/** Which items of two lists belong together, in the order of the new list; what was taken out comes where it stood. */
export const alignItems = (
  was: readonly (SourceNode | null)[],
  now: readonly (SourceNode | null)[],
): readonly Pair[] => {
  const longest = Math.max(was.length, now.length)
  if (longest > LONGEST)
    return Array.from({ length: longest }, (_, index) => ({
      was: index < was.length ? index : null,
      now: index < now.length ? index : null,
    }))
  const lead = (side: 'was' | 'now', index: number): string => leadOf((side === 'was' ? was : now)[index] ?? null)
  const anchors = common(was.map(flowText), now.map(flowText))
  const pairs: Pair[] = []
  let from: [number, number] = [0, 0]
  for (const [i, j] of [...anchors, [was.length, now.length] as [number, number]]) {
    const range = (start: number, end: number): number[] => Array.from({ length: end - start }, (_, at) => start + at)
    pairs.push(...pairRun(range(from[0], i), range(from[1], j), lead))
    if (i < was.length && j < now.length) pairs.push({ was: i, now: j })
    from = [i + 1, j + 1]
  }
  return pairs
}

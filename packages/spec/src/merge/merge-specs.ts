import { type Difference, type Differences, differences } from '../compare/differences.ts'
import { flowText } from '../compare/flow-text.ts'
import { type Slot, slotsIn, slotsOf } from '../compare/slots.ts'
import { parseSpec } from '../parse/parse-spec.ts'
import { isWithin, type SourceMap } from '../parse/source-tree.ts'
import { putDifference } from './put-difference.ts'

/** A change of theirs, by path. */
export interface MergeChange {
  readonly change: 'added' | 'removed' | 'changed'
  readonly path: string
  /** On one line; null where there is nothing. */
  readonly base: string | null
  readonly mine: string | null
  readonly theirs: string | null
}

export type Merge =
  | {
      readonly ok: true
      /** My text with their changes in it, apart from the conflicts. */
      readonly text: string
      /** Changes of theirs that were put in. */
      readonly taken: readonly MergeChange[]
      /** Changes of theirs that touch what I changed too, or that cannot be put in: my text stands. */
      readonly conflicts: readonly MergeChange[]
    }
  /** One of the texts cannot be read, so nothing can be told by path. */
  | { readonly ok: false; readonly unreadable: 'base' | 'mine' | 'theirs' }

const pathIn = ({ was, now }: Difference): string => was?.path ?? now?.path ?? ''

/** Path of a difference in the base: where the thing stood, or where its block stood and what its key is. */
const basePath = (difference: Difference, parents: ReadonlyMap<string, string>): string => {
  const { was, now } = difference
  if (was || !now) return pathIn(difference)
  const parent = parents.get(now.parentPath) ?? now.parentPath
  // Items of a list that were put in have no place in the base: two of them never meet.
  return now.key === null ? `${parent}.+${now.index}` : parent === '' ? now.key : `${parent}.${now.key}`
}

const inverse = (counterparts: ReadonlyMap<string, string>): ReadonlyMap<string, string> =>
  new Map([...counterparts].map(([from, to]) => [to, from]))

const valueOf = (slot: Slot | null | undefined): string | null => (slot ? flowText(slot.value) : null)

interface Sides {
  readonly base: SourceMap
  readonly theirs: { readonly text: string; readonly tree: SourceMap; readonly changes: Differences }
}

/** Puts one change of theirs into a text of mine. Null where that does not give exactly this change. */
const put = (mine: string, difference: Difference, { base, theirs }: Sides): string | null => {
  const { tree } = parseSpec(mine)
  if (!tree) return null
  const toMine = differences(base, tree).counterparts
  const slots = slotsOf(tree)
  const toBase = inverse(theirs.changes.counterparts)
  const mineOf = (theirPath: string): string | undefined => {
    const at = toBase.get(theirPath)
    return at === undefined ? undefined : toMine.get(at)
  }
  const { was, now } = difference
  const own = was ? toMine.get(was.path) : undefined
  if (was && own === undefined) return null
  const parentPath = now && !was ? mineOf(now.parentPath) : undefined
  const parentNode = parentPath === '' ? tree : parentPath === undefined ? undefined : slots.get(parentPath)?.value
  // It comes behind the nearest thing before it that I have too.
  const before = now
    ? slotsIn(now.parent, now.parentPath)
        .slice(0, now.index)
        .toReversed()
        .map(({ path }) => slots.get(mineOf(path) ?? (parentPath === undefined ? '' : path)))
        .find((slot) => slot !== undefined && slot.parentPath === parentPath)
    : undefined
  const taken =
    parentPath !== undefined && now?.key != null
      ? slots.get(parentPath === '' ? now.key : `${parentPath}.${now.key}`)
      : undefined
  const after = putDifference(
    {
      text: mine,
      slot: own === undefined ? taken : slots.get(own),
      parent:
        parentPath !== undefined && parentNode && parentNode.node !== 'text'
          ? { node: parentNode, path: parentPath }
          : undefined,
      before,
    },
    theirs.text,
    difference,
  )
  if (after === null) return null
  const result = parseSpec(after).tree
  const made = result ? differences(tree, result).list : []
  // Exactly this and nothing beside it; or nothing, where I have it already.
  if (made.length === 0) return after === mine && result ? after : null
  return made.length === 1 && valueOf(made[0]?.now) === valueOf(now) ? after : null
}

/**
 * Three-way merge by path: my text keeps its comments and its spacing, and gets every change that they made since the base and
 * that does not touch a change of mine. `choose` may say otherwise: my text stands where it does not say `theirs`.
 */
export const mergeSpecs = (
  base: string,
  mine: string,
  theirs: string,
  choose: (path: string, touchesMine: boolean) => 'mine' | 'theirs' = (_, touchesMine) =>
    touchesMine ? 'mine' : 'theirs',
): Merge => {
  const trees = { base: parseSpec(base).tree, mine: parseSpec(mine).tree, theirs: parseSpec(theirs).tree }
  if (!trees.base) return { ok: false, unreadable: 'base' }
  if (!trees.mine) return { ok: false, unreadable: 'mine' }
  if (!trees.theirs) return { ok: false, unreadable: 'theirs' }
  const sides: Sides = {
    base: trees.base,
    theirs: { text: theirs, tree: trees.theirs, changes: differences(trees.base, trees.theirs) },
  }
  const own = differences(trees.base, trees.mine)
  const ownParents = inverse(own.counterparts)
  const ownPaths = own.list.map((difference) => ({ difference, path: basePath(difference, ownParents) }))
  const theirParents = inverse(sides.theirs.changes.counterparts)

  let text = mine
  const taken: MergeChange[] = []
  const conflicts: MergeChange[] = []
  for (const difference of sides.theirs.changes.list) {
    const { was, now } = difference
    const path = basePath(difference, theirParents)
    const meets = ownPaths.filter((each) => isWithin(each.path, path) || isWithin(path, each.path))
    const same = meets.length === 1 && meets[0]?.path === path && valueOf(meets[0].difference.now) === valueOf(now)
    if (same) continue
    const change: MergeChange = {
      change: was === null ? 'added' : now === null ? 'removed' : 'changed',
      path: (now ?? was)?.path ?? '',
      base: valueOf(was),
      mine: meets[0] ? valueOf(meets[0].difference.now) : valueOf(was),
      theirs: valueOf(now),
    }
    const wanted = choose(change.path, meets.length > 0) === 'theirs'
    const after = wanted ? put(text, difference, sides) : null
    if (after === null) {
      if (wanted || meets.length > 0) conflicts.push(change)
    } else {
      text = after
      taken.push(change)
    }
  }
  return { ok: true, text, taken, conflicts }
}

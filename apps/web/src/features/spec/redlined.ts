import type { Redline } from '@coldfill/contract'
import type { OutlineItem } from '@coldfill/spec'

/** Open redlines of a part of the building by its path: those on a vessel, its cells, or a place of the spec inside it. */
export const redlinesOf = (outline: OutlineItem, redlines: readonly Redline[]): ReadonlyMap<string, number> => {
  const counts = new Map<string, number>()
  const count = (path: string) => counts.set(path, (counts.get(path) ?? 0) + 1)
  const innermost = (item: OutlineItem, path: string): OutlineItem => {
    const child = item.children.find((each) => path === each.path || path.startsWith(`${each.path}.`))
    return child ? innermost(child, path) : item
  }
  // A redline names the mark alone, as the drawings do.
  const vesselsOf = (item: OutlineItem, mark: string): readonly OutlineItem[] =>
    item.sort === 'vessel'
      ? item.name === mark
        ? [item]
        : []
      : item.children.flatMap((child) => vesselsOf(child, mark))
  for (const { anchor, state } of redlines) {
    if (state === 'closed') continue
    if (anchor.type === 'spec') count(innermost(outline, anchor.path).path)
    else if (anchor.type !== 'assumption') for (const { path } of vesselsOf(outline, anchor.mark)) count(path)
  }
  return counts
}

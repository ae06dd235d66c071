import type { Span } from '../parse/line-index.ts'
import { below, type SourceList, type SourceMap, type SourceNode } from '../parse/source-tree.ts'

/** A key with its value, or an item of a list, with the block that it stands in. */
export interface Slot {
  readonly path: string
  readonly parent: SourceMap | SourceList
  readonly parentPath: string
  readonly index: number
  /** Null for an item of a list. */
  readonly key: string | null
  /** The key; the item itself in a list. */
  readonly keySpan: Span
  readonly value: SourceNode | null
}

export const slotsIn = (parent: SourceMap | SourceList, parentPath: string): readonly Slot[] =>
  parent.node === 'map'
    ? parent.entries.map(({ key, keySpan, value }, index) => ({
        path: below(parentPath, key),
        parent,
        parentPath,
        index,
        key,
        keySpan,
        value,
      }))
    : parent.items.map((value, index) => ({
        path: below(parentPath, index),
        parent,
        parentPath,
        index,
        key: null,
        keySpan: value?.span ?? parent.span,
        value,
      }))

/** Every slot of a tree by its path. */
export const slotsOf = (tree: SourceMap): ReadonlyMap<string, Slot> => {
  const slots = new Map<string, Slot>()
  const walk = (node: SourceNode | null, path: string): void => {
    if (node === null || node.node === 'text') return
    for (const slot of slotsIn(node, path)) {
      slots.set(slot.path, slot)
      walk(slot.value, slot.path)
    }
  }
  walk(tree, '')
  return slots
}

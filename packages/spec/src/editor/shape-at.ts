import type { BlockShape, Shape } from '../model/shape.ts'
import { below, entryOf, type SourceMap, type SourceNode } from '../parse/source-tree.ts'

/** The text behind a key of a block, if it is a single text. */
export const textBehind = (node: SourceNode | null | undefined, key: string): string | undefined => {
  const value = node?.node === 'map' ? entryOf(node, key)?.value : undefined
  return value?.node === 'text' ? value.text.trim() : undefined
}

/** The block that a shape is for this node: the branch that its leading key chooses, if it has one. */
export const blockFor = (shape: Shape, node: SourceNode | null): BlockShape | undefined => {
  if (shape.shape === 'block') return shape
  if (shape.shape === 'either') return shape.block
  if (shape.shape === 'branch by value') {
    const value = textBehind(node, shape.by)
    return value !== undefined && Object.hasOwn(shape.branches, value) ? shape.branches[value] : undefined
  }
  if (shape.shape !== 'branch by key' || node?.node !== 'map') return undefined
  const lead = Object.keys(shape.branches).find((key) => entryOf(node, key) !== undefined)
  return lead === undefined ? undefined : shape.branches[lead]
}

export interface PlaceInLanguage {
  readonly shape: Shape
  readonly node: SourceNode | null
  /** The nodes above, outermost first, by path. */
  readonly above: readonly { readonly path: string; readonly node: SourceNode }[]
}

const childShape = (shape: Shape, node: SourceNode | null, key: string): Shape | undefined => {
  if (shape.shape === 'map') return shape.of
  if (shape.shape === 'list') return shape.of
  const block = blockFor(shape, node)
  if (block && Object.hasOwn(block.keys, key)) return block.keys[key]
  // The leading key itself is known before it has chosen a branch.
  if (shape.shape === 'branch by value' && key === shape.by) return Object.values(shape.branches)[0]?.keys[key]
  return undefined
}

const keysOf = (node: SourceNode): readonly string[] => {
  if (node.node === 'map') return node.entries.map((entry) => entry.key)
  return node.node === 'list' ? node.items.map((_, index) => `${index}`) : []
}

const childOf = (node: SourceNode, key: string): SourceNode | null => {
  if (node.node === 'map') return entryOf(node, key)?.value ?? null
  return node.node === 'list' ? (node.items[Number(key)] ?? null) : null
}

/** What the language says of a path in a tree. Undefined where it does not know the path. */
export const shapeAt = (language: Shape, tree: SourceMap, path: string): PlaceInLanguage | undefined => {
  let shape: Shape = language
  let node: SourceNode | null = tree
  let at = ''
  const above: { path: string; node: SourceNode }[] = []
  while (at !== path) {
    if (node === null || node.node === 'text') return undefined
    const keys = keysOf(node)
    const from: SourceNode = node
    const base: string = at
    // Keys may hold dots: the longest that fits wins.
    const key: string | undefined = keys
      .filter((each) => path === below(base, each) || path.startsWith(`${below(base, each)}.`))
      .toSorted((a, b) => b.length - a.length)[0]
    const next: Shape | undefined = key === undefined ? undefined : childShape(shape, from, key)
    if (key === undefined || !next) return undefined
    above.push({ path: at, node: from })
    node = childOf(from, key)
    shape = next
    at = below(at, key)
  }
  return { shape, node, above }
}

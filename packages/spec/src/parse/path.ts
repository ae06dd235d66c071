import type { Span } from './line-index.ts'
import { below, type SourceMap, type SourceNode } from './source-tree.ts'

export interface Place {
  readonly path: string
  /** The key; the item itself in a list. */
  readonly keySpan: Span
  readonly value: SourceNode | null
}

const itemSpan = (item: SourceNode | null, list: Span): Span => item?.span ?? list

/** The place that a path names. Keys may hold dots, so each key is tried that the path could begin with. */
export const placeOf = (tree: SourceMap, path: string): Place | null => {
  const find = (node: SourceNode | null, rest: string, at: string): Place | null => {
    if (node === null || node.node === 'text') return null
    const places: { name: string; keySpan: Span; value: SourceNode | null }[] =
      node.node === 'map'
        ? node.entries.map(({ key, keySpan, value }) => ({ name: key, keySpan, value }))
        : node.items.map((item, index) => ({ name: `${index}`, keySpan: itemSpan(item, node.span), value: item }))
    for (const { name, keySpan, value } of places) {
      if (rest === name) return { path: below(at, name), keySpan, value }
      if (!rest.startsWith(`${name}.`)) continue
      const found = find(value, rest.slice(name.length + 1), below(at, name))
      if (found) return found
    }
    return null
  }
  return find(tree, path, '')
}

export interface PathAtOffset {
  /** Path of the innermost key or list item whose text holds the offset; empty outside all of them. */
  readonly path: string
  readonly part: 'key' | 'value' | 'between'
}

const holds = (span: Span, offset: number): boolean => span.start <= offset && offset <= span.end

/** The innermost place at an offset. */
export const pathAtOffset = (tree: SourceMap, offset: number): PathAtOffset => {
  let path = ''
  let node: SourceNode = tree
  for (;;) {
    if (node.node === 'text') return { path, part: 'value' }
    if (node.node === 'map') {
      const key: SourceMap['entries'][number] | undefined = node.entries.find((entry) => holds(entry.keySpan, offset))
      if (key) return { path: below(path, key.key), part: 'key' }
      const entry: SourceMap['entries'][number] | undefined = node.entries.find(
        ({ value }) => value !== null && holds(value.span, offset),
      )
      if (!entry?.value) return { path, part: 'between' }
      path = below(path, entry.key)
      node = entry.value
      continue
    }
    const index: number = node.items.findIndex((item) => item !== null && holds(item.span, offset))
    const item: SourceNode | null | undefined = node.items[index]
    if (!item) return { path, part: 'between' }
    path = below(path, index)
    node = item
  }
}

export interface Step {
  readonly path: string
  readonly key: string
  readonly keySpan: Span
  readonly value: SourceNode | null
}

/** Every key and list item in the order of the text. */
export function* places(node: SourceNode | null, path = ''): Generator<Step> {
  if (node === null || node.node === 'text') return
  if (node.node === 'map')
    for (const { key, keySpan, value } of node.entries) {
      const at = below(path, key)
      yield { path: at, key, keySpan, value }
      yield* places(value, at)
    }
  else
    for (const [index, item] of node.items.entries()) {
      const at = below(path, index)
      yield { path: at, key: `${index}`, keySpan: itemSpan(item, node.span), value: item }
      yield* places(item, at)
    }
}

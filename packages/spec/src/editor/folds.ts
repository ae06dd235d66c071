import { indexLines, type LineIndex } from '../parse/line-index.ts'
import { treeForHelp } from '../parse/recent.ts'
import { below, type SourceList, type SourceMap, type SourceNode } from '../parse/source-tree.ts'

/** Lines that can be shown as one: the first stays, the others up to `end` go. */
export interface Fold {
  /** Zero-based. */
  readonly start: number
  readonly end: number
  readonly sort: 'block' | 'comment'
  /** 1 for blocks of the whole spec, 2 for what lies in them, and so on; 0 for comments. */
  readonly level: number
  /** Path of the block; empty for comments. */
  readonly path: string
}

const lastWritten = (text: string, lines: LineIndex, end: number): number => {
  let at = end
  while (at > 0 && /\s/u.test(text.charAt(at - 1))) at -= 1
  return lines.position(at).line
}

const commentFolds = (text: string): Fold[] => {
  const folds: Fold[] = []
  let start = -1
  for (const [number, line] of [...text.split('\n'), ''].entries()) {
    const isComment = line.trimStart().startsWith('#')
    if (isComment && start < 0) start = number
    if (isComment || start < 0) continue
    if (number - 1 > start) folds.push({ start, end: number - 1, sort: 'comment', level: 0, path: '' })
    start = -1
  }
  return folds
}

/** What can be folded, in the order of the text; of several that begin on a line the outermost. */
export const foldsOf = (text: string): readonly Fold[] => {
  const tree = treeForHelp(text)
  const comments = commentFolds(text)
  if (!tree) return comments
  const lines = indexLines(text)
  const blocks = new Map<number, Fold>()
  const add = (path: string, from: number, value: SourceNode | null, level: number): void => {
    if (value === null || value.node === 'text') return
    const start = lines.position(from).line
    const end = lastWritten(text, lines, value.span.end)
    if (end > start && !blocks.has(start)) blocks.set(start, { start, end, sort: 'block', level, path })
    walk(value, path, level + 1)
  }
  const walk = (node: SourceMap | SourceList, path: string, level: number): void => {
    if (node.node === 'map')
      for (const { key, keySpan, value } of node.entries) add(below(path, key), keySpan.start, value, level)
    else
      for (const [index, item] of node.items.entries()) if (item) add(below(path, index), item.span.start, item, level)
  }
  walk(tree, '', 1)
  return [...blocks.values(), ...comments].toSorted((a, b) => a.start - b.start)
}

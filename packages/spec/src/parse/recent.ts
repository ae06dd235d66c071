import type { LineIndex } from './line-index.ts'
import { parseSpec, parseUnfinished } from './parse-spec.ts'
import type { Comment } from './scan.ts'
import type { SourceMap } from './source-tree.ts'

/** A text as it was parsed, without what was found in it. */
export interface ParsedText {
  readonly text: string
  /** Null where the text is refused or cannot be read. */
  readonly tree: SourceMap | null
  readonly comments: readonly Comment[]
  readonly lineIndex: LineIndex
}

// An editor asks many things of one text: findings, outline, folds, the place of each path. It is parsed once for all of them.
let last: ParsedText | null = null
let lastUnfinished: { readonly text: string; readonly tree: SourceMap | null } | null = null

export const recall = (parsed: ParsedText): void => {
  last = parsed
}

/** The text, parsed; the last one is remembered. */
export const parsedText = (text: string): ParsedText => {
  if (last?.text !== text) {
    const { tree, comments, lineIndex } = parseSpec(text)
    last = { text, tree, comments, lineIndex }
  }
  return last
}

/** The tree of a text, mistakes and all where it cannot be read as it is. For help at the cursor only. */
export const treeForHelp = (text: string): SourceMap | null => {
  const { tree } = parsedText(text)
  if (tree) return tree
  if (lastUnfinished?.text !== text) lastUnfinished = { text, tree: parseUnfinished(text) }
  return lastUnfinished.tree
}

import type { Range } from '../finding.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { type LineIndex, lineEnd, lineStart } from '../parse/line-index.ts'
import { parsedText, treeForHelp } from '../parse/recent.ts'
import { placeOf } from '../parse/path.ts'
import type { Comment } from '../parse/scan.ts'
import type { SourceMap } from '../parse/source-tree.ts'
import { mentionsIn } from './mentions.ts'
import { type Name, nameAt, placesOfName } from './names.ts'

export interface NameUse {
  /** `declaration`: the name is given here; `reference`: a key or value means it; `mention`: a comment or a free text has it. */
  readonly role: 'declaration' | 'reference' | 'mention'
  /** Path of the key; empty in a comment. */
  readonly path: string
  readonly range: Range
  /** The line as it is written, without its indentation. */
  readonly line: string
}

export interface NameUses {
  readonly name: Name
  /** Range of the name under the cursor. */
  readonly range: Range
  /** In the order of the text. */
  readonly uses: readonly NameUse[]
}

interface Source {
  readonly text: string
  readonly tree: SourceMap
  readonly comments: readonly Comment[]
  readonly lineIndex: LineIndex
}

const sourceOf = (text: string): Source | null => {
  const { comments, lineIndex } = parsedText(text)
  const found = treeForHelp(text)
  return found && { text, tree: found, comments, lineIndex }
}

const lineAt = (text: string, offset: number): string =>
  text.slice(lineStart(text, offset), lineEnd(text, offset)).trim()

const isIn = (offset: number, { start, end }: { start: number; end: number }): boolean =>
  start <= offset && offset <= end

const usesIn = (source: Source, offset: number, vocabulary: Vocabulary): NameUses | null => {
  const { text, tree, comments, lineIndex } = source
  const mentions = mentionsIn(text, tree, comments, vocabulary)
  const mentioned = mentions.find(({ span }) => isIn(offset, span))
  const declared = mentioned && placeOf(tree, mentioned.name.path)
  const at =
    mentioned && declared
      ? { name: mentioned.name, span: declared.keySpan, role: 'declaration' as const }
      : nameAt(tree, offset, vocabulary)
  if (!at) return null
  const uses = [
    ...placesOfName(tree, at, vocabulary).map(({ role, path, span }) => ({ role, path, span })),
    ...mentions
      .filter(({ name }) => name.path === at.name.path)
      .map(({ path, span }) => ({ role: 'mention' as const, path, span })),
  ].toSorted((a, b) => a.span.start - b.span.start)
  return {
    name: at.name,
    range: lineIndex.range(mentioned?.span ?? at.span),
    uses: uses.map(({ role, path, span }) => ({
      role,
      path,
      range: lineIndex.range(span),
      line: lineAt(text, span.start),
    })),
  }
}

/**
 * Where the name under the cursor stands: a mark, a system, a fluid, an assumption, or a word of the language behind the
 * same key. Null where no name stands or nothing can be read.
 */
export const usesOf = (text: string, offset: number, vocabulary: Vocabulary): NameUses | null => {
  const source = sourceOf(text)
  return source && usesIn(source, offset, vocabulary)
}

export interface Definition {
  readonly name: Name
  /** Range of the name under the cursor. */
  readonly range: Range
  /** Where the spec gives the name; null for a word of the language, which the reference explains. */
  readonly declared: { readonly path: string; readonly range: Range } | null
}

/** Where the name under the cursor is given. */
export const definitionAt = (text: string, offset: number, vocabulary: Vocabulary): Definition | null => {
  const found = usesOf(text, offset, vocabulary)
  if (!found) return null
  const declared = found.uses.find(({ role }) => role === 'declaration')
  return {
    name: found.name,
    range: found.range,
    declared: declared ? { path: declared.path, range: declared.range } : null,
  }
}

import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import type { Span } from '../parse/line-index.ts'
import { places } from '../parse/path.ts'
import type { Comment } from '../parse/scan.ts'
import type { SourceMap } from '../parse/source-tree.ts'
import { givenNames, type Name } from './names.ts'
import { shapeAt } from './shape-at.ts'

/** A name inside a comment or a free text. */
export interface Mention {
  readonly name: Name
  readonly span: Span
  /** Key of the text; empty in a comment. */
  readonly path: string
}

/** A word that is no ordinary word, so that it can be told in a sentence: `ET-1`, `HWS`. */
const looksLikeMark = (name: string): boolean => /\d/u.test(name) || /^[\p{Lu}_-]{2,}$/u.test(name)

const escaped = (text: string): string => text.replace(/[\\^$.*+?()[\]{}|/]/gu, '\\$&')

const EDGE = '[\\p{L}\\p{N}_-]'

const pattern = (name: Name, alone: boolean): RegExp => {
  const word = escaped(name.name)
  const path = escaped(name.path)
  const before = path.slice(0, path.length - word.length)
  // By its whole path a name is always told; alone only where it looks like a mark and no other has it.
  return alone
    ? new RegExp(`(?<!${EDGE})${word}(?!${EDGE})`, 'gu')
    : new RegExp(`(?<=(?<!${EDGE}|\\.)${before})${word}(?!${EDGE})`, 'gu')
}

interface Prose {
  readonly path: string
  readonly text: string
  readonly start: number
}

const isFreeText = (tree: SourceMap, path: string, vocabulary: Vocabulary): boolean => {
  const shape = shapeAt(specShape(vocabulary), tree, path)?.shape
  return shape?.shape === 'field' && shape.field.field === 'text' && !shape.names && !shape.refersTo
}

const proseOf = (source: string, tree: SourceMap, comments: readonly Comment[], vocabulary: Vocabulary): Prose[] => [
  ...comments
    .filter(({ text }) => !/^\s*yaml-language-server\s*:/u.test(text))
    .map(({ span }) => ({ path: '', text: source.slice(span.start, span.end), start: span.start })),
  ...[...places(tree)].flatMap(({ path, value }) =>
    value?.node === 'text' && isFreeText(tree, path, vocabulary)
      ? [{ path, text: source.slice(value.span.start, value.span.end), start: value.span.start }]
      : [],
  ),
]

/** Where names of systems, vessels and fluids stand in comments and in free texts, as in the reason of an acceptance. */
export const mentionsIn = (
  source: string,
  tree: SourceMap,
  comments: readonly Comment[],
  vocabulary: Vocabulary,
): readonly Mention[] => {
  const names = givenNames(tree)
  const prose = proseOf(source, tree, comments, vocabulary)
  return names.flatMap((name) => {
    const only = names.filter((other) => other.name === name.name).length === 1
    const finder = pattern(name, only && looksLikeMark(name.name))
    return prose.flatMap(({ path, text, start }) =>
      [...text.matchAll(finder)].map(({ index }) => ({
        name,
        path,
        span: { start: start + index, end: start + index + name.name.length },
      })),
    )
  })
}

import { isMap, isScalar, isSeq, type Node, type Pair } from 'yaml'
import type { Report } from '../report.ts'
import { maxDepth } from './limits.ts'
import type { Span } from './line-index.ts'
import {
  below,
  type SourceEntry,
  type SourceList,
  type SourceMap,
  type SourceNode,
  type SourceText,
} from './source-tree.ts'
import { reportTightColon, tightColon } from './tight-colon.ts'

type Items = Node & { readonly items: readonly unknown[]; readonly flow?: boolean }
type Key = { readonly key: string; readonly keySpan: Span; readonly quoted: boolean }

const spanOf = (node: Node): Span => ({ start: node.range?.[0] ?? 0, end: node.range?.[1] ?? 0 })

const firstCharacter = (span: Span): Span => ({ start: span.start, end: span.start + 1 })

const textOf = (node: Node): SourceText => ({
  node: 'text',
  text: isScalar(node) && typeof node.value === 'string' ? node.value : '',
  quoted: isScalar(node) && node.type !== 'PLAIN',
  span: spanOf(node),
})

const notAKey = (report: Report, span: Span): void =>
  report.add(
    'CF-Y014',
    { path: '', span },
    {
      message: 'A key is a word or a mark, not a block.',
      hint: 'Write `key: value` with a plain word before the colon.',
    },
  )

const mergeKey = (report: Report, span: Span): void =>
  report.add(
    'CF-Y011',
    { path: '', span },
    {
      message: 'The merge key `<<` is not read: a spec says each value where it holds.',
      hint: 'Write the keys out in this block.',
    },
  )

const twice = (report: Report, path: string, key: string, span: Span, first: Span): void =>
  report.add(
    'CF-Y018',
    { path, span },
    {
      message: `\`${key}\` stands twice in this block; the first one is read.`,
      hint: 'Take one of them out, or give it the name that was meant.',
      related: [{ message: `The first \`${key}\` stands here.`, path, span: first }],
    },
  )

/**
 * Copies the parser's nodes into the plain tree that is read, and says what cannot be a key. `isKey` tells the keys of the
 * language from other words: in braces a word without a colon that is no key goes on the text before it, since a comma in a
 * text is far likelier there than an unknown key without a value.
 */
export const buildTree = (
  report: Report,
  source: string,
  root: Node,
  isKey: (word: string) => boolean,
): SourceNode | null => {
  let tooDeep: Span | null = null

  const keyOf = (pair: Pair<Node | null, Node | null>, parent: Span): Key | null => {
    if (isScalar(pair.key)) {
      const { text, quoted, span } = textOf(pair.key)
      return { key: text, keySpan: span, quoted }
    }
    notAKey(report, firstCharacter(pair.key ? spanOf(pair.key) : parent))
    return null
  }

  /** The entry before, its text going on behind the comma; null where the word is a key after all. */
  const goneOn = (before: SourceEntry | undefined, { key, keySpan, quoted }: Key): SourceEntry | null => {
    if (!before || before.value?.node !== 'text' || before.value.quoted || quoted || isKey(key) || tightColon(key))
      return null
    const span = { start: before.value.span.start, end: keySpan.end }
    const text = source.slice(span.start, span.end)
    return /[\n#]/u.test(text) ? null : { ...before, value: { node: 'text', text, quoted: false, comma: true, span } }
  }

  const map = (node: Items, path: string, depth: number): SourceMap => {
    const span = spanOf(node)
    const flow = node.flow === true
    const seen = new Map<string, Span>()
    const entries: SourceEntry[] = []
    for (const pair of node.items as Pair<Node | null, Node | null>[]) {
      const named = keyOf(pair, span)
      if (!named) continue
      const bare = flow && pair.value === null
      const continued = bare ? goneOn(entries.at(-1), named) : null
      if (continued) {
        entries[entries.length - 1] = continued
        continue
      }
      const tight = bare ? tightColon(named.key) : null
      const key = tight?.key ?? named.key
      const keySpan = { start: named.keySpan.start, end: tight ? named.keySpan.start + key.length : named.keySpan.end }
      const at = below(path, key)
      const first = seen.get(key)
      if (first) {
        twice(report, at, key, keySpan, first)
        continue
      }
      seen.set(key, keySpan)
      if (key === '<<' && !named.quoted) mergeKey(report, keySpan)
      else if (tight) {
        reportTightColon(report, at, keySpan.start, tight)
        const rest = { start: keySpan.end + 1, end: named.keySpan.end }
        entries.push({ key, keySpan, value: { node: 'text', text: tight.rest, quoted: false, span: rest } })
      } else entries.push({ key, keySpan, value: pair.value ? value(pair.value, at, depth + 1) : null })
    }
    return { node: 'map', entries, flow, span }
  }

  const list = (node: Items, path: string, depth: number): SourceList => ({
    node: 'list',
    items: (node.items as (Node | null)[]).map((item, index) =>
      item ? value(item, below(path, index), depth + 1) : null,
    ),
    flow: node.flow === true,
    span: spanOf(node),
  })

  const value = (node: Node, path: string, depth: number): SourceNode | null => {
    if (depth > maxDepth) {
      tooDeep ??= firstCharacter(spanOf(node))
      return null
    }
    if (isMap(node)) return map(node, path, depth)
    if (isSeq(node)) return list(node, path, depth)
    const text = textOf(node)
    return text.text === '' && !text.quoted ? null : text
  }

  const tree = value(root, '', 0)
  if (tooDeep === null) return tree
  report.add(
    'CF-Y012',
    { path: '', span: tooDeep },
    {
      message: `The text is nested deeper than ${maxDepth} levels here; it is not read.`,
      hint: 'A spec needs no more than eight levels: take out the brackets or dashes that are not needed.',
    },
  )
  return null
}

import { lineEnd, lineStart, type Span } from '../parse/line-index.ts'
import { parseUnfinished } from '../parse/parse-spec.ts'
import { type Step, places } from '../parse/path.ts'
import type { SourceMap } from '../parse/source-tree.ts'

/** What a person is typing at the cursor: a key or a value, where it belongs, and the tree around it. */
export interface Cursor {
  readonly part: 'key' | 'value'
  /** Path of the block that the key is typed into, or of the key whose value is typed. */
  readonly path: string
  /** The text that a completion replaces. */
  readonly span: Span
  readonly typed: string
  /** Written inside braces or brackets. */
  readonly inBraces: boolean
  /** Whether a colon follows the key already. */
  readonly hasColon: boolean
  readonly tree: SourceMap
}

// A word that nobody types, put in the place of what is being typed so that the text around it can be read.
const PROBE = 'probe-at-the-cursor'

interface Segment {
  readonly start: number
  readonly end: number
  readonly inBraces: boolean
}

/** Where the innermost open brace or the last comma in it stands before the cursor on its line, quotes left out. */
const openBrace = (line: string): number => {
  const open: number[] = []
  let quote = ''
  for (let at = 0; at < line.length; at++) {
    const character = line.charAt(at)
    if (quote !== '') {
      if (character === quote) quote = ''
    } else if ((character === '"' || character === "'") && /[\s,:[{]/u.test(line.charAt(at - 1))) quote = character
    else if (character === '{' || character === '[') open.push(at + 1)
    else if (character === '}' || character === ']') open.pop()
    else if (character === ',' && open.length > 0) open[open.length - 1] = at + 1
  }
  return open.at(-1) ?? -1
}

/** The key with its value that the cursor is in. */
const segmentAt = (text: string, offset: number): Segment | null => {
  const start = lineStart(text, offset)
  const end = lineEnd(text, offset)
  const before = text.slice(start, offset)
  if (/(?:^|\s)#/u.test(before)) return null
  const brace = openBrace(before)
  if (brace >= 0) {
    const rest = /^[^,}\]#]*/u.exec(text.slice(offset, end))?.[0].length ?? 0
    return { start: start + brace, end: offset + rest, inBraces: true }
  }
  const lead = /^\s*(?:-\s+)*/u.exec(before)?.[0].length ?? 0
  const comment = /\s#/u.exec(text.slice(offset, end))
  return { start: start + lead, end: comment ? offset + comment.index : end, inBraces: false }
}

const trimmed = (text: string, span: Span): Span => {
  const source = text.slice(span.start, span.end)
  const lead = source.length - source.trimStart().length
  const start = Math.min(span.start + lead, span.end)
  return { start, end: Math.max(start, span.end - (source.length - source.trimEnd().length)) }
}

const placeOfProbe = (tree: SourceMap, part: Cursor['part']): Step | undefined => {
  for (const step of places(tree)) {
    if (part === 'key' ? step.key === PROBE : step.value?.node === 'text' && step.value.text === PROBE) return step
  }
  return undefined
}

/** The cursor with the tree around it. Null where nothing can be completed, as in a comment. */
export const cursorAt = (text: string, offset: number): Cursor | null => {
  const segment = segmentAt(text, offset)
  if (!segment) return null
  const { inBraces } = segment
  const source = text.slice(segment.start, segment.end)
  const colon = /:(?:\s|$)/u.exec(source)
  const inKey = !colon || offset <= segment.start + colon.index
  const part = inKey ? 'key' : 'value'
  const whole = inKey
    ? { start: segment.start, end: segment.start + (colon?.index ?? source.length) }
    : { start: segment.start + (colon?.index ?? 0) + 1, end: segment.end }
  const span = trimmed(text, whole)
  // On an empty place the cursor says where the key will stand.
  const place = span.start === span.end ? { start: offset, end: offset } : span
  const hasColon = inKey && colon !== null
  const put = inKey && !hasColon ? `${PROBE}: ` : PROBE
  const gap = !inKey && place.start > 0 && text.charAt(place.start - 1) === ':' ? ' ' : ''
  const tree = parseUnfinished(text.slice(0, place.start) + gap + put + text.slice(place.end))
  const step = tree && placeOfProbe(tree, part)
  if (!tree || !step) return null
  const path = inKey ? step.path.slice(0, Math.max(0, step.path.length - PROBE.length - 1)) : step.path
  return {
    part,
    path,
    span: place,
    typed: text.slice(place.start, Math.max(place.start, Math.min(offset, place.end))),
    inBraces,
    hasColon,
    tree,
  }
}

export const isProbe = (word: string): boolean => word === PROBE

import { placeholder } from '../model/block.ts'
import { lineStart } from '../parse/line-index.ts'
import { below } from '../parse/source-tree.ts'
import type { Edit } from '../report.ts'
import { type Block, type Context, type Entry, keyAt } from './context.ts'
import { allOf, nearest, oneOf } from './nearest.ts'

const MOST_LISTED = 16

/** A text as it must stand to be read again as the same text. */
export const asScalar = (text: string, inBraces: boolean): string => {
  const plain =
    /^[\p{L}\p{N}(/.+-]/u.test(text) &&
    !/^-(?:\s|$)/u.test(text) &&
    !/:(?:\s|$)|\s#|\s$/u.test(text) &&
    !(inBraces && /[,[\]{}]/u.test(text))
  return plain ? text : `'${text.replaceAll("'", "''")}'`
}

/** A change that puts a key with its value at the head of a block, in its own style. */
export const insertKey = (context: Context, block: Block, key: string, value: string): Edit[] => {
  const first = block.map.entries[0]
  const inBraces = block.map.flow
  const line = `${key}: ${/^[{[]/u.test(value) || value === placeholder ? value : asScalar(value, inBraces)}`
  const title = `Put in \`${line}\``
  if (!first) {
    if (!inBraces) return []
    const at = block.map.span.start + 1
    return [{ title, span: { start: at, end: at }, text: ` ${line} ` }]
  }
  const at = first.keySpan.start
  if (inBraces) return [{ title, span: { start: at, end: at }, text: `${line}, ` }]
  return [{ title, span: { start: at, end: at }, text: `${line}\n${' '.repeat(at - lineStart(context.text, at))}` }]
}

export interface UnknownKey {
  /** "an expansion tank", "`pressure`" */
  readonly owner: string
  readonly known: readonly string[]
  /** Those of them that are shown; all where not said. */
  readonly listed?: readonly string[]
  /** What a person who writes this key here most likely looked for. */
  readonly elsewhere?: (key: string) => string | undefined
}

/** Says that a block has no such key, and which it has. */
export const unknownKey = (
  context: Context,
  entry: Entry,
  { owner, known, listed = known, elsewhere }: UnknownKey,
): void => {
  const place = elsewhere?.(entry.key)
  const near = place === undefined ? nearest(entry.key, known) : undefined
  if (near !== undefined) context.meant.add(entry.path.slice(0, entry.path.length - entry.key.length) + near)
  const list =
    listed.length === 0
      ? 'It has no keys.'
      : `Its keys are ${allOf(listed.slice(0, MOST_LISTED))}${listed.length > MOST_LISTED ? ' and others' : ''}.`
  context.report.add('CF-S003', keyAt(entry), {
    message: `${owner} has no key \`${entry.key}\`.`,
    hint: place ?? (near === undefined ? list : `Did you mean \`${near}\`? ${list}`),
    fixes: near === undefined ? [] : [{ title: `Write ${near}`, span: entry.keySpan, text: near }],
  })
}

export interface MissingKey {
  readonly keys: readonly [string, ...string[]]
  readonly message: string
  readonly example: string
  /** What is put in where the fix is taken: a placeholder, or a block around one. */
  readonly put?: string
  /** Paths that cannot be sized without it; the block where not said. */
  readonly blocks?: readonly string[]
}

/** Says once that a block lacks a key, unless a misspelled key in it most likely is that key. */
export const missingKey = (
  context: Context,
  block: Block,
  { keys, message, example, put = placeholder, blocks }: MissingKey,
): void => {
  if (keys.some((key) => context.meant.has(below(block.path, key)))) return
  const [first] = keys
  context.report.add(
    'CF-S004',
    { path: block.path, span: block.span },
    {
      message,
      hint: `Write \`${first}: ${example}\`${keys.length > 1 ? `, or give ${oneOf(keys.slice(1))}` : ''}.`,
      // A value would be made up, so that what is still to be said is said by nobody.
      fixes: insertKey(context, block, first, put),
      ...(blocks && { blocks }),
    },
  )
}

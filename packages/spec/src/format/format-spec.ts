import { type LineIndex, lineStart } from '../parse/line-index.ts'
import { parseSpec } from '../parse/parse-spec.ts'
import type { SourceMap, SourceNode } from '../parse/source-tree.ts'
import { spaceLine } from './space-line.ts'

const STEP = 2

/** What a line begins with, and how far in it belongs. */
interface Placed {
  readonly column: number
  /** Column at which the line began before. */
  readonly was: number
}

const columnOf = (text: string, offset: number): number => offset - lineStart(text, offset)

/** The column of the first key or dash of each line that has one, by line number. */
const placeLines = (text: string, tree: SourceMap, lineOf: (offset: number) => number): Map<number, Placed> => {
  const placed = new Map<number, Placed>()

  const place = (offset: number, column: number): void => {
    const line = lineOf(offset)
    const start = lineStart(text, offset)
    const first = start + (/^\s*/u.exec(text.slice(start, offset))?.[0].length ?? 0)
    // A key behind a dash stands where the dash puts it.
    if (first !== offset || placed.has(line)) return
    placed.set(line, { column, was: columnOf(text, offset) })
  }

  const walk = (node: SourceNode | null, column: number): void => {
    if (node === null || node.node === 'text' || node.flow) return
    if (node.node === 'map')
      for (const { keySpan, value } of node.entries) {
        place(keySpan.start, column)
        walk(value, column + STEP)
      }
    else
      for (const item of node.items) {
        const start = item?.span.start
        if (start === undefined) continue
        const dash = text.lastIndexOf('-', start - 1)
        place(dash, column)
        walk(item, column + STEP)
      }
  }
  walk(tree, 0)
  return placed
}

const isBlank = (line: string): boolean => line.trim() === ''

const isComment = (line: string): boolean => line.trimStart().startsWith('#')

/** Lines that go on with the value of the line before: moved along with it, not laid out. */
const moved = (line: string, by: number): string => {
  const lead = /^ */u.exec(line)?.[0].length ?? 0
  return by < 0 ? line.slice(Math.min(lead, -by)) : ' '.repeat(by) + line
}

const sameNode = (a: SourceNode | null, b: SourceNode | null): boolean => {
  if (a === null || b === null) return a === b
  if (a.node === 'text') return b.node === 'text' && a.text === b.text
  if (a.node === 'map')
    return (
      b.node === 'map' &&
      a.entries.length === b.entries.length &&
      a.entries.every((entry, index) => {
        const other = b.entries[index]
        return other !== undefined && entry.key === other.key && sameNode(entry.value, other.value)
      })
    )
  return (
    b.node === 'list' &&
    a.items.length === b.items.length &&
    a.items.every((item, index) => sameNode(item, b.items[index] ?? null))
  )
}

/** The text laid out by its tree. */
const layOut = (
  text: string,
  { tree, lineIndex }: { readonly tree: SourceMap; readonly lineIndex: LineIndex },
): string => {
  const placed = placeLines(text, tree, (offset) => lineIndex.position(offset).line)
  const ending = text.includes('\r\n') ? '\r\n' : '\n'
  const lines = text.split(/\r?\n/u)
  const next = (from: number): Placed | undefined => {
    for (let line = from; line < lines.length; line++) if (placed.has(line)) return placed.get(line)
    return undefined
  }
  let above: Placed = { column: 0, was: 0 }
  const laidOut = lines.map((line, number) => {
    if (isBlank(line)) return ''
    const here = placed.get(number)
    if (here) {
      above = here
      return ' '.repeat(here.column) + spaceLine(line.slice(here.was))
    }
    if (!isComment(line)) return moved(line, above.column - above.was).trimEnd()
    // A comment belongs to the key below where it stands in its column, and to the key above otherwise.
    const column = /^\s*/u.exec(line)?.[0].length ?? 0
    const below = next(number)
    const anchor = below && below.was === column ? below : above
    const shift = anchor === above && column === above.was ? above.column - above.was : anchor.column - anchor.was
    return ' '.repeat(Math.max(0, column + shift)) + line.trim()
  })
  return laidOut.join(ending)
}

/**
 * Tidies indentation and spacing, and nothing else: keys keep their order, texts their quotes, comments and blank lines their
 * place, long lines their length. Formatting a formatted text changes nothing. A text that cannot be read stays as it is, and
 * so does one that would not say the same or would not come to rest.
 */
export const formatSpec = (text: string): string => {
  const { tree, lineIndex } = parseSpec(text)
  if (!tree) return text
  const formatted = layOut(text, { tree, lineIndex })
  if (formatted === text) return text
  const again = parseSpec(formatted)
  if (!again.tree || !sameNode(tree, again.tree)) return text
  return layOut(formatted, { tree: again.tree, lineIndex: again.lineIndex }) === formatted ? formatted : text
}

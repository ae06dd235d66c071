import { flowText } from '../compare/flow-text.ts'
import type { Slot } from '../compare/slots.ts'
import { lineEnd, lineStart, type Span } from '../parse/line-index.ts'
import { asScalar } from '../read/keys.ts'

/** Where the slot begins: its key, or the dash of the item. */
const beginning = (text: string, { key, keySpan }: Slot): number =>
  key === null ? text.lastIndexOf('-', keySpan.start - 1) : keySpan.start

/** Behind the last character that belongs to the slot. */
export const ending = (text: string, { keySpan, value }: Slot): number => {
  const end = Math.max(keySpan.end, value?.span.end ?? 0)
  // The span of a block goes on to where the next one begins.
  return end - (text.slice(0, end).length - text.slice(0, end).trimEnd().length)
}

export const columnOf = (text: string, slot: Slot): number => {
  const start = beginning(text, slot)
  return start - lineStart(text, start)
}

/** The lines of a slot that has them to itself, the line feed included. Null where it stands in braces or behind a dash. */
export const linesOf = (text: string, slot: Slot): Span | null => {
  if (slot.parent.flow) return null
  const start = beginning(text, slot)
  const line = lineStart(text, start)
  if (start < line || text.slice(line, start).trim() !== '') return null
  const end = lineEnd(text, ending(text, slot))
  return { start: line, end: Math.min(end + 1, text.length) }
}

/** The slot on one line. */
export const inline = ({ key, value }: Slot, inBraces: boolean): string => {
  const text = value?.node === 'text' ? asScalar(value.text.trim(), inBraces) : flowText(value)
  if (key !== null) return `${asScalar(key, inBraces)}: ${text}`.trimEnd()
  return inBraces ? text : `- ${text}`
}

/** The lines of a slot as they are written, moved to another column; on one line where it has none to itself. */
export const movedLines = (text: string, slot: Slot, column: number): string => {
  const lines = linesOf(text, slot)
  if (!lines) return `${' '.repeat(column)}${inline(slot, false)}\n`
  const by = column - columnOf(text, slot)
  const moved = text
    .slice(lines.start, lines.end)
    .replace(/\n$/u, '')
    .split('\n')
    .map((line) => (line.trim() === '' ? line : by < 0 ? line.slice(-by) : ' '.repeat(by) + line))
  return `${moved.join('\n')}\n`
}

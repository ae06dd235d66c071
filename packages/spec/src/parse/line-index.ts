import type { Position, Range } from '../finding.ts'

/** A part of the text by UTF-16 offsets; `end` is behind the last character. */
export interface Span {
  readonly start: number
  readonly end: number
}

/** Offset of the first character of the line that an offset is on. */
export const lineStart = (text: string, offset: number): number =>
  offset <= 0 ? 0 : text.lastIndexOf('\n', offset - 1) + 1

/** Offset behind the last character of the line that an offset is on. */
export const lineEnd = (text: string, offset: number): number => {
  const end = text.indexOf('\n', offset)
  return end < 0 ? text.length : end
}

/** Turns offsets of a text into lines and characters and back. */
export interface LineIndex {
  readonly lines: number
  position(offset: number): Position
  range(span: Span): Range
  /** Offsets outside the text are brought to its ends. */
  offset(position: Position): number
}

export const indexLines = (text: string): LineIndex => {
  const starts = [0]
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) starts.push(at + 1)
  const position = (offset: number): Position => {
    const inside = Math.max(0, Math.min(offset, text.length))
    let low = 0
    let high = starts.length - 1
    while (low < high) {
      const middle = (low + high + 1) >> 1
      if ((starts[middle] ?? 0) <= inside) low = middle
      else high = middle - 1
    }
    return { line: low, character: inside - (starts[low] ?? 0) }
  }
  return {
    lines: starts.length,
    position,
    range: (span) => ({ start: position(span.start), end: position(span.end) }),
    offset: ({ line, character }) => {
      if (line < 0) return 0
      if (line >= starts.length) return text.length
      const next = starts[line + 1] ?? text.length + 1
      return Math.min((starts[line] ?? 0) + Math.max(0, character), next - 1)
    },
  }
}

import type { TableCellContent, TableColumn } from './table.ts'

/** Size of the type in twips, and how much wider the bold head runs. */
const TYPE = { table: { head: 160, body: 170 }, schedule: { head: 140, body: 150 } } as const
const BOLD = 1.08

/** Left and right margin of a cell, with a little for rounding. */
const PADDING = 150

/** Width of a character in ems, roughly as the body family has it. */
const em = (character: string): number => {
  if (/[A-Z%°Δ]/.test(character)) return character === 'I' ? 0.3 : 0.7
  if (/[ijlt.,()'/-]/.test(character)) return 0.33
  return /[mw]/.test(character) ? 0.8 : 0.56
}

/** Words break at spaces; a long one also behind a hyphen or slash. */
const words = (text: string): string[] =>
  text.split(/\s+/).flatMap((word) => (word.length > 14 ? word.split(/(?<=[/-])/) : [word]))

const widest = (text: string): number =>
  Math.max(0, ...words(text).map((word) => Array.from(word).reduce((sum, character) => sum + em(character), 0)))

/** Room that a column needs so that no word of it is broken. */
const need = (
  column: TableColumn,
  cells: readonly (TableCellContent | undefined)[],
  { head, body }: { head: number; body: number },
): number =>
  PADDING +
  Math.max(
    widest(column.heading) * head * BOLD,
    ...cells.map((cell) => (typeof cell === 'string' ? widest(cell) * body * BOLD : 0)),
  )

/**
 * Widths in whole twips that add up to `total`. Each column first gets what its longest word needs; what is left goes
 * where the wished shares are furthest from met. Where there is too little for all words, every column gives way alike.
 */
export const columnWidths = (
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCellContent[])[],
  total: number,
  size: keyof typeof TYPE,
): number[] => {
  const shares = columns.reduce((sum, column) => sum + column.width, 0)
  const wishes = columns.map((column) => (column.width / shares) * total)
  const needs = columns.map((column, index) =>
    need(
      column,
      rows.map((row) => row[index]),
      TYPE[size],
    ),
  )
  const least = needs.reduce((sum, width) => sum + width, 0)
  const exact = least >= total ? needs.map((width) => (width / least) * total) : spread(needs, wishes, total - least)
  const widths = exact.map(Math.floor)
  const last = widths.length - 1
  widths[last] = (widths[last] ?? 0) + total - widths.reduce((sum, width) => sum + width, 0)
  return widths
}

const spread = (needs: readonly number[], wishes: readonly number[], left: number): number[] => {
  const wanting = needs.map((width, index) => Math.max(0, (wishes[index] ?? 0) - width))
  const sum = wanting.reduce((all, width) => all + width, 0)
  return needs.map((width, index) => width + (sum > 0 ? ((wanting[index] ?? 0) / sum) * left : left / needs.length))
}

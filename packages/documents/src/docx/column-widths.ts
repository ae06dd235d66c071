import type { TableCellContent, TableColumn } from './table.ts'

/** Twips that a character takes at most on average, bold in the head and plain in the body, by size of table. */
const CHARACTER = { table: { head: 100, body: 92 }, schedule: { head: 88, body: 82 } } as const

/** Left and right margin of a cell. */
const PADDING = 150

const longestWord = (text: string): number => Math.max(0, ...text.split(/[\s/-]+/).map((word) => word.length))

/** Room that a column needs so that no word of it is broken. */
const need = (
  column: TableColumn,
  cells: readonly (TableCellContent | undefined)[],
  { head, body }: { head: number; body: number },
): number =>
  PADDING +
  Math.max(
    longestWord(column.heading) * head,
    ...cells.map((cell) => (typeof cell === 'string' ? longestWord(cell) * body : 0)),
  )

/**
 * Widths in whole twips that add up to `total`. Each column first gets what its longest word needs; what is left goes
 * where the wished shares are furthest from met. Where there is too little for all words, every column gives way alike.
 */
export const columnWidths = (
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCellContent[])[],
  total: number,
  size: keyof typeof CHARACTER,
): number[] => {
  const shares = columns.reduce((sum, column) => sum + column.width, 0)
  const wishes = columns.map((column) => (column.width / shares) * total)
  const needs = columns.map((column, index) =>
    need(
      column,
      rows.map((row) => row[index]),
      CHARACTER[size],
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

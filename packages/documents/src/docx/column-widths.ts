import { longestWord } from './letter-widths.ts'
import type { TableCellContent, TableColumn } from './table.ts'

/** Size of the type of head and body in twips. */
export const TYPE = {
  table: { head: 160, body: 170 },
  schedule: { head: 140, body: 150 },
  small: { head: 130, body: 140 },
} as const

export type TableSize = keyof typeof TYPE

/** Left and right margin of a cell, with a little for rounding. */
const PADDING = 150

/** Room that each column needs so that no word of it is broken, in twips. */
export const columnNeeds = (
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCellContent[])[],
  size: TableSize,
  strongFirst = true,
): number[] => {
  const { head, body } = TYPE[size]
  return columns.map(
    (column, index) =>
      PADDING +
      Math.ceil(
        rows.reduce(
          (most, row) => {
            const cell = row[index]
            return typeof cell === 'string'
              ? Math.max(most, longestWord(cell, strongFirst && index === 0) * body)
              : most
          },
          longestWord(column.heading, true) * head,
        ),
      ),
  )
}

/**
 * Widths in whole twips that add up to `total`. Each column first gets what its longest word needs; what is left goes
 * where the wished shares are furthest from met. Where there is too little for all words, every column gives way alike.
 */
export const columnWidths = (
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCellContent[])[],
  total: number,
  size: TableSize,
  strongFirst = true,
): number[] => {
  const shares = columns.reduce((sum, column) => sum + column.width, 0)
  const wishes = columns.map((column) => (column.width / shares) * total)
  const needs = columnNeeds(columns, rows, size, strongFirst)
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

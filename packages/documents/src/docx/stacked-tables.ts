import { columnNeeds, type TableSize } from './column-widths.ts'
import type { TableCellContent, TableColumn } from './table.ts'

export interface StackedPart {
  /** Places of its columns in the whole table; the first column leads every part. */
  readonly columns: readonly number[]
  readonly size: TableSize
}

const sum = (numbers: readonly number[]): number => numbers.reduce((all, number) => all + number, 0)

/** Contiguous groups of at most `most` in width, as few as will do and as even as they can be. */
const evenGroups = (places: readonly number[], needs: readonly number[], most: number): number[][] => {
  const groupsWithin = (limit: number): number[][] => {
    const groups: number[][] = [[]]
    let used = 0
    for (const place of places) {
      const need = needs[place] ?? 0
      if (used + need > limit && used > 0) {
        groups.push([])
        used = 0
      }
      groups.at(-1)?.push(place)
      used += need
    }
    return groups
  }
  const fewest = groupsWithin(most)
  let best = fewest
  for (let limit = most; limit > 0; limit -= most / 40) {
    const groups = groupsWithin(limit)
    if (groups.length > fewest.length || groups.some((group) => sum(group.map((place) => needs[place] ?? 0)) > limit))
      break
    best = groups
  }
  return best
}

/**
 * A wide table as tables that stand under each other and each fit `width` without a broken word. One table is best, in
 * smaller type if that is enough; else it parts where `breaks` says (places of columns that begin a part), and what still
 * is too wide parts evenly. The first column is repeated in every part.
 */
export const stackedParts = (
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCellContent[])[],
  width: number,
  breaks: readonly number[] = [],
): StackedPart[] => {
  const all = columns.map((_, place) => place)
  for (const size of ['schedule', 'small'] as const) {
    if (sum(columnNeeds(columns, rows, size)) <= width) return [{ columns: all, size }]
  }
  const first = all.slice(1)
  const starts = [...new Set([1, ...breaks])].filter((place) => place > 0 && place < columns.length)
  starts.sort((a, b) => a - b)
  const groups = starts.map((start, index) =>
    first.filter((place) => place >= start && place < (starts[index + 1] ?? Infinity)),
  )
  return groups.flatMap((group) => {
    for (const size of ['schedule', 'small'] as const) {
      const needs = columnNeeds(columns, rows, size)
      const most = width - (needs[0] ?? 0)
      if (sum(group.map((place) => needs[place] ?? 0)) <= most) return [{ columns: [0, ...group], size }]
    }
    const needs = columnNeeds(columns, rows, 'schedule')
    return evenGroups(group, needs, width - (needs[0] ?? 0)).map((part): StackedPart => ({
      columns: [0, ...part],
      size: 'schedule',
    }))
  })
}

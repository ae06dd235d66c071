export interface TextColumn {
  readonly heading: string
  readonly align: 'left' | 'right'
}

/** A table for a terminal: columns as wide as their widest cell, two spaces between. */
export const textTable = (columns: readonly TextColumn[], rows: readonly (readonly string[])[]): string => {
  const widths = columns.map((column, index) =>
    Math.max(column.heading.length, ...rows.map((row) => (row[index] ?? '').length)),
  )
  const line = (cells: readonly string[]) =>
    columns
      .map((column, index) => {
        const cell = cells[index] ?? ''
        const width = widths[index] ?? 0
        return column.align === 'right' ? cell.padStart(width) : cell.padEnd(width)
      })
      .join('  ')
      .trimEnd()
  return [
    line(columns.map((column) => column.heading)),
    line(widths.map((width) => '-'.repeat(width))),
    ...rows.map(line),
  ].join('\n')
}

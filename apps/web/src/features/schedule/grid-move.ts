export interface GridPlace {
  readonly row: number
  readonly column: number
}

const clamp = (value: number, most: number) => Math.min(Math.max(value, 0), most)

/** Where a key leads in a grid of cells; null for keys that do not move. Rows of a page: 10. */
export const moveInGrid = (
  from: GridPlace,
  key: { readonly key: string; readonly ctrl: boolean },
  size: { readonly rows: number; readonly columns: number },
): GridPlace | null => {
  const last = { row: size.rows - 1, column: size.columns - 1 }
  const to = (row: number, column: number): GridPlace => ({
    row: clamp(row, last.row),
    column: clamp(column, last.column),
  })
  switch (key.key) {
    case 'ArrowUp':
      return to(from.row - 1, from.column)
    case 'ArrowDown':
      return to(from.row + 1, from.column)
    case 'ArrowLeft':
      return to(from.row, from.column - 1)
    case 'ArrowRight':
      return to(from.row, from.column + 1)
    case 'Home':
      return to(key.ctrl ? 0 : from.row, 0)
    case 'End':
      return to(key.ctrl ? last.row : from.row, last.column)
    case 'PageUp':
      return to(from.row - 10, from.column)
    case 'PageDown':
      return to(from.row + 10, from.column)
    default:
      return null
  }
}

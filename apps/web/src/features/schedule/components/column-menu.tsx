import type { Schedule } from '../schedule-table.ts'

interface Props {
  readonly tables: readonly Schedule[]
  readonly hidden: ReadonlySet<string>
  readonly onChange: (hidden: ReadonlySet<string>) => void
}

/** Which columns are shown. Hidden ones are listed when the sheet is printed. */
export const ColumnMenu = ({ tables, hidden, onChange }: Props) => {
  const columns = new Map(
    tables.flatMap((table) => table.columns.map((column) => [column.key, column.heading] as const)),
  )
  if (columns.size === 0) return null
  return (
    <details className="relative">
      <summary className="flex h-8 cursor-pointer list-none items-center border-[1.5px] border-rule px-3 font-medium hover:border-ink">
        Columns{hidden.size > 0 ? ` (${hidden.size} hidden)` : ''}
      </summary>
      <fieldset className="absolute right-0 z-30 mt-1 max-h-80 w-60 overflow-y-auto border-2 border-ink bg-sheet p-3">
        <legend className="sr-only">Columns shown</legend>
        {[...columns].map(([key, heading]) => (
          <label key={key} className="flex min-h-6 items-center gap-2 text-cell">
            <input
              type="checkbox"
              className="size-4 accent-steel"
              checked={!hidden.has(key)}
              onChange={() => {
                const next = new Set(hidden)
                if (!next.delete(key)) next.add(key)
                onChange(next)
              }}
            />
            {heading}
          </label>
        ))}
      </fieldset>
    </details>
  )
}

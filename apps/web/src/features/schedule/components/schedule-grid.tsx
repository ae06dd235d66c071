import { columnVisibilityFeature, createColumnHelper, tableFeatures, useTable } from '@tanstack/react-table'
import { useEffect, useMemo, useRef, type KeyboardEvent, type ReactNode } from 'react'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { moveInGrid } from '../grid-move.ts'
import type { Row, Schedule } from '../schedule-table.ts'

/** What stands on a cell beside its value: flags of redlines, the value before, a cloud. */
export interface CellMarks {
  /** In place of the value: what was and what is. */
  readonly value?: ReactNode
  readonly after?: ReactNode
  readonly around?: ReactNode
}

interface Props {
  readonly schedule: Schedule
  readonly hidden: ReadonlySet<string>
  /** Row id and column key of the chosen cell. */
  readonly chosen: { readonly row: string; readonly column: string } | null
  readonly onChoose: (row: Row, column: string) => void
  readonly onTrace: () => void
  readonly onRedline: (row: Row, column: string) => void
  readonly marks: (row: Row, column: string) => CellMarks
}

const features = tableFeatures({ columnVisibilityFeature })
const helper = createColumnHelper<typeof features, Row>()

/** Least widths of columns of words, so that a row stays low. */
const wordWidths: Readonly<Record<string, string>> = {
  serves: 'min-w-32',
  fluid: 'min-w-28',
  construction: 'min-w-20',
  method: 'min-w-24',
  'selected-vessel': 'min-w-44',
  assumptions: 'min-w-28',
  notes: 'min-w-12',
}

/** One schedule as a grid: arrows move, Enter goes to the trace, Shift+F2 starts a redline. A real table underneath. */
export const ScheduleGrid = ({ schedule, hidden, chosen, onChoose, onTrace, onRedline, marks }: Props) => {
  const columns = useMemo(
    () =>
      helper.columns([
        helper.accessor((row) => row.vessel.mark, { id: 'mark', header: 'Mark', enableHiding: false }),
        ...schedule.columns.map((column) =>
          helper.accessor((row) => row.cells[column.key]?.text ?? '—', { id: column.key, header: column.heading }),
        ),
      ]),
    [schedule],
  )
  const columnVisibility = useMemo(() => Object.fromEntries([...hidden].map((key) => [key, false])), [hidden])
  const table = useTable({
    features,
    columns,
    data: schedule.rows,
    getRowId: (row) => row.id,
    state: { columnVisibility },
  })
  const body = useRef<HTMLTableSectionElement>(null)
  const byKey = new Map(schedule.columns.map((column) => [column.key, column]))
  const rows = table.getRowModel().rows
  const shown = table.getVisibleLeafColumns()

  const rowAt = Math.max(
    0,
    rows.findIndex((row) => row.id === chosen?.row),
  )
  const columnAt = Math.max(
    0,
    shown.findIndex((column) => column.id === chosen?.column),
  )
  const hasChosen = rows.some((row) => row.id === chosen?.row)

  // An address may name a cell that stands outside the window.
  const first = useRef(true)
  useEffect(() => {
    if (!hasChosen || !first.current) return
    first.current = false
    body.current?.rows[rowAt]?.cells[columnAt]?.scrollIntoView({ block: 'nearest', inline: 'center' })
  }, [hasChosen, rowAt, columnAt])

  const onKeyDown = (event: KeyboardEvent) => {
    const row = rows[rowAt]?.original
    const column = shown[columnAt]?.id
    if (!row || column === undefined) return
    if (event.key === 'Enter' || (event.key === 'F2' && !event.shiftKey)) {
      event.preventDefault()
      onChoose(row, column)
      onTrace()
      return
    }
    if (event.key === 'F2' && event.shiftKey) {
      event.preventDefault()
      onRedline(row, column)
      return
    }
    const to = moveInGrid(
      { row: rowAt, column: columnAt },
      { key: event.key, ctrl: event.ctrlKey || event.metaKey },
      { rows: rows.length, columns: shown.length },
    )
    if (!to) return
    event.preventDefault()
    const next = rows[to.row]?.original
    const nextColumn = shown[to.column]?.id
    if (next && nextColumn !== undefined) onChoose(next, nextColumn)
    const cell = body.current?.rows[to.row]?.cells[to.column]
    cell?.focus()
  }

  return (
    <div className="max-w-full overflow-x-auto border-t-[3px] border-b-2 border-ink print:overflow-visible">
      <table
        role="grid"
        aria-label={schedule.title}
        aria-rowcount={rows.length + 1}
        aria-colcount={shown.length}
        className="w-full text-cell"
      >
        <thead>
          <tr>
            {table.getHeaderGroups().flatMap((group) =>
              group.headers.map((header) => {
                const column = byKey.get(header.column.id)
                return (
                  <th
                    key={header.id}
                    scope="col"
                    className={`sticky top-0 z-10 border-b-2 border-ink bg-sheet px-2.5 py-1.5 print:px-1 align-bottom leading-4 font-semibold ${
                      header.column.id === 'mark' ? 'left-0 z-20 border-r border-r-hair' : ''
                    } ${column?.figures ? 'text-right' : ''} ${column && column.heading.length > 9 ? 'max-w-24' : ''}`}
                  >
                    {column?.heading ?? 'Mark'}
                    <span className="block font-mono text-zone font-medium whitespace-nowrap text-pencil">
                      {column?.unit || '\u00a0'}
                    </span>
                  </th>
                )
              }),
            )}
          </tr>
        </thead>
        <tbody ref={body} onKeyDown={onKeyDown}>
          {rows.map((row, at) => (
            <tr key={row.id}>
              {row.getVisibleCells().map((cell, across) => {
                const key = cell.column.id
                const column = byKey.get(key)
                const value = row.original.cells[key]
                const selected = hasChosen && at === rowAt && across === columnAt
                const common = {
                  tabIndex: at === rowAt && across === columnAt ? 0 : -1,
                  'aria-selected': selected,
                  onClick: () => onChoose(row.original, key),
                  onFocus: () => (selected ? undefined : onChoose(row.original, key)),
                }
                const ground = selected ? 'bg-steel-wash' : 'bg-sheet'
                const own = marks(row.original, key)
                if (key === 'mark') {
                  return (
                    <th
                      key={cell.id}
                      scope="row"
                      {...common}
                      className={`sticky left-0 z-[5] border-r border-b border-r-hair border-b-hair px-2.5 py-1.5 print:px-1 align-top font-mono whitespace-nowrap outline-offset-[-3px] ${ground}`}
                    >
                      <span className="inline-flex items-center gap-1.5">
                        {row.original.vessel.mark}
                        {row.original.vessel.status === 'sized' ? null : <SeverityMark severity="error" />}
                        {own.after}
                      </span>
                    </th>
                  )
                }
                return (
                  <td
                    key={cell.id}
                    {...common}
                    title={
                      value?.number === null || value === undefined
                        ? undefined
                        : `${String(Number(value.number.toPrecision(12)))} ${column?.unit ?? ''}`
                    }
                    className={`relative border-b border-b-hair px-2.5 py-1.5 print:px-1 align-top outline-offset-[-3px] ${ground} ${column?.figures ? 'figures text-right whitespace-nowrap' : (wordWidths[key] ?? 'min-w-16')} ${column?.mono ? 'font-mono' : ''}`}
                  >
                    {own.around}
                    {own.value ?? (cell.getValue() as string)}
                    {own.after ? <span className="ml-1.5 inline-flex gap-1 align-middle">{own.after}</span> : null}
                  </td>
                )
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

import type { ProjectResult } from '@coldfill/contract'
import { scheduleKinds, scheduleTable, type ScheduleColumn } from '@coldfill/presentation'
import type { UnitSystem } from '@coldfill/units'
import type { Vessel } from '#lib/sized-project.ts'

export interface Column {
  readonly key: string
  readonly heading: string
  /** In the head, never in the cells; empty for words and pure numbers. */
  readonly unit: string
  readonly figures: boolean
  readonly mono: boolean
  /** A redline may stand on a cell of this column: it shows a result of the vessel. */
  readonly isResult: boolean
}

export interface CellValue {
  /** As shown: `—` does not apply, `?` an input is missing, `no size` no vessel can do it. */
  readonly text: string
  /** Full precision in the unit of the column, for the tooltip; null for words. */
  readonly number: number | null
  /** Id of the trace entry behind the number. */
  readonly entry: string | null
}

export interface Row {
  /** `HWS/ET-1`: marks may stand twice in a project, in different systems. */
  readonly id: string
  readonly vessel: Vessel
  readonly cells: Readonly<Record<string, CellValue>>
}

export interface Schedule {
  readonly kind: string
  readonly title: string
  readonly columns: readonly Column[]
  readonly rows: readonly Row[]
  readonly notes: readonly string[]
}

/** The chosen vessel stands behind the volume it has to have; on paper it begins a part of its own. */
const onScreen = (columns: readonly ScheduleColumn[]): readonly ScheduleColumn[] => {
  // The mark is the head of a row, not a column of it.
  const shown = columns.filter(({ key, filesOnly }) => key !== 'mark' && !filesOnly)
  const chosen = shown.filter(({ part }) => part === 'selection')
  const rest = shown.filter(({ part }) => part !== 'selection')
  const behind = rest.findIndex(({ key }) => key === 'required-volume') + 1
  return [...rest.slice(0, behind), ...chosen, ...rest.slice(behind)]
}

const columnOf = ({ key, heading, unit, decimals, isResult }: ScheduleColumn): Column => ({
  key,
  heading,
  unit,
  figures: decimals !== null,
  mono: key === 'assumptions',
  isResult,
})

const scheduleOf = (result: ProjectResult, kind: string, units: UnitSystem): Schedule => {
  const { title, columns, rows, notes } = scheduleTable(result, kind, units)
  const vessels = result.vessels.filter((vessel) => vessel.kind === kind)
  return {
    kind,
    title,
    columns: onScreen(columns).map(columnOf),
    rows: vessels.map((vessel, row) => ({
      id: `${vessel.system}/${vessel.mark}`,
      vessel,
      cells: Object.fromEntries(
        Object.entries(rows[row]?.cells ?? {}).map(([key, { text, value, entry }]) => [
          key,
          { text, number: value, entry },
        ]),
      ),
    })),
    notes: notes.map(({ text }) => text),
  }
}

/** One schedule for each kind of vessel, in the order of their first vessel. */
export const schedules = (result: ProjectResult, units: UnitSystem): readonly Schedule[] =>
  scheduleKinds(result).map((kind) => scheduleOf(result, kind, units))

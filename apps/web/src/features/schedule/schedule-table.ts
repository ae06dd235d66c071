import type { ProjectResult } from '@coldfill/contract'
import { displayUnit, fromSi, unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import { capital } from '#lib/format.ts'
import type { Vessel } from '#lib/sized-project.ts'
import { columnsOf, type ColumnDefinition, type VesselContext } from './column-definitions.ts'

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

/** Decimals of a column: three significant digits of its smallest number, and the same for every number, so that points align. */
export const decimalsFor = (numbers: readonly number[]): number => {
  const sizes = numbers.map(Math.abs).filter((size) => size > 0)
  const whole = (value: number) => Math.abs(value - Math.round(value)) <= 1e-9 * Math.max(1, Math.abs(value))
  if (sizes.length === 0 || sizes.every(whole)) return 0
  return Math.min(5, Math.max(0, 2 - Math.floor(Math.log10(Math.min(...sizes)))))
}

const fixed = (value: number, decimals: number): string => value.toFixed(decimals).replace(/^-(0(\.0*)?)$/, '$1')
const text = (words: string): CellValue => ({ text: words, number: null, entry: null })

const numberIn = (column: Exclude<ColumnDefinition, { shows: 'words' }>, context: VesselContext) => {
  if (column.shows === 'result') {
    const found = context.vessel.results[column.key]
    return found ? { value: found.value, entry: found.entry } : null
  }
  if (column.shows === 'input') {
    const entries = context.vessel.trace.flatMap((section) => section.entries)
    for (const symbol of column.symbols) {
      const found = entries.find((entry) => entry.symbol === symbol && entry.kind === column.kind)
      if (found) return { value: found.value, entry: found.id }
    }
    return null
  }
  const value = column.number(context)
  return value === null ? null : { value, entry: null }
}

const absent = (vessel: Vessel, column: ColumnDefinition): CellValue => {
  if (vessel.status === 'blocked' && column.shows !== 'quantity') return text('?')
  return text(vessel.status === 'infeasible' && column.key === 'required-volume' ? 'no size' : '—')
}

const head = (column: ColumnDefinition, units: UnitSystem): Column => ({
  key: column.key,
  heading: column.heading,
  unit: column.shows === 'words' ? '' : unitLabel(column.kind, units),
  figures: column.shows !== 'words' || column.key === 'quantity',
  mono: column.shows === 'words' && column.mono === true,
  isResult: column.shows === 'result',
})

const inUnit = (value: number, kind: Kind, units: UnitSystem) => fromSi(value, displayUnit(kind, units))

const scheduleOf = (result: ProjectResult, kind: string, units: UnitSystem): Schedule => {
  const definitions = columnsOf(kind, result)
  const vessels = result.vessels.filter((vessel) => vessel.kind === kind)
  const contexts = vessels.map((vessel) => ({
    vessel,
    result,
    system: result.systems.find((system) => system.id === vessel.system),
  }))
  const cells = contexts.map((): Record<string, CellValue> => ({}))

  for (const column of definitions) {
    const found = contexts.map((context) => (column.shows === 'words' ? null : numberIn(column, context)))
    const numbers = found.map((one) => (one && column.shows !== 'words' ? inUnit(one.value, column.kind, units) : null))
    const decimals = decimalsFor(numbers.filter((number) => number !== null))
    contexts.forEach((context, row) => {
      const cell = cells[row]
      const number = numbers[row] ?? null
      if (!cell) return
      if (column.shows === 'words') cell[column.key] = text(column.words(context) || '—')
      else if (number === null) cell[column.key] = absent(context.vessel, column)
      else cell[column.key] = { text: fixed(number, decimals), number, entry: found[row]?.entry ?? null }
    })
  }

  const notes: string[] = []
  contexts.forEach(({ vessel }, row) => {
    const own = [...(vessel.reason && vessel.status !== 'sized' ? [capital(vessel.reason)] : []), ...vessel.notes]
    const keys = own.map((note) => {
      if (!notes.includes(note)) notes.push(note)
      return notes.indexOf(note) + 1
    })
    const cell = cells[row]
    if (cell) cell['notes'] = text(keys.join(', '))
  })

  return {
    kind,
    title: `${capital(kind)}s`,
    columns: [
      ...definitions.map((column) => head(column, units)),
      { key: 'notes', heading: 'Notes', unit: '', figures: false, mono: false, isResult: false },
    ],
    rows: vessels.map((vessel, row) => ({ id: `${vessel.system}/${vessel.mark}`, vessel, cells: cells[row] ?? {} })),
    notes,
  }
}

/** One schedule for each kind of vessel, in the order of their first vessel. */
export const schedules = (result: ProjectResult, units: UnitSystem): readonly Schedule[] =>
  [...new Set(result.vessels.map((vessel) => vessel.kind))].map((kind) => scheduleOf(result, kind, units))

import type { ProjectResult } from '@coldfill/sizing'
import { displayUnit, fromSi, unitLabel, type UnitSystem } from '@coldfill/units'
import { sentenceCase } from '../vessel-words.ts'
import { decimalsFor, fixedText } from './column-decimals.ts'
import { expansionTanks } from './expansion-tanks.ts'
import { KeyedNotes } from './keyed-notes.ts'
import { otherVessels } from './other-vessels.ts'
import type { ScheduleColumnDefinition, ScheduleDefinition, VesselContext, VesselResult } from './schedule.ts'
import { thermalExpansionTanks } from './thermal-expansion-tanks.ts'

export interface ScheduleColumn {
  readonly key: string
  readonly heading: string
  /** Symbol of the unit, empty for words and pure numbers. */
  readonly unit: string
  readonly align: 'left' | 'right' | 'center'
  /** Characters of the body type. */
  readonly width: number
  /** Decimals that every number of the column is shown with; null for words. */
  readonly decimals: number | null
  /** What the chosen vessel is; every other column says what the vessel has to do and how that was found. */
  readonly part?: 'selection'
  /** Shows a result of the vessel, whose name is its key. */
  readonly isResult: boolean
  /** The screen has it on the page of the vessel, and no column for it. */
  readonly filesOnly?: true
}

export interface ScheduleCell {
  /** As shown. `—` does not apply, `?` an input is missing, `no size` no vessel can do it. */
  readonly text: string
  /** Full number in the unit of the column; null for words and missing numbers. */
  readonly value: number | null
  /** Id of the trace entry behind the number, where there is one. */
  readonly entry: string | null
}

export interface ScheduleRow {
  readonly mark: string
  readonly system: string
  readonly status: VesselResult['status']
  readonly cells: Readonly<Record<string, ScheduleCell>>
}

/** One schedule, ready to print: plain data for the workbook, the submittal and the screen. */
export interface ScheduleTable {
  readonly kind: string
  readonly title: string
  readonly purpose: string
  readonly columns: readonly ScheduleColumn[]
  readonly rows: readonly ScheduleRow[]
  /** Keyed notes; the Notes column refers to their numbers. */
  readonly notes: readonly { readonly number: number; readonly text: string }[]
}

const DEFINITIONS: readonly ScheduleDefinition[] = [expansionTanks, thermalExpansionTanks]

/** Kinds that the project has, in the order of their first vessel. */
export const scheduleKinds = (result: ProjectResult): string[] => [
  ...new Set(result.vessels.map((vessel) => vessel.kind)),
]

/** Header text with the unit, as every sheet prints it: `Precharge (psig)`. */
export const headerText = (column: Pick<ScheduleColumn, 'heading' | 'unit'>): string =>
  column.unit === '' ? column.heading : `${column.heading} (${column.unit})`

const words = (text: string): ScheduleCell => ({ text, value: null, entry: null })

const missing = (vessel: VesselResult, column: ScheduleColumnDefinition): ScheduleCell => {
  if (vessel.status === 'blocked' && column.shows !== 'quantity') return words('?')
  return words(vessel.status === 'infeasible' && column.key === 'required-volume' ? 'no size' : '—')
}

/** SI number of a cell and the trace entry behind it. */
const numberIn = (
  column: Exclude<ScheduleColumnDefinition, { shows: 'words' }>,
  context: VesselContext,
): { value: number; entry: string | null } | null => {
  const { vessel } = context
  if (column.shows === 'result') {
    const found = vessel.results[column.key]
    return found ? { value: found.value, entry: found.entry } : null
  }
  if (column.shows === 'input') {
    const entries = vessel.trace.flatMap((section) => section.entries)
    for (const symbol of column.symbols) {
      const found = entries.find((entry) => entry.symbol === symbol && entry.kind === column.kind)
      if (found) return { value: found.value, entry: found.id }
    }
    const value = column.otherwise?.(context) ?? null
    return value === null ? null : { value, entry: null }
  }
  const value = column.number(context)
  return value === null ? null : { value, entry: null }
}

/** The schedule of one kind of vessel in one unit system. A kind without vessels gives a table without rows. */
export const scheduleTable = (result: ProjectResult, kind: string, units: UnitSystem): ScheduleTable => {
  const definition = DEFINITIONS.find((candidate) => candidate.kind === kind) ?? otherVessels(kind, result)
  const notes = new KeyedNotes()
  const contexts = result.vessels
    .filter((vessel) => vessel.kind === kind)
    .map((vessel): VesselContext => ({
      vessel,
      system: result.systems.find((system) => system.id === vessel.system),
      result,
    }))

  const columns: ScheduleColumn[] = [
    { key: 'mark', heading: 'Mark', unit: '', align: 'left', width: 9, decimals: null, isResult: false },
  ]
  const cells = contexts.map(({ vessel }): Record<string, ScheduleCell> => ({ mark: words(vessel.mark) }))

  for (const column of definition.columns) {
    const { key, heading, width } = column
    const marks = {
      isResult: column.shows === 'result',
      ...(column.part === undefined ? {} : { part: column.part }),
      ...(column.filesOnly === undefined ? {} : { filesOnly: column.filesOnly }),
    }
    if (column.shows === 'words') {
      const texts = contexts.map((context) => column.words(context))
      if (column.optional && texts.every((text) => text === '')) continue
      columns.push({ key, heading, unit: '', align: column.align ?? 'left', width, decimals: null, ...marks })
      texts.forEach((text, row) => {
        const cell = cells[row]
        if (cell) cell[key] = words(text || '—')
      })
      continue
    }
    const numbers = contexts.map((context) => {
      const found = numberIn(column, context)
      return found && { ...found, value: fromSi(found.value, displayUnit(column.kind, units)) }
    })
    if (column.optional && numbers.every((found) => found === null)) continue
    const decimals = decimalsFor(numbers.flatMap((found) => (found ? [found.value] : [])))
    columns.push({ key, heading, unit: unitLabel(column.kind, units), align: 'right', width, decimals, ...marks })
    contexts.forEach(({ vessel }, row) => {
      const [cell, found] = [cells[row], numbers[row]]
      if (cell) cell[key] = found ? { text: fixedText(found.value, decimals), ...found } : missing(vessel, column)
    })
  }

  columns.push({ key: 'notes', heading: 'Notes', unit: '', align: 'left', width: 7, decimals: null, isResult: false })
  contexts.forEach(({ vessel }, row) => {
    const texts = [
      ...(vessel.reason && vessel.status !== 'sized' ? [sentenceCase(vessel.reason)] : []),
      ...vessel.notes,
    ]
    const cell = cells[row]
    if (cell) cell['notes'] = words(texts.map((text) => notes.numberOf(text)).join(', '))
  })

  return {
    kind,
    title: definition.title,
    purpose: definition.purpose,
    columns,
    rows: contexts.map(({ vessel }, row) => ({
      mark: vessel.mark,
      system: vessel.system,
      status: vessel.status,
      cells: cells[row] ?? {},
    })),
    notes: notes.list(),
  }
}

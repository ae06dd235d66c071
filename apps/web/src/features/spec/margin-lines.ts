import type { ProjectResult } from '@coldfill/contract'
import type { SpecModel } from '@coldfill/spec'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import type { Vessel } from '#lib/sized-project.ts'

/** What the result margin says beside the line on which a vessel is declared. */
export interface MarginEntry {
  /** Zero-based line of the mark. */
  readonly line: number
  readonly mark: string
  /** First line: the size, or why there is none. */
  readonly size: string
  readonly sized: boolean
  /** Size in the last issue, where it differs. */
  readonly was: string | null
  /** Settings and pressures of the vessel. */
  readonly details: readonly string[]
  /** Address of its whole calculation; null while it is not sized yet. */
  readonly trace: string | null
  /** How many lines there are before the next vessel or system. */
  readonly room: number
}

const SHOWN = [
  ['precharge', 'precharge'],
  ['maximum-pressure', 'max.'],
  ['final-pressure', 'final'],
] as const

const quantity = (vessel: Vessel | undefined, key: string, units: UnitSystem): string | null => {
  const found = vessel?.results[key]
  return found ? formatQuantity(found, units) : null
}

const sizeWords = (vessel: Vessel, units: UnitSystem): string => {
  if (vessel.status === 'infeasible') return 'no vessel can do it'
  if (vessel.status === 'blocked') return 'not sized'
  return quantity(vessel, 'required-volume', units) ?? quantity(vessel, 'storage-volume', units) ?? 'sized'
}

/** Entries of the margin in the order of the text. Vessels that the last sizing did not know yet say "sizing…". */
export const marginEntries = (
  model: SpecModel | null,
  result: ProjectResult | null,
  issued: ProjectResult | null,
  units: UnitSystem,
  traceOf: (system: string, mark: string) => string,
): readonly MarginEntry[] => {
  if (!model) return []
  const declared = model.systems
    .flatMap((system) =>
      system.vessels.map((vessel) => ({
        system: system.id,
        path: vessel.path,
        mark: vessel.mark,
        line: vessel.range.start.line,
      })),
    )
    .toSorted((a, b) => a.line - b.line)
  const starts = [
    ...declared.map((vessel) => vessel.line),
    ...model.systems.map((system) => system.range.start.line),
  ].toSorted((a, b) => a - b)
  return declared.map(({ system, path, mark, line }) => {
    const vessel = result?.vessels.find((one) => one.path === path)
    if (!vessel) return { line, mark, size: 'sizing…', sized: false, was: null, details: [], trace: null, room: 0 }
    const before = issued?.vessels.find((one) => one.path === path)
    const size = sizeWords(vessel, units)
    const was = before ? sizeWords(before, units) : null
    const room = (starts.find((start) => start > line) ?? line + 4) - line - 1
    const details = SHOWN.flatMap(([key, word]) => {
      const shown = quantity(vessel, key, units)
      return shown ? [`${word} ${shown}`] : []
    })
    return {
      line,
      mark,
      size,
      sized: vessel.status === 'sized',
      was: was === size ? null : was,
      details,
      trace: traceOf(system, mark),
      room,
    }
  })
}

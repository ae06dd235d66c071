import type { ProjectResult, VesselResult } from '@coldfill/sizing'
import type { UnitSystem } from '@coldfill/units'
import { scheduleKinds, scheduleTable } from '@coldfill/presentation'

/** Says a number of a vessel in the digits of its schedule, with the unit behind it, so that no two pages round it differently. */
export const scheduleWords = (
  result: ProjectResult,
  units: UnitSystem,
): ((vessel: VesselResult, key: string) => string) => {
  const tables = new Map(scheduleKinds(result).map((kind) => [kind, scheduleTable(result, kind, units)]))
  return (vessel, key) => {
    const table = tables.get(vessel.kind)
    const cell = table?.rows.find((row) => row.mark === vessel.mark && row.system === vessel.system)?.cells[key]
    if (!cell) return '—'
    const unit = table?.columns.find((column) => column.key === key)?.unit ?? ''
    return cell.value === null ? cell.text : `${cell.text} ${unit}`.trimEnd()
  }
}

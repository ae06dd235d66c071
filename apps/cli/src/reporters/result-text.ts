import type { ProjectResult, VesselResult } from '@coldfill/sizing'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import { textTable } from './text-table.ts'

const columns = [
  { heading: 'Mark', align: 'left' },
  { heading: 'System', align: 'left' },
  { heading: 'Kind', align: 'left' },
  { heading: 'Method', align: 'left' },
  { heading: 'Required', align: 'right' },
  { heading: 'Precharge', align: 'right' },
  { heading: 'Maximum', align: 'right' },
  { heading: 'Chosen', align: 'left' },
] as const

/** The required volume; of a vessel that is sized by something else, that with its name. */
const answer = (vessel: VesselResult, units: UnitSystem): string => {
  const volume = vessel.results['required-volume']
  if (volume) return formatQuantity(volume, units)
  const [first] = Object.values(vessel.results)
  return first ? `${formatQuantity(first, units)} ${first.name}` : '—'
}

const row = (vessel: VesselResult, units: UnitSystem): readonly string[] => {
  const show = (name: string) => {
    const result = vessel.results[name]
    return result ? formatQuantity(result, units) : '—'
  }
  const required = vessel.status === 'sized' ? answer(vessel, units) : vessel.status
  const chosen = vessel.selected
    ? `${vessel.selected.quantity > 1 ? `${vessel.selected.quantity} × ` : ''}${vessel.selected.maker} ${vessel.selected.model}`
    : '—'
  return [
    vessel.mark,
    vessel.system,
    vessel.kind,
    vessel.method,
    required,
    show('precharge'),
    show('maximum-pressure'),
    chosen,
  ]
}

/** The sized vessels and the assumptions behind them, for a terminal. */
export const resultText = (result: ProjectResult, units: UnitSystem): string => {
  const { project, vessels, assumptions } = result
  const parts: string[] = [`${project.number} ${project.title}`.trim()]
  if (vessels.length > 0)
    parts.push(
      textTable(
        columns,
        vessels.map((vessel) => row(vessel, units)),
      ),
    )
  else parts.push('No vessel to size.')
  const reasons = vessels.filter((vessel) => vessel.reason !== undefined)
  if (reasons.length > 0)
    parts.push(reasons.map((vessel) => `${vessel.mark} is ${vessel.status}: ${vessel.reason}`).join('\n'))
  if (assumptions.length > 0)
    parts.push(
      [
        'Assumptions',
        ...assumptions.map(
          (a) =>
            `${a.number.padEnd(4)}${a.name}: ${a.value}${a.reason === undefined ? '' : ` (${a.reason})`}; used by ${a.usedBy.join(', ')}`,
        ),
      ].join('\n'),
    )
  parts.push(caution)
  return parts.join('\n\n')
}

const caution =
  'Results are an aid to licensed engineering judgement: the adopted codes, the authority having jurisdiction and the vessel’s own listing govern. A relief valve is never an expansion control.'

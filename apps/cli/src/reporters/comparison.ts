import type { SpecChange } from '@coldfill/spec'
import { displayUnit, formatQuantity, fromSi, type Kind, KINDS, type UnitSystem } from '@coldfill/units'
import { percent, type ResultChanges, type ValueChange, type VesselChange } from '../compare-results.ts'
import { textTable } from './text-table.ts'

const quantity = (kind: Kind, value: number | null) =>
  value === null ? null : { value: fromSi(value, displayUnit(kind, 'SI')), unit: KINDS[kind].metric }

const valueJson = (change: ValueChange) => ({
  name: change.key,
  was: quantity(change.kind, change.was),
  now: quantity(change.kind, change.now),
  percent: percent(change),
})

const inputJson = (change: ValueChange) => ({
  ...valueJson(change),
  name: change.name,
  from: change.from ?? '',
  ...(change.wasAuthored !== undefined && { 'was-written': change.wasAuthored }),
  ...(change.nowAuthored !== undefined && { 'now-written': change.nowAuthored }),
})

/** The comparison as data: SI units, full precision. */
export const comparisonJson = (engine: string, spec: readonly SpecChange[], { vessels, findings }: ResultChanges) => ({
  engine,
  spec: spec.map(({ change, path, was, now }) => ({ change, path, was, now })),
  vessels: vessels.map((vessel) => ({
    change: vessel.change,
    mark: vessel.mark,
    system: vessel.system,
    kind: vessel.kind,
    results: vessel.results.map(valueJson),
    words: vessel.words,
    inputs: vessel.inputs.map(inputJson),
  })),
  findings,
})

const LONGEST = 60

const short = (text: string | null): string =>
  text === null || text === '' ? '—' : text.length > LONGEST ? `${text.slice(0, LONGEST - 1)}…` : text

const specText = (changes: readonly SpecChange[]): string =>
  changes.length === 0
    ? 'The two specs say the same; comments, spacing and the order of keys are left out.'
    : textTable(
        [
          { heading: 'Spec', align: 'left' },
          { heading: 'Path', align: 'left' },
          { heading: 'Was', align: 'left' },
          { heading: 'Now', align: 'left' },
        ],
        changes.map(({ change, path, was, now }) => [change, path, short(was), short(now)]),
      )

const shown = (kind: Kind, value: number | null, units: UnitSystem): string =>
  value === null ? '—' : formatQuantity({ kind, value, authored: '' }, units)

const signed = (value: number): string => `${value < 0 ? '-' : '+'}${Math.abs(value).toFixed(1)} %`

const valueRow = (vessel: VesselChange, change: ValueChange, units: UnitSystem): string[] => {
  const part = percent(change)
  return [
    vessel.mark,
    change.name,
    shown(change.kind, change.was, units),
    shown(change.kind, change.now, units),
    part === null ? '' : signed(part),
  ]
}

const vesselRows = (vessel: VesselChange, units: UnitSystem): string[][] => [
  ...(vessel.change === 'changed' ? [] : [[vessel.mark, `${vessel.kind} in ${vessel.system}`, '', vessel.change, '']]),
  ...vessel.words.map(({ name, was, now }) => [vessel.mark, name, short(was), short(now), '']),
  ...vessel.results.map((change) => valueRow(vessel, change, units)),
]

const inputRows = (vessel: VesselChange, units: UnitSystem): string[][] =>
  vessel.inputs.map((change) => [
    vessel.mark,
    change.name,
    change.wasAuthored ?? shown(change.kind, change.was, units),
    change.nowAuthored ?? shown(change.kind, change.now, units),
    change.from ?? '',
  ])

const VALUES = [
  { heading: 'Was', align: 'right' },
  { heading: 'Now', align: 'right' },
] as const

/** The comparison for a terminal: the spec by path, the vessels by result, and the inputs that moved them. */
export const comparisonText = (
  spec: readonly SpecChange[],
  { vessels, findings }: ResultChanges,
  units: UnitSystem,
): string => {
  const results = vessels.flatMap((vessel) => vesselRows(vessel, units))
  const inputs = vessels.flatMap((vessel) => inputRows(vessel, units))
  const moved = [
    ...findings.added.map(({ severity, code, message }) => `new      ${severity} ${code}: ${message}`),
    ...findings.removed.map(({ severity, code, message }) => `gone     ${severity} ${code}: ${message}`),
  ]
  return [
    specText(spec),
    results.length === 0
      ? 'No vessel changes.'
      : textTable(
          [
            { heading: 'Mark', align: 'left' },
            { heading: 'Result', align: 'left' },
            ...VALUES,
            { heading: 'Change', align: 'right' },
          ],
          results,
        ),
    ...(inputs.length === 0
      ? []
      : [
          textTable(
            [
              { heading: 'Mark', align: 'left' },
              { heading: 'Input', align: 'left' },
              ...VALUES,
              { heading: 'From', align: 'left' },
            ],
            inputs,
          ),
        ]),
    ...(moved.length === 0 ? [] : [['Findings', ...moved].join('\n')]),
  ].join('\n\n')
}

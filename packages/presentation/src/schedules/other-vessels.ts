import type { ProjectResult } from '@coldfill/sizing'
import { sentenceCase } from '../vessel-words.ts'
import { defineSchedule, inputNumber, optional, resultNumber, type ScheduleDefinition } from './schedule.ts'
import * as shared from './shared-columns.ts'

const input = (...column: Parameters<typeof inputNumber>) => optional(inputNumber(...column))

/** What a reviewer looks for beside the results of a kind, as the trade schedules it. */
const INPUTS: Readonly<Record<string, readonly ReturnType<typeof input>[]>> = {
  'storage tank': [
    input('cold-temperature', 'Cold water temp.', 9, 'temperature', ['t_c']),
    input('storage-temperature', 'Storage temp.', 8, 'temperature', ['t_s']),
  ],
  'buffer tank': [
    input('low-temperature', 'Lowest temp.', 8, 'temperature', ['t_l']),
    input('high-temperature', 'Highest temp.', 8, 'temperature', ['t_h']),
    input('source-minimum', 'Least source output', 9, 'power', ['Q_s', 'Q_m']),
    input('load-minimum', 'Least load', 8, 'power', ['Q_l']),
    input('run-time', 'Run time', 8, 'time', ['tau']),
  ],
  'pressure tank': [
    input('pump-flow', 'Pump flow', 8, 'flow', ['Q_p']),
    input('starts-per-hour', 'Starts per hour', 8, 'count', ['N_s']),
  ],
  'break tank': [
    input('peak-flow', 'Peak flow', 8, 'flow', ['Q_pk']),
    input('refill-flow', 'Refill flow', 8, 'flow', ['Q_rf']),
  ],
  'solar expansion tank': [input('collector-volume', 'Collector volume', 9, 'volume', ['V_col'])],
  'drain-back tank': [
    input('collector-volume', 'Collector volume', 9, 'volume', ['V_col']),
    input('piping-above', 'Piping above', 8, 'volume', ['V_pa']),
  ],
  'flash tank': [
    input('condensate-flow', 'Condensate', 10, 'mass flow', ['m_c']),
    input('condensate-pressure', 'Condensate pressure', 10, 'gauge pressure', ['p_c']),
    input('flash-pressure', 'Flash pressure', 9, 'gauge pressure', ['p_fl']),
  ],
  'blowdown separator': [
    input('boiler-pressure', 'Boiler pressure', 9, 'gauge pressure', ['p_b']),
    input('drain-temperature', 'Hottest to drain', 9, 'temperature', ['t_dr']),
  ],
  'condensate receiver': [
    input('steaming-rate', 'Steaming rate', 9, 'mass flow', ['m_s']),
    input('holding-time', 'Holding time', 8, 'time', ['tau']),
  ],
}

/**
 * A schedule of any kind that has no columns of its own: what it is sized from, and every result that one of its vessels has, in
 * order of first appearance.
 */
export const otherVessels = (kind: string, result: ProjectResult): ScheduleDefinition => {
  const columns = new Map<string, ReturnType<typeof resultNumber>>()
  for (const vessel of result.vessels) {
    if (vessel.kind !== kind) continue
    for (const [key, { name, kind: of }] of Object.entries(vessel.results)) {
      if (columns.has(key)) continue
      // Two results may have one name; the key tells them apart, and a required volume is called so everywhere.
      const isTaken = [...columns.values()].some((column) => column.heading === sentenceCase(name))
      const heading = sentenceCase(isTaken || key === 'required-volume' ? key.replaceAll('-', ' ') : name)
      columns.set(key, resultNumber(key, heading, Math.max(9, heading.length / 2), of))
    }
  }
  return defineSchedule({
    kind,
    title: `${sentenceCase(kind)}s`,
    purpose: `Every ${kind} of the project with the numbers it was sized to. Pressures are gauge, at the vessel connection.`,
    columns: [
      shared.serves,
      shared.location,
      shared.count,
      ...(INPUTS[kind] ?? []).filter(({ key }) => !columns.has(key)),
      ...columns.values(),
      ...shared.selection,
      shared.method,
      shared.assumptions,
    ],
  })
}

import { defineSchedule, filesOnly, inputNumber, optional, resultNumber } from './schedule.ts'
import * as shared from './shared-columns.ts'

export const expansionTanks = defineSchedule({
  kind: 'expansion tank',
  title: 'Expansion tanks',
  purpose:
    'Closed and open tanks that take up the expansion of the water in hydronic loops. Pressures are gauge, at the vessel connection.',
  columns: [
    shared.serves,
    shared.location,
    shared.construction,
    shared.fluid,
    shared.count,
    resultNumber('system-volume', 'System volume', 9, 'volume'),
    inputNumber('low-temperature', 'Lowest temp.', 8, 'temperature', ['t_l']),
    inputNumber('high-temperature', 'Highest temp.', 8, 'temperature', ['t_h']),
    resultNumber('expansion-volume', 'Expansion volume', 10, 'volume'),
    resultNumber('required-volume', 'Required volume', 9, 'volume'),
    filesOnly(optional(resultNumber('required-volume-each', 'Required, each', 9, 'volume'))),
    filesOnly(optional(resultNumber('code-minimum-volume', 'Code minimum', 9, 'volume'))),
    filesOnly(optional(resultNumber('water-reserve', 'Water reserve', 9, 'volume'))),
    resultNumber('fill-pressure', 'Fill pressure', 9, 'gauge pressure'),
    resultNumber('precharge', 'Precharge', 10, 'gauge pressure'),
    resultNumber('maximum-pressure', 'Maximum pressure', 10, 'gauge pressure'),
    optional(resultNumber('final-pressure', 'Final pressure', 9, 'gauge pressure')),
    shared.reliefSet,
    ...shared.selection,
    shared.method,
    shared.assumptions,
  ],
})

import { defineSchedule, filesOnly, inputNumber, optional, resultNumber } from './schedule.ts'
import * as shared from './shared-columns.ts'

export const thermalExpansionTanks = defineSchedule({
  kind: 'thermal expansion tank',
  title: 'Thermal expansion tanks',
  purpose:
    'Potable-water tanks that take up thermal expansion behind a check valve or backflow preventer. Pressures are gauge, at the vessel connection.',
  columns: [
    shared.serves,
    shared.location,
    shared.construction,
    shared.count,
    resultNumber('system-volume', 'Heated volume', 9, 'volume'),
    inputNumber('cold-temperature', 'Cold water temp.', 9, 'temperature', ['t_c']),
    inputNumber('storage-temperature', 'Storage temp.', 8, 'temperature', ['t_h']),
    resultNumber('expansion-volume', 'Expansion volume', 10, 'volume'),
    resultNumber('required-volume', 'Required volume', 9, 'volume'),
    filesOnly(optional(resultNumber('required-volume-each', 'Required, each', 9, 'volume'))),
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

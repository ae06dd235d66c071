import { defineSchedule, inputNumber, resultNumber } from './schedule.ts'
import * as shared from './shared-columns.ts'

export const thermalExpansionTanks = defineSchedule({
  kind: 'thermal expansion tank',
  title: 'Thermal expansion tanks',
  purpose:
    'Potable-water tanks that take up thermal expansion behind a check valve or backflow preventer. Pressures are gauge, at the vessel connection.',
  columns: [
    shared.serves,
    shared.construction,
    shared.count,
    resultNumber('system-volume', 'Heated volume', 9, 'volume'),
    inputNumber('cold-temperature', 'Cold water temp.', 9, 'temperature', ['t_c', 't_cold', 't_l', 't_low']),
    inputNumber('storage-temperature', 'Storage temp.', 8, 'temperature', ['t_h', 't_hot', 't_s', 't_high']),
    resultNumber('expansion-volume', 'Expansion volume', 10, 'volume'),
    resultNumber('required-volume', 'Required volume', 9, 'volume'),
    shared.selectedVolume,
    resultNumber('fill-pressure', 'Supply pressure', 9, 'gauge pressure'),
    resultNumber('precharge', 'Precharge', 10, 'gauge pressure'),
    resultNumber('maximum-pressure', 'Maximum pressure', 10, 'gauge pressure'),
    shared.reliefSet,
    shared.method,
    shared.assumptions,
  ],
})

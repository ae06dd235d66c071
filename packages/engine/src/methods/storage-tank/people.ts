import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step } from '../../method.ts'
import { ashraeServiceWater } from '../../sources/ashrae-service-water.ts'
import { en128313 } from '../../sources/en-12831-3.ts'
import {
  atTableTemperature,
  heatingBasis,
  heatingChecks,
  heatingInputs,
  heatingSteps,
  storageResults,
} from './heating.ts'

const table = citeFromMemory(ashraeServiceWater, 'table of low, medium and high guidelines per person')
const sumCurve = citeFromMemory(en128313, 'sum curve: the supply stays above the demand')
const hourTable = citeFromMemory(ashraeServiceWater, 'table of demands and use by type of building, apartment houses')

export const perPerson = defineMethod({
  id: 'storage-tank.per-person',
  revision: 1,
  title: 'Storage tank by the draw of a person',
  vessel: { kind: 'storage tank', method: 'per person' },
  sections: ['people'],
  inputs: {
    n_p: keyed('count', 'people', 'demand', 'people'),
    V_pk: given('volume', 'draw of a person in the peak'),
    V_60: given('volume', 'draw of a person in one hour'),
    V_120: given('volume', 'draw of a person in two hours'),
    V_180: given('volume', 'draw of a person in three hours'),
    V_d: given('volume', 'draw of a person on the largest day'),
    f_u: keyed('ratio', 'usable part of the tank', 'vessel', 'usable-fraction', 'storage.usable-fraction'),
    ...heatingInputs,
  },
  steps: {
    V_u: step('volume', 'usable storage', 'n_p * V_pk', table),
    V_t: step('volume', 'storage volume', 'V_u / f_u', cite(ashraeServiceWater, 'usable part of a tank')),
    q_r: step(
      'hourly flow',
      'recovery',
      'n_p * max((V_60 - V_pk) / 1[h], (V_120 - V_pk) / 2[h], (V_180 - V_pk) / 3[h], (V_d - V_pk) / 24[h])',
      sumCurve,
    ),
    ...heatingSteps,
  },
  checks: heatingChecks,
  validity: [atTableTemperature()],
  results: { ...storageResults, 'usable-volume': 'V_u' },
  basis: `The store carries the whole draw of the peak; the recovery keeps what store and heater have given above the draw of the table in one, two and three hours and over the largest day. The table has figures for apartment houses. ${heatingBasis}`,
  examples: [
    {
      id: 'hundred-people-half-an-hour',
      title: '100 people of medium demand, peak of half an hour',
      origin: 'by hand',
      source: table,
      given: {
        n_p: '100',
        V_pk: '2.9 gal',
        V_60: '4.8 gal',
        V_120: '8 gal',
        V_180: '11 gal',
        V_d: '49 gal',
        f_u: '0.7',
        t_c: '40 °F',
        t_s: '140 °F',
      },
      expected: { V_u: '290 gal', V_t: '414.285714286 gal', q_r: '270 gph' },
      tolerance: 1e-9,
      because: 'By hand: 290 / 0.7, and (11 − 2.9) / 3 · 100, the greatest of 190, 255, 270 and 192.',
    },
  ],
})

export const perApartment = defineMethod({
  id: 'storage-tank.per-apartment',
  revision: 1,
  title: 'Storage tank by the draw of an apartment',
  vessel: { kind: 'storage tank', method: 'per apartment' },
  sections: ['apartments'],
  inputs: {
    n_a: given('count', 'apartments'),
    V_h: given('volume', 'draw of an apartment in the busiest hour'),
    V_d: given('volume', 'draw of an apartment on the largest day'),
    V_m: given('volume', 'draw of an apartment on an average day'),
    f_s: { kind: 'ratio', name: 'storage factor', from: { at: 'assumption', id: 'storage.apartment-storage-factor' } },
    ...heatingInputs,
  },
  steps: {
    q_r: step('hourly flow', 'recovery', 'n_a * V_h / 1[h]', hourTable),
    V_t: step(
      'volume',
      'storage volume',
      'q_r * f_s * 1[h]',
      cite(ashraeServiceWater, 'storage capacity factor, of the demand of the busiest hour'),
    ),
    V_day: step('volume', 'draw on the largest day', 'n_a * V_d', hourTable),
    V_mean: step('volume', 'draw on an average day', 'n_a * V_m', hourTable),
    ...heatingSteps,
  },
  checks: heatingChecks,
  validity: [atTableTemperature()],
  results: { ...storageResults, 'largest-day': 'V_day', 'average-day': 'V_mean' },
  basis: `The recovery covers the busiest hour of the table; the storage is the storage factor of apartment houses times that hour. The draws of the largest and of an average day are given beside it. ${heatingBasis}`,
  examples: [
    {
      id: 'hundred-apartments',
      title: '100 apartments: 700 gal in the busiest hour, 6,000 gal on the largest day',
      origin: 'from memory',
      source: hourTable,
      given: {
        n_a: '100',
        V_h: '7 gal',
        V_d: '60 gal',
        V_m: '37 gal',
        f_s: '1.25',
        t_c: '40 °F',
        t_s: '140 °F',
      },
      expected: { q_r: '700 gph', V_t: '875 gal', V_day: '6000 gal', V_mean: '3700 gal' },
      tolerance: 1e-9,
      because: 'Whole gallons; 875 by hand, 700 · 1.25.',
    },
  ],
})

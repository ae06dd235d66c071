import { citeFromMemory } from '../../citation.ts'
import { defineMethod, step, type WorkedExample } from '../../method.ts'
import { din4807Part2 } from '../../sources/din-4807-2.ts'
import { chargeBelowHighest, inputs, leastFill, requiredVolume, results, sections, waterReserve } from './european.ts'

const design = citeFromMemory(din4807Part2, 'design of the vessel')

const expansionRow = (t: number, printed: string, tolerance: number): WorkedExample => ({
  id: `din-expansion-${t}`,
  title: `Expansion of water from 10 to ${t} °C`,
  origin: 'from memory',
  source: citeFromMemory(din4807Part2, 'table of expansion from 10 °C'),
  given: { V_s: '1000 L', t_h: `${t} °C`, p_0: '1 bar g', p_e: '2.5 bar g' },
  expected: { e: printed },
  tolerance,
  because: 'Printed with two decimals of a per cent; 60 °C is printed 1.67 and the physics give 1.68.',
})

export const din4807 = defineMethod({
  id: 'expansion-tank.din-4807',
  revision: 1,
  title: 'Expansion vessel with membrane, DIN 4807-2',
  vessel: { kind: 'expansion tank', method: 'din 4807', when: { construction: ['diaphragm', 'bladder'] } },
  product: 'EN 13831',
  sections,
  inputs,
  steps: {
    e: step('ratio', 'relative expansion from 10 °C', 'v_sat(t_h) / v_sat(10[°C]) - 1', design),
    V_e: step('volume', 'expansion volume', 'e * V_s', design),
    V_WR: step('volume', 'water reserve', waterReserve, design),
    V_t: step('volume', 'required volume', requiredVolume, design),
    p_f: step('gauge pressure', 'least fill pressure', leastFill, design),
  },
  checks: [
    {
      condition: 'e > 0',
      code: 'CF-E011',
      message: 'The highest temperature is not above 10 °C, from which DIN 4807 counts, so nothing expands.',
      hint: 'Check `temperatures.high`, or size by another method.',
    },
    chargeBelowHighest,
  ],
  results,
  checkBack: 'check-back.european',
  basis:
    'Expansion of the fluid from 10 °C to the highest temperature, a water reserve of 0.5 % of the contents and at least 3 L, pressures made absolute with one bar. No growth of the piping is credited.',
  examples: [
    expansionRow(50, '1.18 %', 0.005),
    expansionRow(70, '2.24 %', 0.003),
    expansionRow(90, '3.56 %', 0.002),
    expansionRow(100, '4.31 %', 0.002),
  ],
})

import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { en3035 } from '../../sources/en-303-5.ts'

const clause = cite(en3035, 'volume of the heat store')

export const bufferEn3035 = defineMethod({
  id: 'buffer-tank.en-303-5',
  revision: 1,
  title: 'Heat store of a solid fuel boiler, EN 303-5',
  vessel: { kind: 'buffer tank', method: 'en 303-5', impliedBy: ['boiler-output'] },
  inputs: {
    t_b: keyed('time', 'burn time of one charge', 'vessel', 'burn-time'),
    Q_n: keyed('power', 'rated output of the boiler', 'vessel', 'boiler-output'),
    Q_h: keyed('power', 'heat load of the building', 'vessel', 'heat-load'),
    Q_m: keyed('power', 'least output of the boiler', 'vessel', 'boiler-minimum'),
  },
  steps: {
    V_b: step(
      'volume',
      'volume by the formula',
      '15[L] * (t_b / 1[h]) * (Q_n / 1[kW]) * (1 - 0.3 * Q_h / Q_m)',
      clause,
    ),
    V_t: step('volume', 'required volume', 'max(300[L], V_b)', citeFromMemory(en3035, 'least volume of 300 L')),
  },
  checks: [],
  results: { 'required-volume': 'V_t' },
  basis: 'The store takes what one charge of fuel gives beyond the load; 300 L at least.',
  examples: [
    {
      id: 'store-735-l',
      title: 'Boiler of 32 kW, 25 kW load, two hours',
      origin: 'published',
      source: clause,
      given: { t_b: '2 h', Q_n: '32 kW', Q_h: '25 kW', Q_m: '32 kW' },
      expected: { V_t: '735 L' },
      tolerance: 0.0007,
      because: 'Printed to the whole litre: half a unit is 0.5 in 735.',
    },
  ],
})

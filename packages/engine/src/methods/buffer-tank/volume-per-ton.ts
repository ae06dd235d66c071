import { cite } from '../../citation.ts'
import { defineMethod, given, keyed, step } from '../../method.ts'
import { chillerPractice } from '../../sources/chiller-practice.ts'

const rule = cite(chillerPractice, 'water of the loop for each ton of cooling')

export const bufferVolumePerTon = defineMethod({
  id: 'buffer-tank.volume-per-ton',
  revision: 1,
  title: 'Buffer tank of a chilled loop by volume per ton',
  vessel: { kind: 'buffer tank', method: 'volume per ton', impliedBy: ['cooling-capacity'] },
  sections: ['contents'],
  inputs: {
    V_s: given('volume', 'system volume'),
    Q_c: keyed('power', 'cooling capacity', 'vessel', 'cooling-capacity'),
    c_t: keyed(
      'volume per power',
      'water of the loop for each ton',
      'vessel',
      'volume-per-ton',
      'buffer.volume-per-ton',
    ),
  },
  steps: {
    V_q: step('volume', 'water that the loop should hold', 'c_t * Q_c', rule),
    V_t: step('volume', 'required volume', 'max(0[L], V_q - V_s)', rule),
  },
  checks: [],
  results: { 'required-volume': 'V_t', 'system-volume': 'V_s' },
  basis:
    'The loop should hold a volume for each ton of cooling; the tank makes up what its contents lack. A trade rule without a standard behind it: the least loop volume stated for the chosen machine governs.',
  examples: [
    {
      id: 'chiller-100-ton',
      title: '100 tons with 180 gal in the loop, 6 gal a ton',
      origin: 'by hand',
      source: rule,
      given: { V_s: '180 gal', Q_c: '100 ton', c_t: '6 gal/ton' },
      expected: { V_q: '600 gal', V_t: '420 gal' },
      tolerance: 1e-9,
      because: 'By hand: 600 less 180.',
    },
  ],
})

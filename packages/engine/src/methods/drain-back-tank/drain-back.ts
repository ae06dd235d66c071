import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'

const practice = cite(commonPractice, 'solar design: collectors, piping above and a reserve')

export const drainBack = defineMethod({
  id: 'drain-back-tank.contents-above',
  revision: 1,
  title: 'Drain-back tank by what drains into it',
  vessel: { kind: 'drain-back tank', method: 'contents above' },
  inputs: {
    V_col: keyed('volume', 'content of the collectors', 'vessel', 'collector-volume'),
    V_pa: keyed('volume', 'content of the piping above the tank', 'vessel', 'piping-above'),
    V_res: keyed('volume', 'water that stays in the tank', 'vessel', 'water-reserve', 'drain-back.reserve'),
  },
  steps: { V_t: step('volume', 'required volume', 'V_col + V_pa + V_res', practice) },
  checks: [],
  results: { 'required-volume': 'V_t', 'water-reserve': 'V_res' },
  basis:
    'The tank takes what collectors and piping above it hold when the pump stops, over a reserve that keeps the pump suction under water. A trade rule without a standard behind it.',
  examples: [
    {
      id: 'collectors-10-gal',
      title: '10 gal of collectors, 3 gal of piping above, 4 gal of reserve',
      origin: 'by hand',
      source: practice,
      given: { V_col: '10 gal', V_pa: '3 gal', V_res: '4 gal' },
      expected: { V_t: '17 gal' },
      tolerance: 1e-9,
      because: 'By hand: 10 + 3 + 4.',
    },
  ],
})

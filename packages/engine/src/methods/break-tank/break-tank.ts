import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { en806 } from '../../sources/en-806.ts'
import { geometry } from '../../sources/geometry.ts'

const balance = cite(geometry, 'water drawn less water that comes in')

export const breakTank = defineMethod({
  id: 'break-tank.peak',
  revision: 1,
  title: 'Break tank by the balance of peak and refill',
  vessel: { kind: 'break tank', method: 'peak' },
  inputs: {
    Q_pk: keyed('flow', 'flow out of the tank at the peak', 'vessel', 'peak-flow'),
    Q_rf: keyed('flow', 'flow from the main into the tank', 'vessel', 'refill-flow', 'break-tank.refill'),
    tau: keyed('time', 'length of the peak or of the failure of the main', 'vessel', 'holding-time'),
    f_u: keyed('ratio', 'usable part of the tank', 'vessel', 'usable-fraction', 'break-tank.usable-fraction'),
  },
  steps: {
    V_u: step('volume', 'usable storage', 'max(0[gpm], Q_pk - Q_rf) * tau', balance),
    V_t: step('volume', 'required volume', 'V_u / f_u', citeFromMemory(commonPractice, 'usable part of a break tank')),
  },
  checks: [],
  validity: [
    {
      condition: 'Q_rf < Q_pk',
      source: citeFromMemory(en806, 'storage of drinking water'),
      message:
        'the main fills the tank as fast as the peak draws: by this balance nothing has to be stored, only parted.',
    },
  ],
  results: { 'required-volume': 'V_t', 'usable-volume': 'V_u' },
  basis:
    'The tank gives what the peak draws beyond the refill. A balance of volumes without a standard behind it: the storage that EN 806-2 or the authority asks for governs where it is larger, as does a turnover of the water within a day. The air gap parts the system from the main.',
  examples: [
    {
      id: 'peak-60-gpm',
      title: '60 gpm for 30 minutes with 20 gpm coming in, 80 % usable',
      origin: 'by hand',
      source: balance,
      given: { Q_pk: '60 gpm', Q_rf: '20 gpm', tau: '30 min', f_u: '0.8' },
      expected: { V_u: '1200 gal', V_t: '1500 gal' },
      tolerance: 1e-9,
      because: 'By hand: 40 · 30 / 0.8.',
    },
  ],
})

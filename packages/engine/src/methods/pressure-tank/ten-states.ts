import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { tenStates } from '../../sources/ten-states.ts'

const rule = cite(tenStates, '7.2.2 b, gross volume of ten minutes of the largest pump')

export const tenStatesTank = defineMethod({
  id: 'pressure-tank.ten-states',
  revision: 1,
  title: 'Pressure tank by ten minutes of the largest pump, Ten States',
  vessel: { kind: 'pressure tank', method: 'ten states' },
  inputs: {
    Q_p: keyed('flow', 'flow of the largest pump', 'vessel', 'pump-flow'),
    p_on: keyed('gauge pressure', 'cut-in pressure', 'pressure', 'cut-in'),
    p_off: keyed('gauge pressure', 'cut-out pressure', 'pressure', 'cut-out'),
  },
  steps: { V_t: step('volume', 'required volume', '10[min] * Q_p', rule) },
  checks: [
    {
      condition: 'p_off > p_on',
      code: 'CF-E024',
      message: 'The cut-out pressure is not above the cut-in pressure, so the tank gives no water.',
      hint: 'Raise `cut-out` or lower `cut-in`.',
    },
  ],
  results: { 'required-volume': 'V_t', 'cut-in-pressure': 'p_on', 'maximum-pressure': 'p_off' },
  basis:
    'The gross volume is ten times the flow of the largest pump in a minute. A rule for public water systems and for tanks without a membrane, no building code; it is a ceiling more than a size.',
  examples: [
    {
      id: 'pump-250-gpm',
      title: 'Pump of 250 gpm: 2,500 gal',
      origin: 'published',
      source: rule,
      given: { Q_p: '250 gpm', p_on: '40 psig', p_off: '60 psig' },
      expected: { V_t: '2500 gal' },
      tolerance: 1e-9,
      because: 'Arithmetic only.',
    },
  ],
})

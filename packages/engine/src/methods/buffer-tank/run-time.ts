import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { heatBalance } from '../../sources/heat-balance.ts'
import { hydronicsColumn } from '../../sources/hydronics-column.ts'

const balance = cite(heatBalance, 'heat that the source makes beyond the load, held in the temperature band')

export const bufferRunTime = defineMethod({
  id: 'buffer-tank.run-time',
  revision: 1,
  title: 'Buffer tank by the least run time of the source',
  vessel: { kind: 'buffer tank', method: 'run time' },
  inputs: {
    t_l: keyed('temperature', 'lowest water temperature', 'temperatures', 'low'),
    t_h: keyed('temperature', 'highest water temperature', 'temperatures', 'high'),
    Q_s: keyed('power', 'least output of the smallest source', 'vessel', 'source-minimum'),
    Q_l: keyed('power', 'least load that can call alone', 'vessel', 'load-minimum', 'buffer.load-minimum'),
    tau: keyed('time', 'least run time', 'vessel', 'run-time'),
    dT: keyed('temperature difference', 'temperature band', 'vessel', 'temperature-band'),
    V_c: keyed('volume', 'water of the circuit that always flows', 'vessel', 'credit', 'buffer.credit'),
  },
  steps: {
    t_m: step('temperature', 'mean temperature', 't_l + (t_h - t_l) / 2', balance),
    rho_m: step('density', 'density at the mean temperature', 'rho(t_m)', balance),
    c_m: step('specific heat', 'specific heat at the mean temperature', 'c_p(t_m)', balance),
    V_g: step('volume', 'volume before the credit', 'tau * (Q_s - Q_l) / (rho_m * c_m * dT)', balance),
    V_t: step('volume', 'required volume', 'max(0[L], V_g - V_c)', balance),
  },
  checks: [
    {
      condition: 'dT > 0[K]',
      code: 'CF-E005',
      message: 'The temperature band is zero, so no volume is large enough.',
      hint: 'Give `temperature-band` above zero.',
    },
  ],
  results: { 'required-volume': 'V_t' },
  basis:
    'The tank holds what the smallest source makes beyond the least load during its least run time, within the temperature band, less the water of the circuit that always flows.',
  examples: [
    {
      id: 'column-46-gal',
      title: 'Heat pump of 48,000 Btu/h with a load of 2,000 Btu/h, 10 minutes, 20 °F',
      origin: 'from memory',
      source: cite(hydronicsColumn, 'formula 1, with 500 Btu/h for one gpm and one degree'),
      given: {
        t_l: '90 °F',
        t_h: '110 °F',
        Q_s: '48000 Btu/h',
        Q_l: '2000 Btu/h',
        tau: '10 min',
        dT: '20 °F',
        V_c: '0 gal',
        rho_m: '62.3127 lb/ft3',
        c_m: '1 Btu/(lb·°F)',
      },
      expected: { V_t: '46 gal' },
      tolerance: 0.001,
      because: '500 is 8.33 lb/gal times 60 rounded from 499.8.',
    },
  ],
})

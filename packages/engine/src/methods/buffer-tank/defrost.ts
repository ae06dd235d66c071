import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { heatBalance } from '../../sources/heat-balance.ts'

const balance = cite(heatBalance, 'heat of one defrost held in the temperature band')

export const bufferDefrost = defineMethod({
  id: 'buffer-tank.defrost',
  revision: 1,
  title: 'Buffer tank by the heat of one defrost',
  vessel: { kind: 'buffer tank', method: 'defrost', impliedBy: ['defrost-energy'] },
  inputs: {
    t_l: keyed('temperature', 'lowest water temperature', 'temperatures', 'low'),
    t_h: keyed('temperature', 'highest water temperature', 'temperatures', 'high'),
    E_d: keyed('energy', 'heat of one defrost', 'vessel', 'defrost-energy'),
    dT: keyed('temperature difference', 'temperature band', 'vessel', 'temperature-band'),
    V_c: keyed('volume', 'water of the circuit that always flows', 'vessel', 'credit', 'buffer.credit'),
  },
  steps: {
    t_m: step('temperature', 'mean temperature', 't_l + (t_h - t_l) / 2', balance),
    rho_m: step('density', 'density at the mean temperature', 'rho(t_m)', balance),
    c_m: step('specific heat', 'specific heat at the mean temperature', 'c_p(t_m)', balance),
    V_g: step('volume', 'volume before the credit', 'E_d / (rho_m * c_m * dT)', balance),
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
  basis: 'The tank gives the heat of one defrost within the temperature band. Data of the chosen machine govern.',
  examples: [
    {
      id: 'defrost-3-kwh',
      title: 'Defrost of 3 kWh in a band of 5 K',
      origin: 'by hand',
      source: balance,
      given: {
        t_l: '30 °C',
        t_h: '45 °C',
        E_d: '3 kWh',
        dT: '5 K',
        V_c: '0 L',
        rho_m: '1000 kg/m3',
        c_m: '4.18 kJ/(kg·K)',
      },
      expected: { V_t: '516.746411483 L' },
      tolerance: 1e-9,
      because: 'By hand: 10,800 kJ / (1,000 kg/m3 · 4.18 · 5).',
    },
  ],
})

import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step } from '../../method.ts'
import { din4807Part5 } from '../../sources/din-4807-5.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

const design = citeFromMemory(din4807Part5, '6.2 and 6.3')

export const din4807Part5Vessel = defineMethod({
  id: 'thermal-expansion-tank.din-4807-5',
  revision: 1,
  title: 'Vessel with membrane for drinking water, DIN 4807-5',
  vessel: { kind: 'thermal expansion tank', method: 'din 4807-5' },
  product: 'EN 13831',
  sections: ['contents', 'incoming pressure'],
  inputs: {
    V_s: given('volume', 'system volume'),
    t_h: keyed('temperature', 'storage temperature', 'temperatures', 'storage'),
    p_1: given('gauge pressure', 'fill pressure'),
    p_rv: keyed('gauge pressure', 'relief valve set pressure', 'pressure', 'relief-valve'),
  },
  steps: {
    n: step(
      'ratio',
      'relative expansion, 10 to 60 °C',
      'when(t_h < 60.01[°C], 0.0167, v_sat(t_h) / v_sat(10[°C]) - 1)',
      design,
    ),
    V_e: step('volume', 'expansion volume', 'n * V_s', design),
    p_e: step('gauge pressure', 'maximum pressure', '0.8 * p_rv', design),
    p_0: step('gauge pressure', 'precharge', 'p_1 - 0.2[bar]', design),
    V_t: step(
      'volume',
      'required volume',
      'V_e * (absolute(p_e, 0.5[bar abs]) * absolute(p_1, 1.2[bar abs])) / (absolute(p_0, 1[bar abs]) * (p_e - p_1 - 0.7[bar]))',
      design,
    ),
  },
  checks: [
    {
      condition: 'p_e - p_1 > 0.7[bar]',
      code: 'CF-E022',
      message: 'The incoming pressure is too close to the relief valve setting: no vessel is large enough.',
      hint: 'Lower the regulator setting.',
    },
    {
      condition: 'p_0 > 0[bar g]',
      code: 'CF-E023',
      message: 'The incoming pressure leaves no charge above atmosphere.',
      hint: 'Check `pressure.supply` and `pressure.regulator`.',
    },
  ],
  results: {
    'required-volume': 'V_t',
    'system-volume': 'V_s',
    'expansion-volume': 'V_e',
    'fill-pressure': 'p_1',
    'maximum-pressure': 'p_e',
    precharge: 'p_0',
  },
  basis:
    'Expansion of 1.67 % from 10 to 60 °C, highest pressure 0.8 of the relief valve setting, charge 0.2 bar below the incoming pressure. The formula is from memory.',
  examples: [
    {
      id: 'din-200-l',
      title: '200 L heater, 4 bar incoming, 10 bar relief valve',
      origin: 'derived',
      source: cite(verificationEvaluation, 'DIN 4807-5 formula, 200 L'),
      given: { V_s: '200 L', t_h: '60 °C', p_1: '4 bar g', p_rv: '10 bar g' },
      expected: { p_e: '8 bar g', p_0: '3.8 bar g', V_t: '9.31995 L' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
  ],
})

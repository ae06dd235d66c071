import { cite } from '../../citation.ts'
import { defineMethod, step } from '../../method.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'
import { handbookSystem } from './ashrae-diaphragm.ts'
import { equations, expansion, inputs, temperaturesRise, waterExpands } from './ashrae.ts'

const { V_s, t_l, t_h, alpha } = handbookSystem

export const ashraeOpen = defineMethod({
  id: 'expansion-tank.ashrae.open',
  revision: 1,
  title: 'Open expansion tank, ASHRAE',
  vessel: { kind: 'expansion tank', method: 'ashrae', when: { construction: ['open'] } },
  sections: ['site', 'contents', 'material'],
  inputs,
  steps: {
    ...expansion,
    V_t: step('volume', 'required volume', '2 * V_e', equations),
  },
  checks: [temperaturesRise, waterExpands],
  results: { 'required-volume': 'V_t', 'system-volume': 'V_s', 'expansion-volume': 'V_e' },
  basis:
    'Twice the net expansion, so that the tank is neither empty when cold nor overflowing when hot. It stands above the highest point and is open to the air.',
  examples: [
    {
      id: 'handbook-3000-gal-open',
      title: 'Open tank for the handbook example',
      origin: 'derived',
      source: cite(verificationEvaluation, 'tank equation (13) for the handbook example'),
      given: { V_s, t_l, t_h, alpha, v_l: '0.01602 ft3/lb', v_h: '0.01677 ft3/lb' },
      expected: { V_t: '259.839 gal' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
  ],
})

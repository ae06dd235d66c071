import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, step } from '../../method.ts'
import { ashraeHvacSe } from '../../sources/ashrae-hvac-se.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'
import { handbookSystem } from './ashrae-diaphragm.ts'
import {
  absolutePressures,
  equations,
  expansion,
  inputs,
  pressureInputs,
  pressuresRise,
  sections,
  temperaturesRise,
  waterExpands,
} from './ashrae.ts'

export const ashraePlainSteel = defineMethod({
  id: 'expansion-tank.ashrae.plain-steel',
  revision: 1,
  title: 'Plain steel expansion tank with an air cushion, ASHRAE',
  vessel: { kind: 'expansion tank', method: 'ashrae', when: { construction: ['plain steel'] } },
  sections,
  inputs: { ...inputs, ...pressureInputs },
  steps: {
    ...expansion,
    ...absolutePressures,
    V_t: step('volume', 'required volume', 'V_e / (P_a / P_1 - P_a / P_2)', equations),
  },
  checks: [temperaturesRise, waterExpands, pressuresRise],
  results: {
    'required-volume': 'V_t',
    'system-volume': 'V_s',
    'expansion-volume': 'V_e',
    'fill-pressure': 'p_f',
    'maximum-pressure': 'p_max',
  },
  checkBack: 'check-back.plain-steel',
  basis:
    'Net expansion is that of the fluid less the growth of the piping. The tank is full of air at atmospheric pressure before the system is filled, so the altitude of the site matters; it has no precharge.',
  examples: [
    {
      id: 'handbook-3000-gal-plain',
      title: 'Handbook example, plain steel tank, specific volumes as printed',
      origin: 'from memory',
      source: citeFromMemory(ashraeHvacSe, 'hydronic heating and cooling, example of a 3,000 gal system'),
      given: { ...handbookSystem, v_l: '0.01602 ft3/lb', v_h: '0.01677 ft3/lb' },
      expected: { V_t: '578 gal' },
      tolerance: 0.001,
      because: 'Printed to the whole gallon: half a unit is 0.5 in 578.',
    },
    {
      id: 'handbook-3000-gal-plain-if97',
      title: 'The same with the specific volumes of IAPWS-IF97',
      origin: 'derived',
      source: cite(verificationEvaluation, 'tank equation (12) for the handbook example'),
      given: handbookSystem,
      expected: { V_t: '579.029 gal' },
      tolerance: 0.0005,
      because: 'The equation with volumes evaluated apart from this program.',
    },
    {
      id: 'plain-at-5280-ft',
      title: 'The same gauge pressures at 5,280 ft',
      origin: 'derived',
      source: cite(verificationEvaluation, 'tank equation (12) with the standard atmosphere at 5,280 ft'),
      given: { ...handbookSystem, P_a: '12.1002 psia', e_n: '0.04330647940074907' },
      expected: { V_t: '586.898 gal' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
  ],
})

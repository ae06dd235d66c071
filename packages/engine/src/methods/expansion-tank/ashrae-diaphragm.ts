import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, step } from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { ashraeHvacSe } from '../../sources/ashrae-hvac-se.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { frenchHeatingMethod } from '../../sources/french-heating-method.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'
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

const example = citeFromMemory(ashraeHvacSe, 'hydronic heating and cooling, example of a 3,000 gal system')

/** The handbook's example: 3,000 gal, 40 to 220 °F, steel piping, 10 psig cold and 25 psig hot. */
export const handbookSystem = {
  V_s: '3000 gal',
  t_l: '40 °F',
  t_h: '220 °F',
  alpha: '6.5e-6 1/°F',
  P_a: '14.7 psia',
  p_f: '10 psig',
  p_max: '25 psig',
} as const

export const ashraeDiaphragm = defineMethod({
  id: 'expansion-tank.ashrae.diaphragm',
  revision: 1,
  title: 'Expansion tank with diaphragm or bladder, ASHRAE',
  vessel: { kind: 'expansion tank', method: 'ashrae', when: { construction: ['diaphragm', 'bladder'] } },
  sections,
  inputs: { ...inputs, ...pressureInputs },
  steps: {
    ...expansion,
    ...absolutePressures,
    V_t: step('volume', 'required volume', 'V_e / (1 - P_1 / P_2)', equations),
    p_0: step('gauge pressure', 'precharge', 'p_f', cite(commonPractice, 'precharge equals fill pressure')),
  },
  checks: [temperaturesRise, waterExpands, pressuresRise],
  results: {
    'required-volume': 'V_t',
    'system-volume': 'V_s',
    'expansion-volume': 'V_e',
    'fill-pressure': 'p_f',
    'maximum-pressure': 'p_max',
    precharge: 'p_0',
  },
  checkBack: 'check-back.diaphragm',
  basis:
    'Net expansion is that of the fluid between its lowest and highest temperature less the growth of the piping. The gas charge equals the fill pressure, and the whole shell is taken to be usable; the acceptance volume of the chosen vessel is checked apart.',
  examples: [
    {
      id: 'handbook-3000-gal-diaphragm',
      title: 'Handbook example, diaphragm tank, specific volumes as printed',
      origin: 'from memory',
      source: example,
      given: { ...handbookSystem, v_l: '0.01602 ft3/lb', v_h: '0.01677 ft3/lb' },
      expected: { V_t: '344 gal' },
      tolerance: 0.0015,
      because: 'Printed to the whole gallon: half a unit is 0.5 in 344.',
    },
    {
      id: 'handbook-3000-gal-diaphragm-if97',
      title: 'The same with the specific volumes of IAPWS-IF97',
      origin: 'derived',
      source: cite(verificationEvaluation, 'tank equation (14) for the handbook example'),
      given: handbookSystem,
      expected: { V_t: '344.604 gal', e_n: '0.043401' },
      tolerance: 0.0005,
      because:
        'The equation with volumes evaluated apart from this program; a five-decimal specific volume moves the result by up to 0.7 %.',
    },
  ],
})

export const ashraeDiaphragmOtherCharge = defineMethod({
  id: 'expansion-tank.ashrae.diaphragm-other-charge',
  revision: 1,
  title: 'Expansion tank with diaphragm or bladder, precharge other than fill, ASHRAE',
  vessel: {
    kind: 'expansion tank',
    method: 'ashrae',
    when: { construction: ['diaphragm', 'bladder'], written: ['precharge'] },
  },
  sections,
  inputs: {
    ...inputs,
    ...pressureInputs,
    p_0: { kind: 'gauge pressure', name: 'precharge', from: { at: 'vessel', key: 'precharge' } },
  },
  steps: {
    ...expansion,
    ...absolutePressures,
    P_0: step('absolute pressure', 'absolute precharge', 'absolute(p_0, P_a)', cite(boyle, 'absolute pressure')),
    V_t: step(
      'volume',
      'required volume',
      'V_e / (min(1, P_0 / P_1) - P_0 / P_2)',
      cite(boyle, 'gas volume at charge, fill and highest pressure'),
    ),
  },
  checks: [
    temperaturesRise,
    waterExpands,
    pressuresRise,
    {
      condition: 'P_2 > P_0',
      code: 'CF-E021',
      message: 'The precharge is not below the highest pressure allowed: the vessel would never take up water.',
      hint: 'Set the precharge to the fill pressure.',
    },
  ],
  results: ashraeDiaphragm.results,
  checkBack: 'check-back.diaphragm-other-charge',
  basis:
    'As the ASHRAE method, with a gas charge other than the fill pressure: water that enters the vessel at fill takes up part of it, and a charge above fill leaves no water in it when cold.',
  examples: [
    {
      id: 'charge-below-fill',
      title: 'Vessel charged half a bar below the fill pressure',
      origin: 'derived',
      source: cite(frenchHeatingMethod, 'vessel with a charge other than the fill pressure'),
      given: {
        V_s: '200 L',
        t_l: '4 °C',
        t_h: '80 °C',
        alpha: '0 1/K',
        P_a: '1 bar abs',
        V_e: '5.8 L',
        p_f: '1.5 bar g',
        p_max: '2.5 bar g',
        p_0: '1 bar g',
      },
      expected: { V_t: '25.375 L' },
      tolerance: 1e-9,
      because: 'By hand from the published form: 5.8 · 3.5 · 2.5 / (2 · 1).',
    },
  ],
})

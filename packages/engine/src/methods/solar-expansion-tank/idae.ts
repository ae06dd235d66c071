import { cite } from '../../citation.ts'
import { defineMethod, given, keyed, step, type Method, type WorkedExample } from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { idae022 } from '../../sources/idae-022.ts'
import { absolutePressures, pressureInputs, pressuresRise } from '../expansion-tank/ashrae.ts'

const guide = cite(idae022, 'p. 88, expansion system of a solar loop')

const loop = {
  P_a: '1 bar abs',
  V_s: '65 L',
  V_col: '30 L',
  V_pa: '10 L',
  e_s: '0.085',
  V_res: '3 L',
}

const build = (written: boolean, examples: readonly WorkedExample[]): Method =>
  defineMethod({
    id: written ? 'solar-expansion-tank.idae.other-charge' : 'solar-expansion-tank.idae',
    revision: 1,
    title: written ? 'Solar expansion tank, precharge other than fill' : 'Solar expansion tank, guide of ASIT and IDAE',
    vessel: {
      kind: 'solar expansion tank',
      method: 'idae',
      ...(written ? { when: { written: ['precharge'] } } : {}),
    },
    product: 'EN 13831',
    sections: ['site', 'contents', 'handbook pressures'],
    inputs: {
      V_s: given('volume', 'system volume'),
      ...pressureInputs,
      V_col: keyed('volume', 'content of the collectors', 'vessel', 'collector-volume'),
      V_pa: keyed('volume', 'content of the piping above the collectors', 'vessel', 'piping-above'),
      e_s: keyed('ratio', 'growth of the fluid', 'vessel', 'expansion-fraction', 'solar.expansion-fraction'),
      V_res: keyed('volume', 'fluid reserve, cold', 'vessel', 'water-reserve', 'solar.water-reserve'),
      ...(written ? { p_0: keyed('gauge pressure', 'precharge', 'vessel', 'precharge') } : {}),
    },
    steps: {
      V_dil: step('volume', 'growth of the fluid in the loop', 'e_s * V_s', guide),
      V_vap: step('volume', 'fluid pushed out by steam', 'V_col + V_pa', guide),
      V_e: step('volume', 'expansion volume with steam and reserve', 'V_dil + V_vap + V_res', guide),
      ...absolutePressures,
      ...(written
        ? {
            P_0: step(
              'absolute pressure',
              'absolute precharge',
              'absolute(p_0, P_a)',
              cite(boyle, 'absolute pressure'),
            ),
            C_p: step(
              'ratio',
              'pressure coefficient',
              'max(2, 1 / (min(1, P_0 / P_1) - P_0 / P_2))',
              cite(boyle, 'gas volume at charge, fill and highest pressure'),
            ),
          }
        : {
            C_p: step('ratio', 'pressure coefficient', 'max(2, P_2 / (P_2 - P_1))', guide),
            p_0: step('gauge pressure', 'precharge', 'p_f', cite(commonPractice, 'precharge equals fill pressure')),
          }),
      V_t: step('volume', 'required volume', 'V_e * C_p', guide),
    },
    checks: [
      pressuresRise,
      ...(written
        ? [
            {
              condition: 'P_2 > P_0',
              code: 'CF-E021',
              message: 'The precharge is not below the highest pressure allowed: the vessel would never take up fluid.',
              hint: 'Set the precharge to the fill pressure.',
            },
          ]
        : []),
    ],
    results: {
      'required-volume': 'V_t',
      'system-volume': 'V_s',
      'expansion-volume': 'V_e',
      'fill-pressure': 'p_f',
      'maximum-pressure': 'p_max',
      precharge: 'p_0',
    },
    checkBack: written ? 'check-back.diaphragm-other-charge' : 'check-back.diaphragm',
    basis:
      'The vessel takes the growth of the fluid in the loop, the whole content of collectors and piping above them when they boil, and a reserve; the pressure coefficient is never below 2. A public guide, no standard. The membrane has to stand the temperature: put a cooling vessel ahead of it where the fluid may come back above 70 °C.',
    examples,
  })

export const solarOtherCharge = build(true, [
  {
    id: 'solar-charged-at-fill',
    title: 'A charge equal to the fill pressure gives the vessel of the guide',
    origin: 'published',
    source: cite(idae022, 'p. 88, case 1'),
    given: { ...loop, p_f: '2.7 bar', p_max: '5.4 bar', p_0: '2.7 bar' },
    expected: { C_p: '2.37', V_t: '114.9 L' },
    tolerance: 0.0015,
    because: 'The guide rounds the growth to 5.5 L and the coefficient to 2.37.',
  },
])

export const solar = build(false, [
  {
    id: 'guide-case-1',
    title: '20 collectors of 1.5 L, 10 L of piping above them, 5.4 and 2.7 bar',
    origin: 'published',
    source: cite(idae022, 'p. 88, case 1'),
    given: { ...loop, p_f: '2.7 bar', p_max: '5.4 bar' },
    expected: { V_vap: '40 L', V_e: '48.5 L', C_p: '2.37', V_t: '114.9 L' },
    tolerance: 0.0015,
    because: 'The guide rounds the growth to 5.5 L and the coefficient to 2.37.',
  },
  {
    id: 'guide-case-2',
    title: 'The same where the coefficient comes out below 2: 2 is taken',
    origin: 'published',
    source: cite(idae022, 'p. 88, case 2: coefficient of 2 at least'),
    given: { ...loop, p_f: '1 bar', p_max: '5.4 bar' },
    expected: { C_p: '2', V_t: '97 L' },
    tolerance: 0.0006,
    because: 'The guide rounds the growth from 5.525 to 5.5 L.',
  },
])

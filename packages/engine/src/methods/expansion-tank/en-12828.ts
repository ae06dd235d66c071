import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'
import {
  annexD,
  chargeBelowHighest,
  inputs,
  leastFill,
  requiredVolume,
  results,
  sections,
  waterReserve,
} from './european.ts'

const steps = {
  V_WR: step('volume', 'water reserve', waterReserve, annexD),
  V_t: step('volume', 'required volume', requiredVolume, annexD),
  p_f: step('gauge pressure', 'least fill pressure', leastFill, annexD),
}

const when = { construction: ['diaphragm', 'bladder'] } as const

export const en12828Water = defineMethod({
  id: 'expansion-tank.en-12828.water',
  revision: 1,
  title: 'Expansion vessel with membrane, EN 12828',
  vessel: { kind: 'expansion tank', method: 'en 12828', when },
  product: 'EN 13831',
  sections,
  inputs,
  steps: {
    e: step('ratio', 'relative expansion', '(0.31 + 3.9e-4 * celsius(t_h) ^ 2) / 100', annexD),
    V_e: step('volume', 'expansion volume', 'e * V_s', annexD),
    ...steps,
  },
  checks: [chargeBelowHighest],
  validity: [
    {
      condition: 'celsius(t_h) >= 29.999',
      source: annexD,
      message: 'The expansion coefficient of EN 12828 is tabled from 30 °C; below it overstates the expansion by half.',
    },
    {
      condition: 'celsius(t_h) <= 130.001',
      source: annexD,
      message: 'The expansion coefficient of EN 12828 is tabled up to 130 °C.',
    },
  ],
  results,
  checkBack: 'check-back.european',
  basis:
    'Expansion by the coefficient of the standard at the limiter setting, a water reserve of 0.5 % of the contents and at least 3 L, pressures made absolute with one bar. No growth of the piping is credited.',
  examples: [
    {
      id: 'annex-d-300-l',
      title: 'Small radiator system, the 3 L reserve governs',
      origin: 'derived',
      source: cite(verificationEvaluation, 'EN 12828 Annex D procedure, 300 L at 70 °C'),
      given: { V_s: '300 L', t_h: '70 °C', p_0: '0.9 bar g', p_e: '2.5 bar g' },
      expected: { e: '2.221 %', V_e: '6.663 L', V_WR: '3 L', V_t: '21.1378 L' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
    {
      id: 'annex-d-1000-l',
      title: 'Radiator system of 1,000 L',
      origin: 'derived',
      source: cite(verificationEvaluation, 'EN 12828 Annex D procedure, 1,000 L at 70 °C'),
      given: { V_s: '1000 L', t_h: '70 °C', p_0: '1.3 bar g', p_e: '2.5 bar g' },
      expected: { V_e: '22.21 L', V_WR: '5 L', V_t: '79.3625 L' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
    ...(
      [
        [30, '0.66 %'],
        [50, '1.29 %'],
        [80, '2.81 %'],
        [100, '4.21 %'],
        [130, '6.90 %'],
      ] as const
    ).map(([t, e]) => ({
      id: `annex-d-expansion-${t}`,
      title: `Expansion coefficient at ${t} °C`,
      origin: 'from memory' as const,
      source: annexD,
      given: { V_s: '1000 L', t_h: `${t} °C`, p_0: '1 bar g', p_e: '2.5 bar g' },
      expected: { e },
      tolerance: 0.008,
      because: 'Printed with two decimals of a per cent: half a unit is 0.005 in the value.',
    })),
  ],
})

export const en12828Glycol = defineMethod({
  ...en12828Water,
  id: 'expansion-tank.en-12828.glycol',
  title: 'Expansion vessel with membrane, EN 12828, glycol solution',
  vessel: { kind: 'expansion tank', method: 'en 12828', when: { ...when, glycol: true } },
  product: 'EN 13831',
  inputs: { ...inputs, t_l: keyed('temperature', 'lowest water temperature', 'temperatures', 'low') },
  steps: {
    v_l: step('specific volume', 'specific volume, cold', 'v_sat(t_l)', annexD),
    v_h: step('specific volume', 'specific volume, hot', 'v_sat(t_h)', annexD),
    e: step('ratio', 'relative expansion', 'v_h / v_l - 1', annexD),
    V_e: step('volume', 'expansion volume', 'e * V_s', annexD),
    ...steps,
  },
  validity: [],
  basis:
    'As EN 12828 for water, with the expansion from the density of the glycol solution between its lowest and highest temperature.',
  examples: [
    {
      id: 'annex-d-glycol-stated-volumes',
      title: 'Expansion from stated specific volumes',
      origin: 'by hand',
      source: annexD,
      given: {
        V_s: '1000 L',
        t_l: '10 °C',
        t_h: '70 °C',
        v_l: '0.00096 m3/kg',
        v_h: '0.00099 m3/kg',
        p_0: '1 bar g',
        p_e: '2.5 bar g',
      },
      expected: { V_e: '31.25 L', V_WR: '5 L', V_t: '84.5833333333 L' },
      tolerance: 1e-9,
      because: 'By hand: 99/96 - 1 = 0.03125; (31.25 + 5) · 3.5 / 1.5.',
    },
  ],
})

export const checkBackEuropean = defineMethod({
  id: 'check-back.european',
  revision: 1,
  title: 'Least fill and final pressure with the chosen vessel, EN 12828',
  inputs: {
    V_e: { kind: 'volume', name: 'expansion volume', from: { at: 'section' } },
    V_WR: { kind: 'volume', name: 'water reserve', from: { at: 'section' } },
    p_0: inputs['p_0'] ?? keyed('gauge pressure', 'precharge', 'vessel', 'precharge'),
    V_c: { kind: 'volume', name: 'volume of the chosen vessels together', from: { at: 'section' } },
  },
  steps: {
    p_a: step(
      'gauge pressure',
      'least fill pressure with the chosen vessel',
      'gauge(V_c * absolute(p_0, 1[bar abs]) / (V_c - V_WR), 1[bar abs])',
      annexD,
    ),
    p_c: step(
      'gauge pressure',
      'final pressure',
      'gauge(V_c * absolute(p_0, 1[bar abs]) / (V_c - V_WR - V_e), 1[bar abs])',
      annexD,
    ),
  },
  checks: [
    {
      condition: 'V_c > V_e + V_WR',
      code: 'CF-E030',
      message: 'The chosen vessel has not room for the expansion and the reserve.',
      hint: 'Choose a larger vessel.',
    },
  ],
  results: { 'fill-pressure': 'p_a', 'final-pressure': 'p_c' },
  basis: 'The least fill pressure that keeps the reserve, and the final pressure, with the vessel that was chosen.',
  examples: [
    {
      id: 'annex-d-least-fill-80-l',
      title: 'Least fill pressure with an 80 L vessel',
      origin: 'derived',
      source: cite(verificationEvaluation, 'EN 12828 Annex D procedure, 1,000 L at 70 °C, 80 L vessel'),
      given: { V_e: '22.21 L', V_WR: '5 L', p_0: '1.3 bar g', V_c: '80 L' },
      expected: { p_a: '1.45333 bar g' },
      tolerance: 1e-5,
      because: 'Six printed digits.',
    },
  ],
})

import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { une100155 } from '../../sources/une-100155.ts'
import { uneWorkedSheet } from '../../sources/une-worked-sheet.ts'

const clause9 = cite(une100155, 'clause 9')
const glycolFactor = citeFromMemory(une100155, 'correction for glycol solutions')

const inputs = {
  V_s: given('volume', 'system volume'),
  t_h: keyed('temperature', 'highest water temperature', 'temperatures', 'high'),
  p_f: given('gauge pressure', 'fill pressure'),
  p_max: given('gauge pressure', 'maximum pressure'),
}

const rest = {
  V_e: step('volume', 'expansion volume', 'V_s * C_e', clause9),
  P_m: step('absolute pressure', 'absolute pressure, cold', 'absolute(p_f, 1[bar abs])', clause9),
  P_M: step('absolute pressure', 'absolute pressure, hot', 'absolute(p_max, 1[bar abs])', clause9),
  C_p: step('ratio', 'pressure coefficient', 'P_M / (P_M - P_m)', clause9),
  V_t: step('volume', 'required volume', 'V_e * C_p', clause9),
  p_0: step('gauge pressure', 'precharge', 'p_f', cite(commonPractice, 'precharge equals fill pressure')),
}

const coefficient = '(3.24 * celsius(t_h) ^ 2 + 102.13 * celsius(t_h) - 2708.3) * 1e-6'

const when = { construction: ['diaphragm', 'bladder'] } as const

export const une100155Water = defineMethod({
  id: 'expansion-tank.une-100155.water',
  revision: 1,
  title: 'Closed expansion vessel, UNE 100155',
  vessel: { kind: 'expansion tank', method: 'une 100155', when },
  product: 'EN 13831',
  sections: ['contents', 'handbook pressures'],
  inputs,
  steps: { C_e: step('ratio', 'expansion coefficient', coefficient, clause9), ...rest },
  checks: [
    {
      condition: 'C_e > 0',
      code: 'CF-E012',
      message: 'The expansion coefficient of the standard is not positive at this temperature.',
      hint: 'Use another method: this one is stated for 30 to 120 °C.',
    },
    {
      condition: 'P_M > P_m',
      code: 'CF-E020',
      message: 'The highest pressure allowed at the vessel is not above the fill pressure: no vessel is large enough.',
      hint: 'Raise the relief valve setting, or lower the static height above the vessel.',
    },
  ],
  validity: [
    {
      condition: 'celsius(t_h) >= 29.999',
      source: clause9,
      message: 'UNE 100155 states its coefficient for 30 to 120 °C.',
    },
    {
      condition: 'celsius(t_h) <= 120.001',
      source: clause9,
      message: 'UNE 100155 states its coefficient for 30 to 120 °C.',
    },
  ],
  results: {
    'required-volume': 'V_t',
    'system-volume': 'V_s',
    'expansion-volume': 'V_e',
    'fill-pressure': 'p_f',
    'maximum-pressure': 'p_max',
    precharge: 'p_0',
  },
  checkBack: 'check-back.une-100155',
  basis:
    'Expansion by the coefficient of the standard, which already contains the growth of the piping, so none is taken off; pressures made absolute with one bar, highest pressure 0.9 of the relief valve setting.',
  examples: [
    ...(
      [
        [60, '0.0151'],
        [70, '0.0204'],
        [90, '0.0328'],
        [100, '0.0400'],
      ] as const
    ).map(([t, printed]) => ({
      id: `une-coefficient-${t}`,
      title: `Expansion coefficient at ${t} °C`,
      origin: 'published' as const,
      source: clause9,
      given: { V_s: '1000 L', t_h: `${t} °C`, p_f: '1.5 bar g', p_max: '3.6 bar g' },
      expected: { C_e: printed },
      tolerance: 0.006,
      because:
        'The formula of the standard was fitted to its own table, which prints three digits; the two part by up to 0.5 %.',
    })),
  ],
})

export const une100155Glycol = defineMethod({
  ...une100155Water,
  id: 'expansion-tank.une-100155.glycol',
  title: 'Closed expansion vessel, UNE 100155, glycol solution',
  vessel: { kind: 'expansion tank', method: 'une 100155', when: { ...when, glycol: true } },
  product: 'EN 13831',
  inputs: {
    ...inputs,
    G: { kind: 'ratio', name: 'glycol by volume', from: { at: 'fluid', property: 'volume fraction' } },
  },
  steps: {
    a_g: step('ratio', 'glycol coefficient a', '-0.0134 * ((100 * G) ^ 2 - 143.8 * (100 * G) + 1918.2)', glycolFactor),
    b_g: step('ratio', 'glycol coefficient b', '0.00035 * ((100 * G) ^ 2 - 94.57 * (100 * G) + 500)', glycolFactor),
    f_c: step('ratio', 'glycol factor', 'a_g * (1.8 * celsius(t_h) + 32) ^ b_g', glycolFactor),
    C_e: step('ratio', 'expansion coefficient', `f_c * ${coefficient}`, clause9),
    ...rest,
  },
  validity: [
    {
      condition: 'celsius(t_h) >= 64.999',
      source: glycolFactor,
      message: 'The glycol factor is stated for 65 to 115 °C.',
    },
    {
      condition: 'celsius(t_h) <= 115.001',
      source: glycolFactor,
      message: 'The glycol factor is stated for 65 to 115 °C.',
    },
    {
      condition: 'G >= 0.19999',
      source: glycolFactor,
      message: 'The glycol factor is stated for 20 to 50 % by volume.',
    },
    {
      condition: 'G <= 0.50001',
      source: glycolFactor,
      message: 'The glycol factor is stated for 20 to 50 % by volume.',
    },
  ],
  basis: 'As UNE 100155 for water, with the factor of the standard for glycol solutions (formula from memory).',
  examples: [
    {
      id: 'une-sheet-25-percent',
      title: 'Worked sheet, 549.6 L with 25 % glycol at 70 °C',
      origin: 'published',
      source: cite(uneWorkedSheet, '549.6 L, 25 % by volume, 70 °C, relief valve 4 bar, fill 1.5 bar'),
      given: { V_s: '549.6 L', t_h: '70 °C', G: '25 %', p_f: '1.5 bar g', p_max: '3.6 bar g' },
      expected: { C_e: '0.0319', V_e: '17.511 L', C_p: '2.19048', V_t: '38.3576 L' },
      tolerance: 0.002,
      because: 'The coefficient is printed with three significant digits: half a unit is 0.16 %.',
    },
  ],
})

export const checkBackUne = defineMethod({
  id: 'check-back.une-100155',
  revision: 1,
  title: 'Final pressure with the chosen vessel, one bar atmosphere',
  inputs: {
    V_e: given('volume', 'expansion volume'),
    P_m: given('absolute pressure', 'absolute pressure, cold'),
    V_c: given('volume', 'volume of the chosen vessels together'),
  },
  steps: { p_c: step('gauge pressure', 'final pressure', 'gauge(P_m / (1 - V_e / V_c), 1[bar abs])', clause9) },
  checks: [
    {
      condition: 'V_c > V_e',
      code: 'CF-E030',
      message: 'The chosen vessel has not room for the expansion.',
      hint: 'Choose a larger vessel.',
    },
  ],
  results: { 'final-pressure': 'p_c' },
  basis: 'The highest pressure is found again with the vessel that was chosen.',
  examples: [
    {
      id: 'une-sheet-back',
      title: 'The vessel of the worked sheet ends at 3.6 bar',
      origin: 'published',
      source: cite(uneWorkedSheet, '549.6 L, 25 % by volume'),
      given: { V_e: '17.511 L', P_m: '2.5 bar abs', V_c: '38.3576 L' },
      expected: { p_c: '3.6 bar g' },
      tolerance: 1e-4,
      because: 'The sheet solved for the pressure.',
    },
  ],
})

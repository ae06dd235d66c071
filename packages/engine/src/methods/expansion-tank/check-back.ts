import { cite } from '../../citation.ts'
import { defineMethod, given, step } from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { bs7074Sheet } from '../../sources/bs-7074-sheet.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

const gasLaw = cite(boyle, 'gas volume at charge, fill and highest pressure')

const inputs = {
  V_e: given('volume', 'expansion volume'),
  P_a: given('absolute pressure', 'atmospheric pressure'),
  P_1: given('absolute pressure', 'absolute pressure, cold'),
  V_c: given('volume', 'volume of the chosen vessels together'),
}

const fits = (condition: string) => ({
  condition,
  code: 'CF-E030',
  message: 'The chosen vessel has not room for the expansion.',
  hint: 'Choose a larger vessel.',
})

const basis = 'The highest pressure is found again with the vessel that was chosen.'

export const checkBackDiaphragm = defineMethod({
  id: 'check-back.diaphragm',
  revision: 1,
  title: 'Final pressure with the chosen diaphragm or bladder vessel',
  inputs,
  steps: {
    P_c: step('absolute pressure', 'absolute final pressure', 'P_1 / (1 - V_e / V_c)', gasLaw),
    p_c: step('gauge pressure', 'final pressure', 'gauge(P_c, P_a)', gasLaw),
  },
  checks: [fits('V_c > V_e')],
  results: { 'final-pressure': 'p_c' },
  basis,
  examples: [
    {
      id: 'bs-7074-final-pressure',
      title: 'Final pressure with a 300 L vessel',
      origin: 'published',
      source: cite(bs7074Sheet, 'predicted final pressure'),
      given: { V_e: '103.4 L', P_a: '1 bar abs', P_1: '3.46 bar abs', V_c: '300 L' },
      expected: { p_c: '4.33 bar g' },
      tolerance: 0.013,
      because: 'The sheet rounds the filled fraction 0.345 to 0.35 before its last step.',
    },
  ],
})

export const checkBackOtherCharge = defineMethod({
  id: 'check-back.diaphragm-other-charge',
  revision: 1,
  title: 'Final pressure with the chosen vessel and its own charge',
  inputs: { ...inputs, P_0: given('absolute pressure', 'absolute precharge') },
  steps: {
    P_c: step('absolute pressure', 'absolute final pressure', 'P_0 / (min(1, P_0 / P_1) - V_e / V_c)', gasLaw),
    p_c: step('gauge pressure', 'final pressure', 'gauge(P_c, P_a)', gasLaw),
  },
  checks: [fits('V_c * min(1, P_0 / P_1) > V_e')],
  results: { 'final-pressure': 'p_c' },
  basis,
  examples: [
    {
      id: 'charge-below-fill-back',
      title: 'The vessel of the charge-below-fill example ends at its highest pressure',
      origin: 'by hand',
      source: gasLaw,
      given: { V_e: '5.8 L', P_a: '1 bar abs', P_1: '2.5 bar abs', P_0: '2 bar abs', V_c: '25.375 L' },
      expected: { p_c: '2.5 bar g' },
      tolerance: 1e-9,
      because: '2 / (2/2.5 - 5.8/25.375) = 3.5 bar absolute.',
    },
  ],
})

export const checkBackPlainSteel = defineMethod({
  id: 'check-back.plain-steel',
  revision: 1,
  title: 'Final pressure with the chosen plain steel tank',
  inputs,
  steps: {
    P_c: step('absolute pressure', 'absolute final pressure', 'P_a / (P_a / P_1 - V_e / V_c)', gasLaw),
    p_c: step('gauge pressure', 'final pressure', 'gauge(P_c, P_a)', gasLaw),
  },
  checks: [fits('V_c * (P_a / P_1) > V_e')],
  results: { 'final-pressure': 'p_c' },
  basis,
  examples: [
    {
      id: 'handbook-plain-back',
      title: 'The tank of the handbook example ends at 25 psig',
      origin: 'derived',
      source: cite(verificationEvaluation, 'tank equation (12) solved for the pressure'),
      given: { V_e: '129.919438 gal', P_a: '14.7 psia', P_1: '24.7 psia', V_c: '577.767 gal' },
      expected: { p_c: '25 psig' },
      tolerance: 1e-4,
      because: 'Inverse of equation (12); the volume is printed to six digits.',
    },
  ],
})

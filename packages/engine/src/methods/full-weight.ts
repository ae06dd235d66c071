import { cite, citeFromMemory } from '../citation.ts'
import { defineMethod, given, step } from '../method.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { umc } from '../sources/umc.ts'

/** Weight that the structure has to carry: a bladder may fail, so the whole shell is taken to be full of water. */
export const fullWeight = defineMethod({
  id: 'check.full-weight',
  revision: 1,
  title: 'Weight of the chosen vessel full of water',
  inputs: {
    W_0: given('mass', 'empty weight of one vessel'),
    V_1c: given('volume', 'volume of one chosen vessel'),
  },
  steps: {
    W_f: step(
      'mass',
      'weight full of water',
      'W_0 + V_1c * 999[kg/m3]',
      cite(commonPractice, 'whole shell full of cold water, as after a failure of the bladder'),
    ),
    W_s: step(
      'mass',
      'weight for the supports',
      '2 * W_f',
      citeFromMemory(umc, '1004.1, supports for twice the filled weight'),
    ),
  },
  checks: [],
  results: { 'weight-full': 'W_f', 'support-weight': 'W_s' },
  basis: 'The structure carries the whole shell full of water; the supports are designed for twice that weight.',
  examples: [
    {
      id: 'supports-119-gal',
      title: '119 gal tank of 250 lb',
      origin: 'derived',
      source: citeFromMemory(umc, '1004.1'),
      given: { W_0: '250 lb', V_1c: '119 gal' },
      expected: { W_f: '1242.46 lb', W_s: '2484.92 lb' },
      tolerance: 0.0006,
      because: 'Worked with 8.34 lb/gal; water at 60 °F weighs 8.337 lb/gal.',
    },
  ],
})

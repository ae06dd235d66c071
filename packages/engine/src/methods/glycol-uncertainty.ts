import { cite } from '../citation.ts'
import { assumed, defineMethod, given, type Method, step } from '../method.ts'
import { commonPractice } from '../sources/common-practice.ts'

const spread = cite(commonPractice, 'spread between published density tables of glycol solutions')

/** The required volume if the solution expands by as much more as its published densities are uncertain. */
export const glycolUncertainty: Method = defineMethod({
  id: 'check.glycol-uncertainty',
  revision: 1,
  title: 'Upper value for the uncertainty of the glycol data',
  inputs: {
    V_t: given('volume', 'required volume by the method'),
    u_g: assumed('ratio', 'uncertainty of the expansion of glycol solutions', 'glycol.expansion-uncertainty'),
  },
  steps: { V_u: step('volume', 'required volume, upper value', 'V_t * (1 + u_g)', spread) },
  checks: [],
  results: { 'upper-required-volume': 'V_u' },
  basis: 'The size answers in proportion to the expansion, so the uncertainty of the one is that of the other.',
  examples: [
    {
      id: 'glycol-ten-per-cent',
      title: 'Ten per cent of 100 L',
      origin: 'by hand',
      source: spread,
      given: { V_t: '100 L', u_g: '10 %' },
      expected: { V_u: '110 L' },
      tolerance: 1e-12,
      because: 'By hand: 100 · 1.1.',
    },
  ],
})

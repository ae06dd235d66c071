import { cite } from '../citation.ts'
import { defineMethod, given, type Method, step } from '../method.ts'
import { geometry } from '../sources/geometry.ts'

const shares = cite(geometry, 'equal shares')

/** What each of several equal vessels has to hold, where `answer` is the symbol of the required volume. */
export const equalShares = (answer: string): Method =>
  defineMethod({
    id: `equal-shares.${answer}`,
    revision: 1,
    title: 'Several equal vessels',
    inputs: {
      [answer]: given('volume', 'required volume'),
      N_v: given('count', 'number of equal vessels'),
    },
    steps: { V_each: step('volume', 'required volume of each vessel', `${answer} / N_v`, shares) },
    checks: [],
    results: { 'required-volume-each': 'V_each' },
    basis: 'Equal vessels at one connection share the volume equally.',
    examples: [
      {
        id: `three-equal-${answer}`,
        title: 'Three equal vessels for 90 L',
        origin: 'by hand',
        source: shares,
        given: { [answer]: '90 L', N_v: '3' },
        expected: { V_each: '30 L' },
        tolerance: 1e-12,
        because: 'By hand.',
      },
    ],
  })

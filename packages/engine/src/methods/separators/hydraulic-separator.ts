import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { geometry } from '../../sources/geometry.ts'

const practice = citeFromMemory(commonPractice, 'slow flow in the body, about three pipe diameters')

export const hydraulicSeparator = defineMethod({
  id: 'hydraulic-separator.body-velocity',
  revision: 1,
  title: 'Hydraulic separator by the velocity in its body',
  vessel: { kind: 'hydraulic separator', method: 'body velocity' },
  inputs: {
    Q_1: keyed('flow', 'design flow of the sources', 'vessel', 'source-flow'),
    Q_2: keyed('flow', 'design flow of the loads', 'vessel', 'load-flow'),
    w_b: keyed('velocity', 'highest velocity in the body', 'vessel', 'body-velocity', 'separator.body-velocity'),
  },
  steps: {
    Q_d: step('flow', 'greater of the two flows', 'max(Q_1, Q_2)', practice),
    A_b: step('area', 'least area of the body', 'Q_d / w_b', practice),
    d_b: step('diameter', 'least diameter of the body', 'sqrt(4 * A_b / pi)', cite(geometry, 'circle of an area')),
  },
  checks: [],
  results: { 'body-diameter': 'd_b', 'design-flow': 'Q_d' },
  basis:
    'The body is wide enough that the greater of the two flows falls through it slowly, so that neither pump drives the other circuit. A trade rule without a standard behind it; textbooks of the trade have 0.3 to 0.5 ft/s.',
  examples: [
    {
      id: 'body-of-100-gpm',
      title: '100 gpm at 0.4 ft/s need a body of 10.1 in',
      origin: 'by hand',
      source: practice,
      given: { Q_1: '80 gpm', Q_2: '100 gpm', w_b: '0.4 ft/s' },
      expected: { Q_d: '100 gpm', A_b: '0.557002 ft2', d_b: '10.1057 in' },
      tolerance: 5e-6,
      because: 'By hand: 100 gpm are 0.2228009 ft3/s; 0.557002 ft2 are 80.2083 in2, a circle of 10.1057 in.',
    },
  ],
})

import { cite } from '../../citation.ts'
import { defineMethod, keyed, step } from '../../method.ts'
import { geometry } from '../../sources/geometry.ts'
import { hydronicsArticle } from '../../sources/hydronics-article.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

export const airAndDirtSeparator = defineMethod({
  id: 'air-and-dirt-separator.entering-velocity',
  revision: 1,
  title: 'Air and dirt separator by the velocity at its inlet',
  vessel: { kind: 'air and dirt separator', method: 'entering velocity' },
  inputs: {
    Q_d: keyed('flow', 'design flow', 'vessel', 'flow'),
    w_e: keyed(
      'velocity',
      'highest velocity at the inlet',
      'vessel',
      'entering-velocity',
      'separator.entering-velocity',
    ),
  },
  steps: {
    A_b: step('area', 'least area of the inlet', 'Q_d / w_e', cite(hydronicsArticle, 'velocity at the inlet')),
    d_b: step('diameter', 'least bore of the inlet', 'sqrt(4 * A_b / pi)', cite(geometry, 'circle of an area')),
  },
  checks: [],
  results: { 'minimum-bore': 'd_b', 'design-flow': 'Q_d' },
  basis:
    'The separator has the size of the line, or more where the flow would enter faster than bubbles and dirt can leave it. A trade rule without a standard behind it; the rating of the chosen device governs, and its pressure drop at design flow belongs on the schedule.',
  examples: [
    {
      id: 'separator-100-gpm',
      title: '100 gpm at 4 ft/s need a bore of 3.20 in',
      origin: 'derived',
      source: cite(verificationEvaluation, 'bore of 100 gpm at 4 ft/s'),
      given: { Q_d: '100 gpm', w_e: '4 ft/s' },
      expected: { d_b: '3.1957 in' },
      tolerance: 0.0002,
      because: 'Printed with five digits; 0.4085 gpm a square inch and ft/s is rounded.',
    },
  ],
})

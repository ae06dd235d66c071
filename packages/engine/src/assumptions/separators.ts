import { defineAssumption } from '../assumption.ts'
import { cite, citeFromMemory } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { hydronicsArticle } from '../sources/hydronics-article.ts'

export const enteringVelocity = defineAssumption({
  id: 'separator.entering-velocity',
  name: 'highest velocity at the inlet of an air or dirt separator',
  kind: 'velocity',
  value: '4 ft/s',
  source: cite(hydronicsArticle, 'velocity at the inlet, 4 ft/s at most'),
  because:
    'Not stated. Bubbles and dirt are carried through at higher velocities, unless the chosen device is rated for them.',
  overriddenBy: 'systems.*.vessels.*.entering-velocity',
})

export const bodyVelocity = defineAssumption({
  id: 'separator.body-velocity',
  name: 'highest velocity in the body of a hydraulic separator',
  kind: 'velocity',
  value: '0.4 ft/s',
  source: citeFromMemory(commonPractice, '0.3 to 0.5 ft/s in textbooks of the trade'),
  because: 'Not stated. The middle of the usual range; about three pipe diameters at 4 ft/s in the pipe.',
  overriddenBy: 'systems.*.vessels.*.body-velocity',
})

import { type Assumption, defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'

const methodOf = (kind: string, choices: readonly string[], because: string): Assumption =>
  defineAssumption({
    id: `method.${kind.replaceAll(' ', '-')}`,
    name: `method for the ${kind}`,
    kind: 'words',
    choices,
    value: choices[0] ?? '',
    source: cite(commonPractice, 'usual method of the trade for this kind of vessel'),
    because,
    overriddenBy: 'systems.*.vessels.*.method',
  })

export const expansionTankMethod = methodOf(
  'expansion tank',
  ['ashrae', 'en 12828', 'din 4807', 'une 100155', 'bs 7074', 'code minimum'],
  'Not stated. The handbook method works from the physics of the fluid; the choice of method moves the size by up to 40 %, so state it.',
)

export const thermalExpansionTankMethod = methodOf(
  'thermal expansion tank',
  ['aspe', 'ashrae', 'din 4807-5'],
  'Not stated. Water expansion and the gas law between the incoming and the highest pressure.',
)

export const construction = defineAssumption({
  id: 'construction',
  name: 'construction of the expansion tank',
  kind: 'words',
  choices: ['diaphragm', 'bladder', 'plain steel', 'open'],
  value: 'diaphragm',
  source: cite(commonPractice, 'charged vessels are usual'),
  because: 'Not stated. A charged vessel is usual; a plain steel tank for the same duty would be larger.',
  overriddenBy: 'systems.*.vessels.*.construction',
})

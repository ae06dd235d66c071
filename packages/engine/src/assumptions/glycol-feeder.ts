import { defineAssumption } from '../assumption.ts'
import { citeFromMemory } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'

const practice = 'practice of consultants: 2 to 5 % of the contents, and no less than one drum'

export const glycolMakeUp = defineAssumption({
  id: 'glycol-feeder.make-up',
  name: 'make-up held in a glycol feeder, of the contents of the system',
  kind: 'ratio',
  value: '3 %',
  source: citeFromMemory(commonPractice, practice),
  because: 'Not stated. Within the usual 2 to 5 %; no published equation was found.',
  overriddenBy: 'systems.*.vessels.*.make-up',
})

export const glycolDrum = defineAssumption({
  id: 'glycol-feeder.drum',
  name: 'drum from which a glycol feeder is filled',
  kind: 'volume',
  value: '55 gal',
  source: citeFromMemory(commonPractice, practice),
  because: 'Not stated. One whole drum can be emptied into the tank. European drums hold 200 L.',
  overriddenBy: 'systems.*.vessels.*.drum',
})

import { defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'

export const elevation = defineAssumption({
  id: 'elevation',
  name: 'elevation of the building above sea level',
  kind: 'length',
  value: '0 ft',
  source: cite(commonPractice, 'sea level where nothing is stated'),
  because:
    'Not stated. At altitude the absolute pressures fall: a diaphragm vessel comes out a little smaller, a plain steel one larger, so give it for any site above 1,000 ft.',
  overriddenBy: 'project.elevation',
})

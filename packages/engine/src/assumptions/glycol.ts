import { defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'

export const glycolExpansionUncertainty = defineAssumption({
  id: 'glycol.expansion-uncertainty',
  name: 'uncertainty of the expansion of glycol solutions',
  kind: 'ratio',
  value: '10 %',
  source: cite(commonPractice, 'spread between published density tables of glycol solutions'),
  because:
    'Published densities give net expansions that differ by 5 to 20 % at usual strengths. The size is not enlarged for it; the upper value is shown beside it, so that the choice can be made with open eyes.',
  overriddenBy: 'assumptions',
})

import type { Source } from '../citation.ts'

export const astmD2846: Source = {
  id: 'astm-d2846',
  title:
    'Standard specification for chlorinated poly(vinyl chloride) (CPVC) plastic hot- and cold-water distribution systems',
  publisher: 'ASTM International',
  edition: 'ASTM D2846, edition not recorded',
  year: null,
}

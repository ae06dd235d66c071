import type { Source } from '../citation.ts'

export const astmF441: Source = {
  id: 'astm-f441',
  title: 'Standard specification for chlorinated poly(vinyl chloride) (CPVC) plastic pipe, schedules 40 and 80',
  publisher: 'ASTM International',
  edition: 'ASTM F441, edition not recorded',
  year: null,
}

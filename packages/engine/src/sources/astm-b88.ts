import type { Source } from '../citation.ts'

export const astmB88: Source = {
  id: 'astm-b88',
  title: 'Standard specification for seamless copper water tube',
  publisher: 'ASTM International',
  edition: 'ASTM B88, edition not recorded; the dimensions are the same in all recent ones',
  year: null,
}

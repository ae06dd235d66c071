import type { Source } from '../citation.ts'

export const aspeDomesticHotWater: Source = {
  id: 'aspe-domestic-hot-water',
  title: 'Domestic Water Heating Design Manual',
  publisher: 'ASPE',
  edition: '2nd edition',
  year: 2003,
}

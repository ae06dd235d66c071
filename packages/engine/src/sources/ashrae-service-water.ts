import type { Source } from '../citation.ts'

export const ashraeServiceWater: Source = {
  id: 'ashrae-service-water',
  title: 'Handbook, HVAC Applications, chapter on service water heating',
  publisher: 'ASHRAE',
  edition: '2019',
  year: 2019,
}

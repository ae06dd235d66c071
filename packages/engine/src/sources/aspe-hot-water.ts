import type { Source } from '../citation.ts'

export const aspeHotWater: Source = {
  id: 'aspe-hot-water',
  title: 'Plumbing Engineering Design Handbook, volume 2, chapter on domestic water heating systems',
  publisher: 'ASPE',
  edition: '2014',
  year: 2014,
}

import type { Source } from '../citation.ts'

export const din4708Part2: Source = {
  id: 'din-4708-2',
  title: 'Central heat-water-installations, demand of dwellings',
  publisher: 'DIN',
  edition: 'DIN 4708-2:1994',
  year: 1994,
}

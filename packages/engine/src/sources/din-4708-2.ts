import type { Source } from '../citation.ts'

export const din4708Part2: Source = {
  id: 'din-4708-2',
  title: 'Central heat-water-installations. Rules for the determination of the water-heat-demand in dwelling-houses',
  publisher: 'DIN',
  edition: 'DIN 4708-2:1994',
  year: 1994,
}

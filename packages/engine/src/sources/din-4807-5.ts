import type { Source } from '../citation.ts'

export const din4807Part5: Source = {
  id: 'din-4807-5',
  title: 'Expansion vessels. Closed vessels with membrane for drinking-water installations',
  publisher: 'DIN',
  edition: 'DIN 4807-5:1997',
  year: 1997,
}

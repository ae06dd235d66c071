import type { Source } from '../citation.ts'

export const din4807Part2: Source = {
  id: 'din-4807-2',
  title: 'Expansion vessels. Design of expansion vessels in heating systems',
  publisher: 'DIN',
  edition: 'DIN 4807-2:1999',
  year: 1999,
}

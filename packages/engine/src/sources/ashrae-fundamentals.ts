import type { Source } from '../citation.ts'

export const ashraeFundamentals: Source = {
  id: 'ashrae-fundamentals',
  title: 'Handbook, Fundamentals',
  publisher: 'ASHRAE',
  edition: '2021',
  year: 2021,
}

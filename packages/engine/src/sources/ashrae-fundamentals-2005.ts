import type { Source } from '../citation.ts'

export const ashraeFundamentals2005: Source = {
  id: 'ashrae-fundamentals-2005',
  title: 'Handbook, Fundamentals, chapter on physical properties of secondary coolants',
  publisher: 'ASHRAE',
  edition: '2005',
  year: 2005,
}

import type { Source } from '../citation.ts'

export const upc: Source = {
  id: 'upc',
  title: 'Uniform Plumbing Code',
  publisher: 'IAPMO',
  edition: '2024',
  year: 2024,
}

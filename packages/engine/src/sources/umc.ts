import type { Source } from '../citation.ts'

export const umc: Source = {
  id: 'umc',
  title: 'Uniform Mechanical Code',
  publisher: 'IAPMO',
  edition: '2024',
  year: 2024,
}

import type { Source } from '../citation.ts'

export const imc: Source = {
  id: 'imc',
  title: 'International Mechanical Code',
  publisher: 'ICC',
  edition: '2021',
  year: 2021,
}

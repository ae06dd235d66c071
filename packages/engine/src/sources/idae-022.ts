import type { Source } from '../citation.ts'

export const idae022: Source = {
  id: 'idae-022',
  title: 'Technical guide to solar thermal energy, document 022',
  publisher: 'ASIT for IDAE',
  edition: '2020',
  year: 2020,
}

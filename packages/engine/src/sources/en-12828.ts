import type { Source } from '../citation.ts'

export const en12828: Source = {
  id: 'en-12828',
  title: 'Heating systems in buildings. Design for water-based heating systems',
  publisher: 'CEN',
  edition: 'EN 12828:2012+A1:2014',
  year: 2014,
}

import type { Source } from '../citation.ts'

export const en128313: Source = {
  id: 'en-12831-3',
  title: 'Energy performance of buildings, heat load of domestic hot water systems',
  publisher: 'CEN',
  edition: 'EN 12831-3:2017',
  year: 2017,
}

import type { Source } from '../citation.ts'

export const hydronicsColumn: Source = {
  id: 'hydronics-column',
  title: 'Trade-engineering column on heat pumps and buffer tanks, formula 1',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

import type { Source } from '../citation.ts'

export const bs7074Sheet: Source = {
  id: 'bs-7074-sheet',
  title: 'Calculation sheet to BS 7074, 5500 L example',
  publisher: 'British consulting practice',
  edition: 'none',
  year: null,
}

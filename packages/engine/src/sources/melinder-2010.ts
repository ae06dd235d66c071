import type { Source } from '../citation.ts'

export const melinder2010: Source = {
  id: 'melinder-2010',
  title: 'Properties of secondary working fluids for indirect systems (A. Melinder)',
  publisher: 'International Institute of Refrigeration',
  edition: 'Second edition',
  year: 2010,
}

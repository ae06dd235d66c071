import type { Source } from '../citation.ts'

export const idaho580108: Source = {
  id: 'idaho-58-01-08',
  title: 'IDAPA 58.01.08, pressure tanks',
  publisher: 'State of Idaho',
  edition: 'as in force',
  year: null,
}

import type { Source } from '../citation.ts'

export const asmeB319: Source = {
  id: 'asme-b31-9',
  title: 'Building Services Piping, table of thermal expansion',
  publisher: 'ASME',
  edition: 'B31.9',
  year: null,
}

import type { Source } from '../citation.ts'

export const en806: Source = {
  id: 'en-806',
  title: 'Specifications for installations inside buildings conveying water for human consumption',
  publisher: 'CEN',
  edition: 'EN 806-2:2005',
  year: 2005,
}

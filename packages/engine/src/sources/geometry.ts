import type { Source } from '../citation.ts'

export const geometry: Source = {
  id: 'geometry',
  title: 'Elementary geometry',
  publisher: 'none',
  edition: 'none',
  year: null,
}

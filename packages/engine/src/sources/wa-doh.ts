import type { Source } from '../citation.ts'

export const waDoh: Source = {
  id: 'wa-doh',
  title: 'Water System Design Manual 331-123, equation 11-2',
  publisher: 'Washington State Department of Health',
  edition: 'none',
  year: null,
}

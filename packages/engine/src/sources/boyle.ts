import type { Source } from '../citation.ts'

export const boyle: Source = {
  id: 'boyle',
  title: 'Law of Boyle and Mariotte for the gas charge',
  publisher: 'none',
  edition: 'none',
  year: null,
}

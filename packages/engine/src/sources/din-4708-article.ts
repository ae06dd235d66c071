import type { Source } from '../citation.ts'

export const din4708Article: Source = {
  id: 'din-4708-article',
  title: 'Article on the demand index of hot water',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

import type { Source } from '../citation.ts'

export const hydronicsArticle: Source = {
  id: 'hydronics-article',
  title: 'Hydronics trade article on air separators',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

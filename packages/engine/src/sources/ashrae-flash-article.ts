import type { Source } from '../citation.ts'

export const ashraeFlashArticle: Source = {
  id: 'ashrae-flash-article',
  title: 'Article on flash tanks by an ASHRAE member',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

import type { Source } from '../citation.ts'

export const commonPractice: Source = {
  id: 'common-practice',
  title: 'Common practice of the trade, no published source',
  publisher: 'none',
  edition: 'none',
  year: null,
}

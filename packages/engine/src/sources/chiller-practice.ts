import type { Source } from '../citation.ts'

export const chillerPractice: Source = {
  id: 'chiller-practice',
  title: 'Trade rule for the water of a chilled loop, no standard found',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

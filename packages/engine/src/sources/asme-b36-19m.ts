import type { Source } from '../citation.ts'

export const asmeB36Part19: Source = {
  id: 'asme-b36-19m',
  title: 'Stainless steel pipe',
  publisher: 'ASME',
  edition: 'ASME B36.19M, edition not recorded; the dimensions are the same in all recent ones',
  year: null,
}

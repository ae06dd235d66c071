import type { Source } from '../citation.ts'

export const asmeB36Part10: Source = {
  id: 'asme-b36-10m',
  title: 'Welded and seamless wrought steel pipe',
  publisher: 'ASME',
  edition: 'ASME B36.10M, edition not recorded; the dimensions are the same in all recent ones',
  year: null,
}

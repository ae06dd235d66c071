import type { Source } from '../citation.ts'

export const heatBalance: Source = {
  id: 'heat-balance',
  title: 'Heat balance of water, first principles',
  publisher: 'none',
  edition: 'none',
  year: null,
}

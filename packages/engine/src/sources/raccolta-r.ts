import type { Source } from '../citation.ts'

export const raccoltaR: Source = {
  id: 'raccolta-r',
  title: 'Raccolta R, technical rules for heating plants above 35 kW',
  publisher: 'ISPESL',
  edition: '2009',
  year: 2009,
}

import type { Source } from '../citation.ts'

export const aspeExpansion: Source = {
  id: 'aspe-expansion',
  title: 'Plumbing Engineering Design Handbook, chapter on thermal expansion',
  publisher: 'ASPE',
  edition: 'volume 2; chapter number differs between editions',
  year: null,
}

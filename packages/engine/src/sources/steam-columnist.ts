import type { Source } from '../citation.ts'

export const steamColumnist: Source = {
  id: 'steam-columnist',
  title: 'How to size a condensate pump, trade column',
  publisher: 'trade press',
  edition: 'none',
  year: null,
}

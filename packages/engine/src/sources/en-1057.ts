import type { Source } from '../citation.ts'

export const en1057: Source = {
  id: 'en-1057',
  title:
    'Copper and copper alloys. Seamless, round copper tubes for water and gas in sanitary and heating applications',
  publisher: 'CEN',
  edition: 'EN 1057, edition not recorded',
  year: null,
}

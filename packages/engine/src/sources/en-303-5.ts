import type { Source } from '../citation.ts'

export const en3035: Source = {
  id: 'en-303-5',
  title: 'Heating boilers for solid fuels',
  publisher: 'CEN',
  edition: 'EN 303-5:2012',
  year: 2012,
}

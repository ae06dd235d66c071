import type { Source } from '../citation.ts'

export const hydrostatics: Source = {
  id: 'hydrostatics',
  title: 'Elementary hydrostatics',
  publisher: 'none',
  edition: 'none',
  year: null,
}

import type { Source } from '../citation.ts'

export const iso4427Part2: Source = {
  id: 'iso-4427-2',
  title: 'Plastics piping systems for water supply. Polyethylene (PE). Pipes',
  publisher: 'ISO',
  edition: 'ISO 4427-2, edition not recorded',
  year: null,
}

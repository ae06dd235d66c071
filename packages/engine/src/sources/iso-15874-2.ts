import type { Source } from '../citation.ts'

export const iso15874Part2: Source = {
  id: 'iso-15874-2',
  title: 'Plastics piping systems for hot and cold water installations. Polypropylene (PP). Pipes',
  publisher: 'ISO',
  edition: 'ISO 15874-2, edition not recorded; walls as in DIN 8077',
  year: null,
}

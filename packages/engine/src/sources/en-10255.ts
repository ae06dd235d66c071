import type { Source } from '../citation.ts'

export const en10255: Source = {
  id: 'en-10255',
  title: 'Non-alloy steel tubes suitable for welding and threading',
  publisher: 'CEN',
  edition: 'EN 10255:2004',
  year: 2004,
}

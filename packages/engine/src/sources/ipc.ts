import type { Source } from '../citation.ts'

export const ipc: Source = {
  id: 'ipc',
  title: 'International Plumbing Code',
  publisher: 'ICC',
  edition: '2021',
  year: 2021,
}

import type { Source } from '../citation.ts'

export const uneWorkedSheet: Source = {
  id: 'une-worked-sheet',
  title: 'Worked calculation sheet to UNE 100155',
  publisher: 'Spanish consulting practice',
  edition: 'none',
  year: null,
}

import type { Source } from '../citation.ts'

export const groundwaterColumn: Source = {
  id: 'groundwater-column',
  title: 'Ground-water trade journal, technical column on the law of Boyle',
  publisher: 'trade press',
  edition: '2006 to 2008',
  year: null,
}

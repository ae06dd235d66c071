import type { Source } from '../citation.ts'

export const michiganR4084272: Source = {
  id: 'michigan-r408-4272',
  title: 'Administrative Code, boiler rules, R 408.4272',
  publisher: 'State of Michigan',
  edition: 'as in force',
  year: null,
}

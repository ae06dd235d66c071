import type { Source } from '../citation.ts'

export const tenStates: Source = {
  id: 'ten-states',
  title: 'Recommended Standards for Water Works, hydropneumatic tanks',
  publisher: 'Great Lakes Upper Mississippi River Board',
  edition: '2018',
  year: 2018,
}

import type { Source } from '../citation.ts'

export const ashraeHvacSe: Source = {
  id: 'ashrae-hvac-se',
  title: 'Handbook, HVAC Systems and Equipment, chapter on hydronic heating and cooling',
  publisher: 'ASHRAE',
  edition: '2020 (chapter 13; the equations are the same since 2000, chapter 12)',
  year: 2020,
}

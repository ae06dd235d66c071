import type { Source } from '../citation.ts'

export const une100155: Source = {
  id: 'une-100155',
  title: 'Climatizacion. Calculo de vasos de expansion',
  publisher: 'UNE',
  edition: 'UNE 100155:2004',
  year: 2004,
}

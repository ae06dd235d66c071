import { integer, text } from './field.ts'

/** Keys of `demand:` with one value each; `fixtures:` is a map of fixture and number. */
export const demandFields = {
  building: text('Type of building, as in the table of hot water demand.', 'apartment house'),
  people: integer(1, 'People who use hot water at the peak.', '120'),
  apartments: integer(1, 'Apartments or dwellings served.', '60'),
}

export const fixtureField = integer(0, 'Number of fixtures of this sort.', '60')

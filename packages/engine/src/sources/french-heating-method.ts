import type { Source } from '../citation.ts'

export const frenchHeatingMethod: Source = {
  id: 'french-heating-method',
  title: 'Trade method for heating vessels, coefficients of expansion from 4 °C',
  publisher: 'French trade press',
  edition: '2016',
  year: 2016,
}

import type { Source } from '../citation.ts'

export const iapwsSr186: Source = {
  id: 'iapws-sr1-86',
  title: 'Supplementary release on saturation properties of ordinary water substance',
  publisher: 'IAPWS',
  edition: 'SR1-86(1992)',
  year: 1992,
}

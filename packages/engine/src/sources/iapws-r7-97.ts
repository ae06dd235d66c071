import type { Source } from '../citation.ts'

export const iapwsR7: Source = {
  id: 'iapws-r7-97',
  title: 'Revised release on the IAPWS industrial formulation 1997 for the thermodynamic properties of water and steam',
  publisher: 'IAPWS',
  edition: 'R7-97(2012)',
  year: 2012,
}

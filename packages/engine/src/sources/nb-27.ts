import type { Source } from '../citation.ts'

export const nb27: Source = {
  id: 'nb-27',
  title: 'A Guide for Blowoff Vessels, NB-27',
  publisher: 'National Board of Boiler and Pressure Vessel Inspectors',
  edition: 'none',
  year: null,
}

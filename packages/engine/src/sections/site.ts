import { citeFromMemory } from '../citation.ts'
import { defineMethod, keyed, step } from '../method.ts'
import { ashraeFundamentals } from '../sources/ashrae-fundamentals.ts'

const standardAtmosphere = citeFromMemory(ashraeFundamentals, 'psychrometrics, standard atmosphere')

/** Atmospheric pressure at the site; every absolute pressure leans on it. */
export const site = defineMethod({
  id: 'section.site',
  revision: 1,
  title: 'Site',
  inputs: { Z: keyed('length', 'elevation', 'project', 'elevation', 'elevation') },
  steps: {
    P_a: step(
      'absolute pressure',
      'atmospheric pressure',
      '14.696[psia] * (1 - 6.8754e-6 * (Z / 1[ft])) ^ 5.2559',
      standardAtmosphere,
    ),
  },
  checks: [],
  results: { 'atmospheric-pressure': 'P_a' },
  basis: 'Atmospheric pressure is that of the standard atmosphere at the elevation of the site.',
  examples: [
    {
      id: 'atmosphere-6000-ft',
      title: 'Atmospheric pressure at 6,000 ft',
      origin: 'published',
      source: standardAtmosphere,
      given: { Z: '6000 ft' },
      expected: { P_a: '11.8 psia' },
      tolerance: 0.0043,
      because: 'Printed with one decimal: half a unit is 0.05 in 11.8.',
    },
    {
      id: 'atmosphere-sea-level',
      title: 'Atmospheric pressure at sea level',
      origin: 'published',
      source: standardAtmosphere,
      given: { Z: '0 ft' },
      expected: { P_a: '101.325 kPa abs' },
      tolerance: 5e-6,
      because: '14.696 psi is the standard atmosphere rounded to three decimals.',
    },
  ],
})

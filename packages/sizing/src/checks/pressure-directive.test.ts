import type { CatalogueRow } from '@coldfill/engine'
import { describe, expect, it } from 'vitest'
import { sizeSpec } from '../size-spec.ts'

const row = (volume: number, maxPressure: number): CatalogueRow => ({
  maker: 'Brackenfell Vessels',
  model: 'B',
  kinds: ['expansion tank'],
  construction: null,
  volume,
  acceptance: null,
  maxPressure,
  maxTemperature: 400,
  potable: false,
  stamped: false,
  mounting: null,
  diameter: null,
  height: null,
  weightEmpty: null,
  connection: null,
  line: 2,
})

const said = (method: string, catalogue?: readonly CatalogueRow[]): string | undefined =>
  sizeSpec(
    `coldfill: 1
project: { number: C }
systems:
  S:
    service: heating water
    temperatures: { low: 10 °C, high: 60 °C }
    pressure: { static-height: 2 m, relief-valve: 3 bar }
    contents:
      - volume: 100 L
    vessels:
      ET: { kind: expansion tank, construction: bladder, method: ${method} }
`,
    catalogue ? { catalogue } : {},
  ).findings.find(({ code }) => code === 'CF-E037')?.message

// Directive 2014/68/EU, Annex II, vessels for gases of group 2, from memory: 50, 200, 1000 and 3000 bar·L.
describe('category of a vessel made to EN 13831', () => {
  it.each([
    ['15 L at 3 bar, 45 bar·L', 0.015, 3e5, /45 bar·L, below the categories/],
    ['25 L at 3 bar, 75 bar·L', 0.025, 3e5, /75 bar·L, category I\.$/],
    ['80 L at 6 bar, 480 bar·L', 0.08, 6e5, /480 bar·L, category II\.$/],
    ['300 L at 6 bar, 1800 bar·L', 0.3, 6e5, /1800 bar·L, category III\.$/],
    ['1000 L at 6 bar, 6000 bar·L', 1, 6e5, /6000 bar·L, category III or IV/],
  ])('%s', (_, volume, rating, words) => {
    expect(said('en 12828', [row(volume, rating)])).toMatch(words)
  })

  it('goes by the relief setting and the required volume where no vessel is chosen', () => {
    expect(said('en 12828')).toMatch(/^ET: 3\.0 bar × /)
  })

  it('is not said of a vessel sized by a method of elsewhere', () => {
    expect(said('ashrae', [row(0.08, 6e5)])).toBeUndefined()
  })
})

import type { CatalogueRow } from '@coldfill/engine'
import { expect, it } from 'vitest'
import { sizeSpec } from './size-spec.ts'

const row = (model: string, volume: number): CatalogueRow => ({
  maker: 'Brackenfell Vessels',
  model,
  kinds: ['expansion tank'],
  construction: null,
  volume,
  acceptance: null,
  maxPressure: 1e6,
  maxTemperature: 400,
  potable: false,
  stamped: true,
  mounting: null,
  diameter: null,
  height: null,
  weightEmpty: null,
  connection: null,
  line: 2,
})
const spec = (selection: string): string => `coldfill: 1
project: { number: C }
systems:
  S:
    service: heating water
    temperatures: { low: 10 °C, high: 65 °C }
    pressure: { static-height: 8 m, relief-valve: 3 bar }
    contents:
      - volume: 800 L
    vessels:
      ET: { kind: expansion tank, construction: bladder${selection} }
`

it('tells with the chosen row the next size down and rows of the same size', () => {
  const rows = [row('B 500', 0.5), row('B 10', 0.01), row('C 500', 0.5)]
  const [vessel] = sizeSpec(spec(''), { catalogue: rows }).vessels
  const required = vessel?.results['required-volume']?.value ?? Number.NaN
  // By arithmetic: what a vessel of 10 L lacks of the required volume.
  expect(vessel?.selected).toMatchObject({ model: 'B 500', ties: [{ model: 'C 500' }] })
  expect(vessel?.selected?.nextDown).toMatchObject({ model: 'B 10', of: 'volume' })
  expect(vessel?.selected?.nextDown?.short).toBeCloseTo(required - 0.01, 12)
})

it('tells neither where there is none, nor for a row that the spec names', () => {
  const rows = [row('B 500', 0.5), row('B 10', 0.01)]
  const [alone] = sizeSpec(spec(''), { catalogue: rows.slice(0, 1) }).vessels
  expect(alone?.selected).toMatchObject({ model: 'B 500' })
  expect(alone?.selected).not.toHaveProperty('nextDown')
  expect(alone?.selected).not.toHaveProperty('ties')
  const named = spec(', selection: { maker: Brackenfell Vessels, model: B 500 }')
  const [fixed] = sizeSpec(named, { catalogue: rows }).vessels
  expect(fixed?.selected).toMatchObject({ model: 'B 500' })
  expect(fixed?.selected).not.toHaveProperty('nextDown')
})

import { parseQuantity } from '@coldfill/units'
import { describe, expect, it } from 'vitest'
import { emitterClasses } from './emitters.ts'

const litresPerKilowatt = (name: string): number => {
  const assumption = emitterClasses[name]
  const read = parseQuantity(assumption?.value ?? '', ['volume per power'])
  return read.ok ? read.quantity.value / 1e-6 : Number.NaN
}

describe('content by emitter class', () => {
  // Planning values of DIN 4807-2 and VDI 2035 (lower) and trade values (upper), from memory.
  it.each([
    ['convectors', 5.2, 6],
    ['air handlers and fan coils', 6.9, 8],
    ['panel radiators', 8.8, 11],
    ['column radiators', 12, 14],
    ['underfloor', 18, 23.5],
    ['district or long runs', 20, 26],
  ])('%s lies in the published range of %d to %d L/kW', (name, least, most) => {
    expect(litresPerKilowatt(name)).toBeGreaterThanOrEqual(least)
    expect(litresPerKilowatt(name)).toBeLessThanOrEqual(most)
  })

  // Rule of a calculation sheet to BS 7074: 500 kW heating 6000 L, 500 kW chilled 9000 L.
  it.each([
    ['heating plant', 6000],
    ['chilled plant', 9000],
  ])('%s of 500 kW holds %d L', (name, litres) => {
    expect(litresPerKilowatt(name) * 500).toBeCloseTo(litres, 6)
  })

  it('says the spread of each estimate', () => {
    for (const assumption of Object.values(emitterClasses)) expect(assumption.because).toMatch(/±30 %/u)
  })
})

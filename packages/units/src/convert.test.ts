import { describe, expect, it } from 'vitest'
import { toSi, unitOf } from './convert.ts'
import type { Kind } from './kind.ts'

const si = (number: number, kind: Kind, symbol: string): number => toSi(number, unitOf(kind, symbol))

describe('exact definitions', () => {
  const exact: readonly (readonly [string, Kind, string, number])[] = [
    ['international yard and pound agreement, 1959', 'length', 'ft', 0.3048],
    ['international yard and pound agreement, 1959', 'length', 'in', 0.0254],
    ['international yard and pound agreement, 1959', 'mass', 'lb', 0.45359237],
    ['NIST Handbook 44, gallon of 231 cubic inches, from memory', 'volume', 'gal', 3.785411784e-3],
    ['UK Units of Measurement Regulations 1995, from memory', 'volume', 'imp gal', 4.54609e-3],
    [
      'fifth International Conference on the Properties of Steam, 1956: Btu(IT), from memory',
      'energy',
      'Btu',
      1055.05585262,
    ],
    ['NIST SP 811, bar', 'gauge pressure', 'bar g', 1e5],
  ]
  it.each(exact)('%s: 1 %s in %s', (_source, kind, symbol, value) => {
    expect(Math.abs(si(1, kind, symbol) / value - 1)).toBeLessThan(1e-15 * 4)
  })
})

describe('NIST SP 811 appendix B.8, from memory, to the seven digits that it prints', () => {
  const printed: readonly (readonly [Kind, string, number])[] = [
    ['pressure difference', 'psi', 6.894757e3],
    ['pressure difference', 'ft water', 2.989067e3],
    ['pressure difference', 'm water', 9.80665e3],
    ['volume', 'ft3', 2.831685e-2],
    ['flow', 'gpm', 6.30902e-5],
    ['power', 'Btu/h', 2.930711e-1],
    ['power', 'ton', 3.516853e3],
    ['density', 'lb/ft3', 1.601846e1],
    ['specific energy', 'Btu/lb', 2.326e3],
    ['specific heat', 'Btu/(lb·Δ°F)', 4.1868e3],
  ]
  it.each(printed)('%s: 1 %s', (kind, symbol, value) => {
    expect(Math.abs(si(1, kind, symbol) / value - 1)).toBeLessThan(5e-7)
  })
})

describe('temperature scales', () => {
  it.each([
    ['ice point', '°F', 32, 273.15],
    ['steam point of 1954', '°F', 212, 373.15],
    ['where the scales meet', '°F', -40, 233.15],
    ['where the scales meet', '°C', -40, 233.15],
  ] as const)('%s', (_what, symbol, number, kelvin) => {
    expect(si(number, 'temperature', symbol)).toBeCloseTo(kelvin, 10)
  })
})

describe('units of one dimension are multiples of each other as a person computes', () => {
  it('emitter content: 1 gal/MBH is 12.9 L/kW (common practice, no source)', () => {
    expect(si(1, 'volume per power', 'gal/MBH') / si(1, 'volume per power', 'L/kW')).toBeCloseTo(12.916, 3)
  })
  it('a head of 2.31 ft of water is 1 psi to 0.2 % (common practice, no source)', () => {
    expect(si(2.31, 'pressure difference', 'ft water') / si(1, 'pressure difference', 'psi')).toBeCloseTo(1, 2)
  })
  it('throws for a unit that a kind does not have', () => {
    expect(() => unitOf('volume', 'psi')).toThrow('no unit "psi" for volume')
  })
})

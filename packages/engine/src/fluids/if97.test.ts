import { describe, expect, it } from 'vitest'
import {
  enthalpy,
  saturationPressure,
  saturationSlope,
  saturationTemperature,
  specificHeat,
  specificHeatPartials,
  volume,
  volumePartials,
} from './if97.ts'

const relative = (value: number, expected: number): number => Math.abs(value / expected - 1)

// IAPWS R7-97(2012), table 5: nine digits are printed, half a unit in the last is at most 5e-9 relative.
describe.each([
  [300, 3e6, 0.00100215168, 115.331273, 4.17301218],
  [300, 80e6, 0.000971180894, 184.142828, 4.01008987],
  [500, 3e6, 0.001202418, 975.542239, 4.65580682],
])('region 1 at %d K and %d Pa', (T, P, v, h, cp) => {
  it('returns the printed specific volume', () => expect(relative(volume(T, P), v)).toBeLessThan(5e-9))
  it('returns the printed enthalpy', () => expect(relative(enthalpy(T, P), h * 1e3)).toBeLessThan(5e-9))
  it('returns the printed specific heat', () => expect(relative(specificHeat(T, P), cp * 1e3)).toBeLessThan(5e-9))

  it('has partial derivatives that central differences confirm', () => {
    const dT = 0.01
    const dP = 1e4
    const difference = (f: (T: number, P: number) => number) => ({
      byTemperature: (f(T + dT, P) - f(T - dT, P)) / (2 * dT),
      byPressure: (f(T, P + dP) - f(T, P - dP)) / (2 * dP),
    })
    for (const [exact, rough] of [
      [volumePartials(T, P), difference(volume)],
      [specificHeatPartials(T, P), difference(specificHeat)],
    ] as const) {
      expect(relative(exact.byTemperature, rough.byTemperature)).toBeLessThan(1e-5)
      expect(relative(exact.byPressure, rough.byPressure)).toBeLessThan(1e-5)
    }
  })
})

describe('saturation line', () => {
  it.each([
    [300, 0.00353658941],
    [500, 2.63889776],
    [600, 12.3443146],
  ])('has at %d K the pressure of table 35, %d MPa', (T, p) => {
    expect(relative(saturationPressure(T), p * 1e6)).toBeLessThan(5e-9)
  })

  it.each([
    [0.1, 372.755919],
    [1, 453.035632],
    [10, 584.149488],
  ])('has at %d MPa the temperature of table 36, %d K', (p, T) => {
    expect(relative(saturationTemperature(p * 1e6), T)).toBeLessThan(5e-9)
  })

  it('leads back and forth, and has the slope of its central differences', () => {
    for (let T = 274; T < 640; T += 7.3) {
      expect(relative(saturationTemperature(saturationPressure(T)), T)).toBeLessThan(1e-9)
      const rough = (saturationPressure(T + 0.005) - saturationPressure(T - 0.005)) / 0.01
      expect(relative(saturationSlope(T), rough)).toBeLessThan(1e-6)
    }
  })

  it('boils at 100 °C, or a little below, at one standard atmosphere (99.974 °C on ITS-90)', () => {
    expect(saturationTemperature(101325) - 273.15).toBeCloseTo(99.974, 2)
  })

  it('is nothing outside its range', () => {
    for (const T of [273, 648, Number.NaN]) expect(saturationPressure(T)).toBeNaN()
    for (const P of [600, 22.1e6, -1, Number.NaN]) expect(saturationTemperature(P)).toBeNaN()
  })
})

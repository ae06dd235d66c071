import { describe, expect, it } from 'vitest'
import { saturationCurvature, saturationPressure, saturationSlope } from './if97.ts'
import { steamFunctions, vapourDensityAt } from './steam.ts'
import { water } from './water.ts'

const relative = (value: number, expected: number): number => Math.abs(value / expected - 1)
const { h_f, h_fg, v_g, t_sat } = steamFunctions

describe('saturated steam', () => {
  // IAPWS SR1-86(1992), table 1: six digits are printed.
  it.each([
    [273.16, 0.00485426],
    [373.1243, 0.597586],
    [647.096, 322],
  ])('has at %d K the printed density of the vapour, %d kg/m3', (T, printed) => {
    expect(relative(vapourDensityAt(T), printed)).toBeLessThan(2e-6)
  })

  // The same table: h' 419.05 and h'' 2675.7 kJ/kg at 373.1243 K; h'' 2500.5 at 273.16 K where h' is 0.000611786 kJ/kg. The
  // liquid is that of IF97 here, and the slope of the saturation line is too; they differ from the release by less than 0.03 %.
  it('has the printed enthalpies at the normal boiling point', () => {
    expect(relative(h_f.evaluate(373.1243), 419.05e3)).toBeLessThan(2e-4)
    expect(relative(h_fg.evaluate(373.1243), (2675.7 - 419.05) * 1e3)).toBeLessThan(3e-4)
  })

  it('has the printed enthalpy of evaporation at the triple point', () => {
    expect(relative(h_fg.evaluate(273.16), 2500.5e3)).toBeLessThan(5e-4)
  })

  // Steam tables on IAPWS-95 from memory, kJ/kg and m3/kg: 150 °C 632.2, 2113.7, 0.3925; 200 °C 852.3, 1939.7, 0.1272.
  it.each([
    [150, 632.2, 2113.7, 0.3925],
    [200, 852.3, 1939.7, 0.1272],
  ])('has at %d °C the figures of the steam tables', (t, liquid, evaporation, vapour) => {
    const T = t + 273.15
    expect(relative(h_f.evaluate(T), liquid * 1e3)).toBeLessThan(2e-4)
    expect(relative(h_fg.evaluate(T), evaporation * 1e3)).toBeLessThan(5e-4)
    expect(relative(v_g.evaluate(T), vapour)).toBeLessThan(1e-3)
  })

  // Steam tables in US units from memory: 970.3 Btu/lb and 26.80 ft3/lb at 212 °F.
  it('has the figures of the US tables at 212 °F', () => {
    expect(relative(h_fg.evaluate(373.15), 970.3 * 2326)).toBeLessThan(5e-4)
    expect(relative(v_g.evaluate(373.15), 26.8 * (0.3048 ** 3 / 0.45359237))).toBeLessThan(1e-3)
  })

  it('has the exact derivatives that central differences confirm', () => {
    for (let T = 275; T < 622; T += 13.7) {
      for (const law of [h_f, h_fg, v_g]) {
        const rough = (law.evaluate(T + 0.01) - law.evaluate(T - 0.01)) / 0.02
        expect(relative(law.partials(T)[0] ?? Number.NaN, rough), `${law.name} at ${T} K`).toBeLessThan(1e-5)
      }
      const slopes = (saturationSlope(T + 0.01) - saturationSlope(T - 0.01)) / 0.02
      expect(relative(saturationCurvature(T), slopes)).toBeLessThan(1e-6)
      const P = saturationPressure(T)
      const back = (t_sat.evaluate(P * 1.00001) - t_sat.evaluate(P * 0.99999)) / (P * 0.00002)
      expect(relative(t_sat.partials(P)[0] ?? Number.NaN, back)).toBeLessThan(1e-5)
    }
  })

  it('is nothing outside 0 to 350 °C', () => {
    for (const law of [h_f, h_fg, v_g]) for (const T of [272, 624, Number.NaN]) expect(law.evaluate(T)).toBeNaN()
    for (const P of [500, 17e6, Number.NaN]) expect(t_sat.evaluate(P)).toBeNaN()
  })

  it('is among the functions of water', () => {
    expect(Object.keys(water.functions)).toEqual(expect.arrayContaining(['h_f', 'h_fg', 'v_g', 't_sat']))
  })
})

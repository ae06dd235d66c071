import { describe, expect, it } from 'vitest'
import { water } from './water.ts'

const celsius = (t: number): number => t + 273.15
const fahrenheit = (t: number): number => (t - 32) / 1.8 + 273.15
const v = (T: number): number => water.functions.v_sat.evaluate(T)
const liquidLaws = [water.functions.v_sat, water.functions.rho, water.functions.c_p]
const cubicFeetPerPound = (T: number): number => (v(T) / 0.3048 ** 3) * 0.45359237

describe('saturated liquid water', () => {
  // ASHRAE HVAC Systems and Equipment, example of the expansion tanks: 40 °F 0.01602 and 220 °F 0.01677 ft3/lb;
  // 140 °F 0.01629 in the example of the ASPE handbook, from memory. Five decimals are printed.
  it.each([
    [40, 0.01602],
    [140, 0.01629],
    [220, 0.01677],
  ])('has at %d °F the handbook volume of %d ft3/lb', (t, printed) => {
    expect(Math.abs(cubicFeetPerPound(fahrenheit(t)) - printed)).toBeLessThan(0.0000051)
  })

  // DIN 4807-2, expansion in per cent from 10 °C, from memory; the standard prints 1.67 at 60 °C.
  it.each([
    [50, 1.18],
    [60, 1.67],
    [70, 2.24],
    [80, 2.87],
    [90, 3.56],
    [100, 4.31],
  ])('grows from 10 to %d °C by %d per cent as in DIN 4807-2', (t, percent) => {
    expect(Math.abs((v(celsius(t)) / v(celsius(10)) - 1) * 100 - percent)).toBeLessThan(0.01 * percent)
  })

  // Table of the expansion of water from 4 °C on a public education platform of a Spanish regional government. It does not say at which
  // pressure; from saturation to 3 bar moves the figure by up to 0.01 points, beside the half unit of its last digit: 0.4 %.
  it.each([
    [30, 0.435],
    [40, 0.782],
    [60, 1.71],
    [70, 2.27],
    [90, 3.59],
  ])('grows from 4 to %d °C by %d per cent as published', (t, percent) => {
    expect(Math.abs((v(celsius(t)) / v(celsius(4)) - 1) * 100 - percent)).toBeLessThan(0.004 * percent)
  })

  it('is densest near 4 °C: 3.98 °C and 999.97 kg/m3 (SMOW at one atmosphere, from memory)', () => {
    const slope = (t: number): number => water.functions.rho.partials(celsius(t))[0] ?? Number.NaN
    expect(slope(3.8)).toBeGreaterThan(0)
    expect(slope(4.2)).toBeLessThan(0)
    expect(water.density(celsius(3.98), 101325)).toBeCloseTo(999.97, 1)
  })

  // CRC Handbook, specific heat of liquid water at constant pressure, J/(g K), from memory: 20 °C 4.184, 60 °C 4.185, 100 °C 4.216.
  it.each([
    [20, 4184],
    [60, 4185],
    [100, 4216],
  ])('takes at %d °C %d J/(kg K)', (t, printed) => {
    expect(Math.abs(water.functions.c_p.evaluate(celsius(t)) / printed - 1)).toBeLessThan(5e-4)
  })

  it('has exact derivatives along the saturation line', () => {
    for (let t = 0.5; t < 199; t += 6.1)
      for (const law of liquidLaws) {
        const T = celsius(t)
        const rough = (law.evaluate(T + 0.02) - law.evaluate(T - 0.02)) / 0.04
        const exact = law.partials(T)[0] ?? Number.NaN
        // Near the densest point the slope is nearly nothing, so the error is measured against a hundredth of a per cent a kelvin.
        const scale = Math.max(Math.abs(exact), 1e-4 * law.evaluate(T))
        expect(Math.abs(exact - rough) / scale).toBeLessThan(1e-5)
      }
  })

  it('holds from 0 to 200 °C, 32 °F and 392 °F included, and is nothing outside', () => {
    for (const T of [273.15, fahrenheit(32), fahrenheit(392), 473.15]) expect(v(T)).toBeGreaterThan(0)
    for (const T of [273.1, 473.2, Number.NaN]) {
      for (const law of liquidLaws) expect(law.evaluate(T)).toBeNaN()
      expect(water.functions.v_sat.partials(T)[0]).toBeNaN()
      expect(water.density(T)).toBeNaN()
    }
  })

  it('is liquid under pressure only above saturation', () => {
    expect(water.density(celsius(120), 101325)).toBeNaN()
    expect(water.density(celsius(120), 5e5)).toBeGreaterThan(water.density(celsius(120)))
  })
})

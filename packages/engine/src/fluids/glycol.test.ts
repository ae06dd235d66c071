import { describe, expect, it } from 'vitest'
import { ethyleneGlycol } from './ethylene-glycol.ts'
import type { Fluid, FluidBase, FluidStrength } from './fluid.ts'
import { ashraeExpansionCheck, fluid } from './index.ts'
import { polynomial } from './polynomial.ts'
import { propyleneGlycol } from './propylene-glycol.ts'
import { water } from './water.ts'

const celsius = (t: number): number => t + 273.15
const get = (base: FluidBase, percent: number, by: FluidStrength['by']): Fluid => {
  const found = fluid(base, { value: percent / 100, by })
  if (!found.ok) throw new Error(found.message)
  return found.fluid
}
const glycols = { 'ethylene glycol': ethyleneGlycol, 'propylene glycol': propyleneGlycol } as const

describe('values printed beside the coefficients (Melinder 2010)', () => {
  // Densities at 5, 20 and 40 °C by mass fraction; as many digits as are printed.
  it.each([
    ['ethylene glycol', 0, [999.15, 997.35, 991.81], 0.006],
    ['ethylene glycol', 20, [1028.1, 1024.1, 1016.4], 0.051],
    ['ethylene glycol', 40, [1058.5, 1051.9, 1041.4], 0.051],
    ['propylene glycol', 0, [1000.3, 998.52, 992.53], 0.051],
    ['propylene glycol', 20, [1019.1, 1014.8, 1006.4], 0.051],
    ['propylene glycol', 40, [1040.1, 1032.3, 1020.1], 0.051],
  ] as const)('density of %s at %d per cent mass', (base, mass, printed, half) => {
    for (const [n, t] of [5, 20, 40].entries())
      expect(Math.abs(polynomial(glycols[base].density, mass, t) - (printed[n] ?? Number.NaN))).toBeLessThan(half)
  })

  // Freezing points at 10, 20 … 60 % mass.
  it.each([
    ['ethylene glycol', [-3.357, -7.949, -14.576, -23.813, -35.994, -51.201]],
    ['propylene glycol', [-2.867, -7.173, -12.789, -20.568, -32.193, -50.003]],
  ] as const)('freezing points of %s', (base, printed) => {
    for (const [n, t] of printed.entries())
      expect(Math.abs(polynomial(glycols[base].freezing, (n + 1) * 10, 20) - t)).toBeLessThan(0.00051)
  })
})

describe('against measurements', () => {
  // George and Sastry, J. Chem. Eng. Data 48 (2003), vibrating tube, 25 and 35 °C: the polynomials keep within 0.14 %.
  it.each([
    [58.48, 1037.73, 1031.14],
    [42.71, 1030.31, 1024.53],
    [29.08, 1021.26, 1016.3],
    [18.06, 1012.69, 1008.45],
    [4.01, 1000.65, 997.36],
  ])('density of propylene glycol at %d per cent mass', (mass, cold, hot) => {
    const pg = get('propylene glycol', mass, 'mass')
    expect(Math.abs(pg.density(celsius(25)) / cold - 1)).toBeLessThan(0.0014)
    expect(Math.abs(pg.density(celsius(35)) / hot - 1)).toBeLessThan(0.0014)
  })

  it('the specific heat leads over to that of water (4184 J/(kg K) at 20 °C, CRC Handbook, from memory) and falls with the strength', () => {
    for (const base of ['ethylene glycol', 'propylene glycol'] as const) {
      expect(Math.abs(polynomial(glycols[base].specificHeat, 0, 20) / 4184 - 1)).toBeLessThan(0.01)
      const at = (mass: number): number => get(base, mass, 'mass').functions.c_p.evaluate(celsius(40))
      expect(at(20)).toBeGreaterThan(at(40))
      expect(at(40)).toBeGreaterThan(at(60))
    }
  })
})

describe('strength', () => {
  // ASHRAE Fundamentals, freezing points of aqueous glycols: 30 % by volume is 32.4 % (ethylene) and 30.6 % (propylene) by mass.
  it.each([
    ['ethylene glycol', 30, 32.4],
    ['propylene glycol', 30, 30.6],
    ['ethylene glycol', 47.6, 50],
    ['propylene glycol', 60, 60],
  ] as const)('%s: %d per cent vol is %d per cent mass', (base, volume, mass) => {
    expect(get(base, volume, 'volume').massFraction * 100).toBeCloseTo(mass, 1)
    expect(get(base, mass, 'mass').volumeFraction * 100).toBeCloseTo(volume, 1)
    expect(get(base, volume, 'volume').density(celsius(20))).toBeCloseTo(
      get(base, get(base, volume, 'volume').massFraction * 100, 'mass').density(celsius(20)),
      9,
    )
  })

  it('is refused beyond 60 % mass, with the limits in the message', () => {
    for (const [base, percent, by] of [
      ['ethylene glycol', 61, 'mass'],
      ['ethylene glycol', 58, 'volume'],
      ['propylene glycol', 100, 'volume'],
      ['propylene glycol', -1, 'mass'],
      ['propylene glycol', Number.NaN, 'mass'],
    ] as const) {
      const found = fluid(base, { value: percent / 100, by })
      expect(found.ok ? '' : found.message).toMatch(/go from 0 to 60 % mass \((57\.8|60\.0) % vol\)/u)
    }
  })

  it('must be given for a glycol and not for water', () => {
    expect(fluid('propylene glycol')).toMatchObject({ ok: false })
    expect(fluid('water', { value: 0.3, by: 'volume' })).toMatchObject({ ok: false })
    expect(fluid('water')).toMatchObject({ ok: true, fluid: water })
  })

  it('of 0 % is water, and says so', () => {
    for (const base of ['ethylene glycol', 'propylene glycol'] as const) {
      const none = get(base, 0, 'volume')
      expect(none.density(celsius(50))).toBe(water.density(celsius(50)))
      expect(none.notes.join(' ')).toMatch(/those of water/u)
    }
  })
})

describe('freezing point', () => {
  // The warmer of Melinder (printed above) and ASHRAE Fundamentals: ethylene 30 % mass −14.1, 50 % mass −33.8; propylene 30 % mass −12.7;
  // propylene 60 % mass: −50.0 by Melinder, −51.1 by the second table.
  it.each([
    ['ethylene glycol', 30, -14.1],
    ['ethylene glycol', 50, -33.8],
    ['propylene glycol', 30, -12.7],
    ['propylene glycol', 60, -50.003],
  ] as const)('%s %d per cent mass freezes at %d °C', (base, mass, t) => {
    expect(get(base, mass, 'mass').freezing - 273.15).toBeCloseTo(t, 2)
  })

  it('bounds the functions: nothing below the freezing point of the polynomials or above 100 °C', () => {
    const eg = get('ethylene glycol', 40, 'mass')
    expect(eg.density(celsius(-23.7))).toBeGreaterThan(1000)
    expect(eg.density(celsius(100))).toBeGreaterThan(900)
    for (const t of [-23.9, 100.1]) {
      expect(eg.density(celsius(t))).toBeNaN()
      for (const law of Object.values(eg.functions)) expect(law.evaluate(celsius(t))).toBeNaN()
    }
  })
})

describe('derivatives', () => {
  it('are those of central differences', () => {
    for (const base of ['ethylene glycol', 'propylene glycol'] as const)
      for (const mass of [5, 30, 55])
        for (const law of Object.values(get(base, mass, 'mass').functions))
          for (const t of [5, 40, 85]) {
            const rough = (law.evaluate(celsius(t + 0.01)) - law.evaluate(celsius(t - 0.01))) / 0.02
            expect(Math.abs((law.partials(celsius(t))[0] ?? Number.NaN) / rough - 1)).toBeLessThan(1e-5)
          }
  })
})

describe('second source for the expansion', () => {
  // Densities printed in ASHRAE Fundamentals at 5 and 80 °C; their ratio by hand.
  it.each([
    ['ethylene glycol', 30, 1050.33, 1014],
    ['ethylene glycol', 50, 1079.33, 1038.46],
    ['propylene glycol', 30, 1034.46, 992.42],
    ['propylene glycol', 50, 1050.44, 1001.05],
  ] as const)('%s %d per cent vol from 5 to 80 °C', (base, volume, cold, hot) => {
    const check = ashraeExpansionCheck(get(base, volume, 'volume'), celsius(5), celsius(80))
    expect(check?.ratio).toBeCloseTo(cold / hot - 1, 10)
  })

  it('interpolates in strength and temperature: halfway between four printed cells, by hand', () => {
    // 25 % vol at 7.5 °C: the mean of 1034.36, 1050.33 (5 °C) and 1032.94, 1048.76 (10 °C); at 40 °C of 1021.83 and 1036.78.
    const cold = (1034.36 + 1050.33 + 1032.94 + 1048.76) / 4
    const hot = (1021.83 + 1036.78) / 2
    expect(ashraeExpansionCheck(get('ethylene glycol', 25, 'volume'), celsius(7.5), celsius(40))?.ratio).toBeCloseTo(
      cold / hot - 1,
      10,
    )
  })

  it('does not reach below 10 % vol, into the frozen or above 125 °C', () => {
    expect(ashraeExpansionCheck(get('ethylene glycol', 9, 'volume'), celsius(5), celsius(80))).toBeUndefined()
    expect(ashraeExpansionCheck(get('ethylene glycol', 20, 'volume'), celsius(-9), celsius(80))).toBeUndefined()
    expect(ashraeExpansionCheck(get('ethylene glycol', 20, 'volume'), celsius(5), celsius(126))).toBeUndefined()
    expect(ashraeExpansionCheck(water, celsius(5), celsius(80))).toBeUndefined()
  })

  it('differs from the polynomials by about what is known of the two sources: 0.79 at 10 % vol, 1.24 at 50 % vol ethylene, 5 to 40 °C', () => {
    for (const [volume, ratio] of [
      [10, 0.79],
      [50, 1.24],
    ] as const) {
      const eg = get('ethylene glycol', volume, 'volume')
      const first = eg.density(celsius(5)) / eg.density(celsius(40)) - 1
      const second = ashraeExpansionCheck(eg, celsius(5), celsius(40))?.ratio ?? Number.NaN
      expect(first / second).toBeCloseTo(ratio, 2)
    }
  })
})

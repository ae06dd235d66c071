import type { PolynomialTable } from '../fluids/polynomial.ts'

// Aqueous propylene glycol, uninhibited. Three public copies agree. The coefficients of the specific heat: one public copy.

/** Base of every polynomial: strength in % by mass and temperature in °C. */
const base = { strength: 30.7031, temperature: 32.7083 }

/** Density in kg/m3: exponents of (strength - base) and (temperature - base), coefficient. */
export const propyleneGlycolDensity: PolynomialTable = {
  base,
  terms: [
    [0, 0, 1018.0],
    [0, 1, -0.5406],
    [0, 2, -0.002666],
    [0, 3, 1.347e-5],
    [1, 0, 0.7604],
    [1, 1, -0.00945],
    [1, 2, 5.541e-5],
    [1, 3, -1.343e-7],
    [2, 0, -0.002498],
    [2, 1, 2.7e-5],
    [2, 2, -4.018e-7],
    [2, 3, 3.376e-9],
    [3, 0, -0.000155],
    [3, 1, 2.829e-6],
    [3, 2, -7.175e-9],
    [4, 0, -1.131e-6],
    [4, 1, -2.221e-8],
    [5, 0, 2.342e-8],
  ],
}

/** Specific heat in J/(kg K): exponents of (strength - base) and (temperature - base), coefficient. */
export const propyleneGlycolSpecificHeat: PolynomialTable = {
  base,
  terms: [
    [0, 0, 3882],
    [0, 1, 2.699],
    [0, 2, -0.001659],
    [0, 3, -1.032e-5],
    [1, 0, -13.04],
    [1, 1, 0.0507],
    [1, 2, -4.752e-5],
    [1, 3, 1.522e-6],
    [2, 0, -0.1598],
    [2, 1, 9.534e-5],
    [2, 2, 1.167e-5],
    [2, 3, -4.87e-8],
    [3, 0, 0.0003539],
    [3, 1, 3.102e-5],
    [3, 2, -2.95e-7],
    [4, 0, 5e-5],
    [4, 1, -7.135e-7],
    [5, 0, -4.959e-7],
  ],
}

/** Freezing point in °C; the published terms in temperature, worth at most 0.016 K, are left out. */
export const propyleneGlycolFreezing: PolynomialTable = {
  base,
  terms: [
    [0, 0, -13.25],
    [1, 0, -0.6631],
    [2, 0, -0.01094],
    [3, 0, -0.0002283],
    [4, 0, -3.409e-6],
    [5, 0, 1.465e-8],
  ],
}

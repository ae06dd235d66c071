import type { PolynomialTable } from '../fluids/polynomial.ts'

// Aqueous ethylene glycol, uninhibited. Three public copies agree but for one term without effect above 0.006 kg/m3. The coefficients of the specific heat: one public copy.

/** Base of every polynomial: strength in % by mass and temperature in °C. */
const base = { strength: 30.8462, temperature: 31.728 }

/** Density in kg/m3: exponents of (strength - base) and (temperature - base), coefficient. */
export const ethyleneGlycolDensity: PolynomialTable = {
  base,
  terms: [
    [0, 0, 1034.0],
    [0, 1, -0.4781],
    [0, 2, -0.002692],
    [0, 3, 4.725e-6],
    [1, 0, 1.311],
    [1, 1, -0.006876],
    [1, 2, 4.805e-5],
    [1, 3, 1.69e-8],
    [2, 0, 7.49e-5],
    [2, 1, 7.855e-5],
    [2, 2, -3.995e-7],
    [2, 3, 4.982e-9],
    [3, 0, -0.0001062],
    [3, 1, 1.229e-6],
    [3, 2, -1.153e-8],
    [4, 0, -9.623e-7],
    [4, 1, -7.211e-8],
    [5, 0, 4.891e-8],
  ],
}

/** Specific heat in J/(kg K): exponents of (strength - base) and (temperature - base), coefficient. */
export const ethyleneGlycolSpecificHeat: PolynomialTable = {
  base,
  terms: [
    [0, 0, 3737],
    [0, 1, 2.93],
    [0, 2, -0.004675],
    [0, 3, -1.389e-5],
    [1, 0, -17.99],
    [1, 1, 0.1046],
    [1, 2, -0.0004147],
    [1, 3, 1.847e-7],
    [2, 0, -0.09933],
    [2, 1, 0.0003516],
    [2, 2, 5.109e-6],
    [2, 3, -7.138e-8],
    [3, 0, 0.00261],
    [3, 1, -1.189e-6],
    [3, 2, -1.643e-7],
    [4, 0, 1.537e-5],
    [4, 1, -4.272e-7],
    [5, 0, -1.618e-6],
  ],
}

/** Freezing point in °C; the published terms in temperature, worth at most 0.0015 K, are left out. */
export const ethyleneGlycolFreezing: PolynomialTable = {
  base,
  terms: [
    [0, 0, -15.25],
    [1, 0, -0.808],
    [2, 0, -0.01334],
    [3, 0, -7.293e-5],
    [4, 0, 1.006e-6],
    [5, 0, 1.14e-9],
  ],
}

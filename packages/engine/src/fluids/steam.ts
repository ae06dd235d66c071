import type { FormulaFunction } from '@coldfill/formula'
import { vapourDensity } from '../tables/iapws-sr1-86.vapour-density.ts'
import {
  enthalpy,
  if97Least,
  if97Region1Most,
  saturationCurvature,
  saturationPressure,
  saturationSlope,
  saturationTemperature,
  specificHeat,
  volume,
  volumePartials,
} from './if97.ts'

const { criticalTemperature, criticalDensity, terms } = vapourDensity

/** Density in kg/m3 of the saturated vapour at T in K: the auxiliary equation of IAPWS SR1-86(1992). */
export const vapourDensityAt = (T: number): number => {
  const theta = 1 - T / criticalTemperature
  return criticalDensity * Math.exp(terms.reduce((sum, [n, sixths]) => sum + n * theta ** (sixths / 6), 0))
}

/** Slope of the logarithm of the vapour density, 1/K. */
const vapourLogSlope = (T: number): number => {
  const theta = 1 - T / criticalTemperature
  return (
    terms.reduce((sum, [n, sixths]) => sum + n * (sixths / 6) * theta ** (sixths / 6 - 1), 0) / -criticalTemperature
  )
}

/** A property along the saturation line with its total derivative by temperature. */
interface Law {
  readonly value: (T: number) => number
  readonly derivative: (T: number) => number
}

const liquidVolume: Law = {
  value: (T) => volume(T, saturationPressure(T)),
  derivative: (T) => {
    const { byTemperature, byPressure } = volumePartials(T, saturationPressure(T))
    return byTemperature + byPressure * saturationSlope(T)
  },
}

const vapourVolume: Law = {
  value: (T) => 1 / vapourDensityAt(T),
  derivative: (T) => -vapourLogSlope(T) / vapourDensityAt(T),
}

const liquidEnthalpy: Law = {
  value: (T) => enthalpy(T, saturationPressure(T)),
  // dh = c_p dT + (v − T ∂v/∂T) dP, along the saturation line.
  derivative: (T) => {
    const P = saturationPressure(T)
    return specificHeat(T, P) + (volume(T, P) - T * volumePartials(T, P).byTemperature) * saturationSlope(T)
  },
}

// Clausius and Clapeyron: h_fg = T (v_g − v_f) dP/dT.
const evaporation: Law = {
  value: (T) => T * (vapourVolume.value(T) - liquidVolume.value(T)) * saturationSlope(T),
  derivative: (T) => {
    const volumes = vapourVolume.value(T) - liquidVolume.value(T)
    const slopes = vapourVolume.derivative(T) - liquidVolume.derivative(T)
    return volumes * saturationSlope(T) + T * slopes * saturationSlope(T) + T * volumes * saturationCurvature(T)
  },
}

/** 0 to 350 °C: region 1 of the liquid ends there. */
const holds = (T: number): boolean => T >= if97Least - 1e-6 && T <= if97Region1Most + 1e-6

const alongSaturation = (
  name: string,
  result: FormulaFunction['result'],
  words: string,
  law: Law,
): FormulaFunction => ({
  name,
  parameters: ['temperature'],
  result,
  words,
  symbol: name,
  evaluate: (T = Number.NaN) => (holds(T) ? law.value(T) : Number.NaN),
  partials: (T = Number.NaN) => [holds(T) ? law.derivative(T) : Number.NaN],
})

export type SteamFunctionName = 'h_f' | 'h_fg' | 'v_g' | 't_sat'

/**
 * Saturated water and steam for formulas: enthalpy of the liquid `h_f`, of evaporation `h_fg` and volume of the vapour
 * `v_g` at a temperature, and the saturation temperature `t_sat` at an absolute pressure. NaN outside 0 to 350 °C.
 */
export const steamFunctions: Readonly<Record<SteamFunctionName, FormulaFunction>> = {
  h_f: alongSaturation('h_f', 'specific energy', 'enthalpy of the saturated liquid at', liquidEnthalpy),
  h_fg: alongSaturation('h_fg', 'specific energy', 'enthalpy of evaporation at', evaporation),
  v_g: alongSaturation('v_g', 'specific volume', 'specific volume of the saturated steam at', vapourVolume),
  t_sat: {
    name: 't_sat',
    parameters: ['absolute pressure'],
    result: 'temperature',
    words: 'saturation temperature at',
    symbol: 't_sat',
    evaluate: (P = Number.NaN) => {
      const T = saturationTemperature(P)
      return holds(T) ? T : Number.NaN
    },
    partials: (P = Number.NaN) => {
      const T = saturationTemperature(P)
      return [holds(T) ? 1 / saturationSlope(T) : Number.NaN]
    },
  },
}

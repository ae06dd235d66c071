import { cite } from '../citation.ts'
import { iapwsR7 } from '../sources/iapws-r7-97.ts'
import { fluidFunctions, inValidity, type Fluid } from './fluid.ts'
import {
  if97Least,
  saturationPressure,
  saturationSlope,
  specificHeat,
  specificHeatPartials,
  volume,
  volumePartials,
} from './if97.ts'
import { steamFunctions } from './steam.ts'

/** 0 to 200 °C: region 1 reaches further, no water vessel does. */
const validity = { least: if97Least, most: 473.15 }

/** Slope along the saturation line: the pressure changes with the temperature. */
const alongSaturation = (T: number, partials: typeof volumePartials): number => {
  const { byTemperature, byPressure } = partials(T, saturationPressure(T))
  return byTemperature + byPressure * saturationSlope(T)
}

/**
 * The last few values of a function of the temperature. One calculation asks for the same two or three temperatures again
 * and again: for the step, for the static head, for the slope.
 */
const recalling = (compute: (T: number) => number): ((T: number) => number) => {
  const temperatures = new Float64Array(4).fill(Number.NaN)
  const values = new Float64Array(4)
  let next = 0
  return (T) => {
    for (let n = 0; n < 4; n += 1) if (temperatures[n] === T) return values[n] ?? Number.NaN
    const value = compute(T)
    temperatures[next] = T
    values[next] = value
    next = (next + 1) % 4
    return value
  }
}

const v = recalling((T) => volume(T, saturationPressure(T)))
const dv = recalling((T) => alongSaturation(T, volumePartials))

/** Density in kg/m3 of the saturated liquid, or at P in Pa absolute where it is liquid there; NaN elsewhere. */
const density = (T: number, P?: number): number => {
  if (!inValidity(validity, T)) return Number.NaN
  if (P === undefined) return 1 / v(T)
  return P >= saturationPressure(T) && P <= 100e6 ? 1 / volume(T, P) : Number.NaN
}

export const water: Fluid = {
  label: 'water',
  base: 'water',
  massFraction: 0,
  volumeFraction: 0,
  functions: {
    ...fluidFunctions(validity, 'saturated liquid', {
      v_sat: { value: v, derivative: dv },
      rho: { value: (T) => 1 / v(T), derivative: (T) => -dv(T) / v(T) ** 2 },
      c_p: {
        value: (T) => specificHeat(T, saturationPressure(T)),
        derivative: (T) => alongSaturation(T, specificHeatPartials),
      },
    }),
    ...steamFunctions,
  },
  freezing: 273.15,
  validity,
  source: cite(iapwsR7, 'region 1 at the saturation pressure of region 4'),
  notes: [],
  density,
}

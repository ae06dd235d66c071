import { ethyleneGlycol } from './ethylene-glycol.ts'
import type { Fluid, FluidBase, FluidStrength } from './fluid.ts'
import { inhibitedExpansion, mixture, type ExpansionCheck, type FluidReading } from './glycol.ts'
import { propyleneGlycol } from './propylene-glycol.ts'
import { water } from './water.ts'

export type { Fluid, FluidBase, FluidFunctionName, FluidStrength } from './fluid.ts'
export type { ExpansionCheck, FluidReading, Glycol } from './glycol.ts'
export type { InhibitedGlycolTable } from './inhibited-glycol.ts'
export type { PolynomialTable } from './polynomial.ts'
export { inValidity } from './fluid.ts'
export {
  enthalpy,
  if97Least,
  if97Region1Most,
  saturationPressure,
  saturationSlope,
  saturationTemperature,
  volume as specificVolume,
} from './if97.ts'
export { steamFunctions, vapourDensityAt, type SteamFunctionName } from './steam.ts'
export { water } from './water.ts'
export { if97Region1, if97Region1Reducing } from '../tables/iapws-r7-97.region-1.ts'
export { if97Region4 } from '../tables/iapws-r7-97.region-4.ts'
export { vapourDensity } from '../tables/iapws-sr1-86.vapour-density.ts'

/** Data of the glycols by base, for whoever shows or recomputes them. */
export const glycols = { 'ethylene glycol': ethyleneGlycol, 'propylene glycol': propyleneGlycol } as const

/** A fluid by its base and strength. A wrong strength is a message for the reader, never a throw. */
export const fluid = (base: FluidBase, strength?: FluidStrength): FluidReading => {
  if (base === 'water')
    return strength === undefined || strength.value === 0
      ? { ok: true, fluid: water }
      : { ok: false, message: 'Water has no strength; name a glycol, or leave the strength out.' }
  if (strength === undefined)
    return { ok: false, message: `The strength of the ${base} is missing: write it as “30 % vol” or “30 % mass”.` }
  return mixture(glycols[base], strength)
}

/**
 * Growth of the volume of a glycol mixture between two temperatures in K by the second source, the handbook table of
 * inhibited glycol, bilinear between its cells. Undefined for water and where the table does not reach.
 */
export const ashraeExpansionCheck = (of: Fluid, low: number, high: number): ExpansionCheck | undefined =>
  of.base === 'water' || of.massFraction === 0
    ? undefined
    : inhibitedExpansion(glycols[of.base], of.volumeFraction, low, high)

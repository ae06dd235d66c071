import { formatNumber } from '@coldfill/units'
import { cite, type Citation } from '../citation.ts'
import { ashraeFundamentals2005 } from '../sources/ashrae-fundamentals-2005.ts'
import { melinder2010 } from '../sources/melinder-2010.ts'
import { fluidFunctions, inValidity, type Fluid, type FluidBase, type FluidStrength } from './fluid.ts'
import {
  freezingByMass,
  inhibitedDensity,
  massPercent,
  volumePercent,
  type InhibitedGlycolTable,
} from './inhibited-glycol.ts'
import { polynomial, polynomialSlope, type PolynomialTable } from './polynomial.ts'
import { water } from './water.ts'

/** The data of one glycol: polynomials of the uninhibited mixture and the second table, of the inhibited one. */
export interface Glycol {
  readonly base: Exclude<FluidBase, 'water'>
  readonly density: PolynomialTable
  readonly specificHeat: PolynomialTable
  readonly freezing: PolynomialTable
  readonly inhibited: InhibitedGlycolTable
}

export type FluidReading =
  { readonly ok: true; readonly fluid: Fluid } | { readonly ok: false; readonly message: string }

const ZERO = 273.15
const MOST_MASS = 60
const MOST_CELSIUS = 100

const percent = (value: number): string => String(Number(value.toPrecision(6)))

const strengthLabel = (strength: FluidStrength): string =>
  `${percent(strength.value * 100)} % ${strength.by === 'mass' ? 'mass' : 'vol'}`

/** Per cent by mass of a strength, or undefined beyond the table (volume) or beyond 60 % by mass. */
const massOf = (glycol: Glycol, strength: FluidStrength): number | undefined => {
  const typed = strength.value * 100
  const mass = strength.by === 'mass' ? typed : massPercent(glycol.inhibited, typed)
  return mass === undefined || !(mass >= 0 && mass <= MOST_MASS + 1e-9) ? undefined : mass
}

const refused = (glycol: Glycol, strength: FluidStrength): FluidReading => {
  const most = formatNumber(volumePercent(glycol.inhibited, MOST_MASS) ?? Number.NaN, 3)
  return {
    ok: false,
    message: `The data for ${glycol.base} go from 0 to ${MOST_MASS} % mass (${most} % vol); ${strengthLabel(strength)} is outside and is not extrapolated.`,
  }
}

/** A mixture at a strength: 0 to 60 % by mass, from the freezing point of the polynomials to 100 °C. */
export const mixture = (glycol: Glycol, strength: FluidStrength): FluidReading => {
  const mass = massOf(glycol, strength)
  if (mass === undefined) return refused(glycol, strength)
  const label = `${glycol.base} ${strengthLabel(strength)}`
  if (mass === 0)
    return {
      ok: true,
      fluid: {
        ...water,
        label,
        base: glycol.base,
        notes: [`At 0 % the properties are those of water; the polynomials of the glycol miss them by up to 1 kg/m³.`],
      },
    }
  const freezing = polynomial(glycol.freezing, mass, glycol.freezing.base.temperature)
  const second = freezingByMass(glycol.inhibited, mass) ?? freezing
  const validity = { least: ZERO + freezing, most: ZERO + MOST_CELSIUS }
  const rho = (T: number): number => polynomial(glycol.density, mass, T - ZERO)
  const rhoSlope = (T: number): number => polynomialSlope(glycol.density, mass, T - ZERO)
  return {
    ok: true,
    fluid: {
      label,
      base: glycol.base,
      massFraction: mass / 100,
      volumeFraction:
        (strength.by === 'volume' ? strength.value * 100 : (volumePercent(glycol.inhibited, mass) ?? Number.NaN)) / 100,
      functions: fluidFunctions(validity, 'mixture', {
        v_sat: { value: (T) => 1 / rho(T), derivative: (T) => -rhoSlope(T) / rho(T) ** 2 },
        rho: { value: rho, derivative: rhoSlope },
        c_p: {
          value: (T) => polynomial(glycol.specificHeat, mass, T - ZERO),
          derivative: (T) => polynomialSlope(glycol.specificHeat, mass, T - ZERO),
        },
      }),
      freezing: ZERO + Math.max(freezing, second),
      validity,
      source: cite(melinder2010, `aqueous ${glycol.base}, coefficients`),
      notes: [
        `The freezing point is the warmer of two sources: ${freezing.toFixed(1)} °C and ${second.toFixed(1)} °C.`,
        'The expansion of glycol mixtures differs between published sources by about 10 %.',
      ],
      density: (T) => (inValidity(validity, T) ? rho(T) : Number.NaN),
    },
  }
}

/** Relative growth of the volume between two temperatures by the second table, for comparison with the polynomials. */
export interface ExpansionCheck {
  /** v_high / v_low − 1 */
  readonly ratio: number
  readonly source: Citation
}

/** Undefined where the second table does not reach: below 10 % by volume, where frozen, above 125 °C. Temperatures in K. */
export const inhibitedExpansion = (
  glycol: Glycol,
  volumeFraction: number,
  low: number,
  high: number,
): ExpansionCheck | undefined => {
  const cold = inhibitedDensity(glycol.inhibited, volumeFraction * 100, low - ZERO)
  const hot = inhibitedDensity(glycol.inhibited, volumeFraction * 100, high - ZERO)
  if (cold === undefined || hot === undefined) return undefined
  return { ratio: cold / hot - 1, source: cite(ashraeFundamentals2005, `density of aqueous ${glycol.base}, inhibited`) }
}

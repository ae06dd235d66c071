import type { FormulaFunction } from '@coldfill/formula'
import type { Citation } from '../citation.ts'

export type FluidBase = 'water' | 'propylene glycol' | 'ethylene glycol'

/** Strength as a fraction of 1, by volume or by mass. */
export interface FluidStrength {
  readonly value: number
  readonly by: 'volume' | 'mass'
}

export type FluidFunctionName = 'v_sat' | 'rho' | 'c_p'

/** A fluid at one strength. Temperatures in K. */
export interface Fluid {
  /** `water`, `propylene glycol 30 % vol` */
  readonly label: string
  readonly base: FluidBase
  /** Glycol in the mixture, fractions of 1; zero for water. */
  readonly massFraction: number
  readonly volumeFraction: number
  /** Specific volume of the saturated liquid, density and specific heat at a temperature, for formulas. */
  readonly functions: Readonly<Record<FluidFunctionName, FormulaFunction>>
  /** Freezing point; of a glycol the warmer of the two sources. */
  readonly freezing: number
  /** Temperatures in which the functions hold; outside they return NaN. */
  readonly validity: { readonly least: number; readonly most: number }
  readonly source: Citation
  /** What a reader should know of the data, whole sentences. */
  readonly notes: readonly string[]
  /** Density in kg/m3 of the saturated liquid, or of water at a pressure in Pa absolute. NaN outside the validity. */
  readonly density: (T: number, P?: number) => number
}

/** Room for the rounding of 32 °F to kelvin. */
const SLACK = 1e-6

/** True where a temperature in K lies in the validity of the fluid. */
export const inValidity = (validity: Fluid['validity'], T: number): boolean =>
  T >= validity.least - SLACK && T <= validity.most + SLACK

/** The fluid functions from a value and its exact derivative each, NaN outside the validity. */
export const fluidFunctions = (
  validity: Fluid['validity'],
  fluid: 'saturated liquid' | 'mixture',
  laws: Readonly<Record<FluidFunctionName, { value: (T: number) => number; derivative: (T: number) => number }>>,
): Fluid['functions'] => {
  const law = (name: FluidFunctionName, result: FormulaFunction['result'], words: string): FormulaFunction => ({
    name,
    parameters: ['temperature'],
    result,
    words: `${words} of the ${fluid} at`,
    symbol: name,
    evaluate: (T = Number.NaN) => (inValidity(validity, T) ? laws[name].value(T) : Number.NaN),
    partials: (T = Number.NaN) => [inValidity(validity, T) ? laws[name].derivative(T) : Number.NaN],
  })
  return {
    v_sat: law('v_sat', 'specific volume', 'specific volume'),
    rho: law('rho', 'density', 'density'),
    c_p: law('c_p', 'specific heat', 'specific heat'),
  }
}

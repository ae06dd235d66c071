import type { FormulaFunction } from '@coldfill/formula'
import type { Kind } from '@coldfill/units'

/** A fluid property as it is drawn. Its values come computed with the trace; here it is never evaluated. */
const drawn = (name: string, result: Kind, words: string, at: Kind = 'temperature'): FormulaFunction => ({
  name,
  parameters: [at],
  result,
  words,
  symbol: name,
  evaluate: () => Number.NaN,
  partials: () => [Number.NaN],
})

export const fluidFunctions: Readonly<Record<string, FormulaFunction>> = {
  v_sat: drawn('v_sat', 'specific volume', 'specific volume of the saturated liquid at'),
  rho: drawn('rho', 'density', 'density of the saturated liquid at'),
  c_p: drawn('c_p', 'specific heat', 'specific heat of the liquid at'),
  h_f: drawn('h_f', 'specific energy', 'enthalpy of the saturated liquid at'),
  h_fg: drawn('h_fg', 'specific energy', 'enthalpy of evaporation at'),
  v_g: drawn('v_g', 'specific volume', 'specific volume of the saturated steam at'),
  t_sat: drawn('t_sat', 'temperature', 'saturation temperature at', 'absolute pressure'),
}

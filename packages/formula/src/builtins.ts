/** A function that every formula may call. Arguments and value are numbers in SI units. */
export interface Builtin {
  readonly least: number
  readonly most: number
  readonly evaluate: (...values: number[]) => number
  /** Derivative of a function of one argument, at that argument. */
  readonly slope?: (value: number) => number
}

const one = (evaluate: (value: number) => number, slope: (value: number) => number): Builtin => ({
  least: 1,
  most: 1,
  evaluate,
  slope,
})
const two = (evaluate: (first: number, second: number) => number): Builtin => ({
  least: 2,
  most: 2,
  evaluate: evaluate,
})
const flat = () => 0

/** Halves go away from zero, as on paper and in a spreadsheet. */
const roundHalfAway = (value: number): number => Math.sign(value) * Math.round(Math.abs(value))

const BUILTINS: Readonly<Record<string, Builtin>> = {
  min: { least: 2, most: Infinity, evaluate: Math.min },
  max: { least: 2, most: Infinity, evaluate: Math.max },
  /** `when(condition, a, b)`: only the branch taken is evaluated, so compile and differentiate treat it themselves. */
  when: { least: 3, most: 3, evaluate: (condition, a, b) => (condition ? a : b) },
  sqrt: one(Math.sqrt, (x) => 0.5 / Math.sqrt(x)),
  abs: one(Math.abs, Math.sign),
  exp: one(Math.exp, Math.exp),
  ln: one(Math.log, (x) => 1 / x),
  log10: one(Math.log10, (x) => 1 / (x * Math.LN10)),
  ceil: one(Math.ceil, flat),
  floor: one(Math.floor, flat),
  round: one(roundHalfAway, flat),
  /** Absolute pressure from a gauge reading and the pressure of the atmosphere (absolute). */
  absolute: two((gauge, atmosphere) => gauge + atmosphere),
  /** Gauge reading from an absolute pressure and the pressure of the atmosphere (absolute). */
  gauge: two((absolute, atmosphere) => absolute - atmosphere),
  /** The pure number that a thermometer shows, for formulas stated in degrees. */
  celsius: one(
    (t) => t - 273.15,
    () => 1,
  ),
  fahrenheit: one(
    (t) => t * 1.8 - 459.67,
    () => 1.8,
  ),
}

export const builtin = (name: string): Builtin | undefined =>
  Object.hasOwn(BUILTINS, name) ? BUILTINS[name] : undefined

export const builtinNames: readonly string[] = Object.keys(BUILTINS)

/** The number that a name stands for in every formula. */
export const constant = (name: string): number | undefined => (name === 'pi' ? Math.PI : undefined)

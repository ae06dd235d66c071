/** Base dimensions in the order metre, kilogram, second, kelvin. */
export type Exponents = readonly [metre: number, kilogram: number, second: number, kelvin: number]

/**
 * How a number of this kind may be combined. A `point` is a reading on a scale whose zero is a convention
 * (a thermometer, a pressure gauge); a `difference` or `plain` number has a true zero.
 */
export type Sort = 'plain' | 'temperature point' | 'gauge pressure' | 'absolute pressure'

export interface KindDefinition {
  readonly exponents: Exponents
  readonly sort: Sort
  /** Symbol of the unit that values of this kind have inside the program. */
  readonly si: string
  /** Unit shown where a project shows US units. */
  readonly us: string
  /** Unit shown where a project shows SI units, also the unit of the JSON the command writes. */
  readonly metric: string
}

const kind = (exponents: Exponents, si: string, us: string, metric: string, sort: Sort = 'plain'): KindDefinition => ({
  exponents,
  sort,
  si,
  us,
  metric,
})

/** Every kind of quantity the program knows. Values of a kind are held in its `si` unit. */
export const KINDS = {
  ratio: kind([0, 0, 0, 0], '1', '1', '1'),
  count: kind([0, 0, 0, 0], '1', '1', '1'),
  length: kind([1, 0, 0, 0], 'm', 'ft', 'm'),
  diameter: kind([1, 0, 0, 0], 'm', 'in', 'mm'),
  area: kind([2, 0, 0, 0], 'm2', 'ft2', 'm2'),
  volume: kind([3, 0, 0, 0], 'm3', 'gal', 'L'),
  'volume per length': kind([2, 0, 0, 0], 'm2', 'gal/ft', 'L/m'),
  'volume per power': kind([1, -1, 3, 0], 'm3/W', 'gal/MBH', 'L/kW'),
  mass: kind([0, 1, 0, 0], 'kg', 'lb', 'kg'),
  density: kind([-3, 1, 0, 0], 'kg/m3', 'lb/ft3', 'kg/m3'),
  'specific volume': kind([3, -1, 0, 0], 'm3/kg', 'ft3/lb', 'm3/kg'),
  temperature: kind([0, 0, 0, 1], 'K', '°F', '°C', 'temperature point'),
  'temperature difference': kind([0, 0, 0, 1], 'K', 'Δ°F', 'K'),
  'per temperature difference': kind([0, 0, 0, -1], '1/K', '1/Δ°F', '1/K'),
  'gauge pressure': kind([-1, 1, -2, 0], 'Pa', 'psig', 'kPa', 'gauge pressure'),
  'absolute pressure': kind([-1, 1, -2, 0], 'Pa abs', 'psia', 'kPa abs', 'absolute pressure'),
  'pressure difference': kind([-1, 1, -2, 0], 'Pa', 'psi', 'kPa'),
  power: kind([2, 1, -3, 0], 'W', 'MBH', 'kW'),
  energy: kind([2, 1, -2, 0], 'J', 'Btu', 'kWh'),
  'specific energy': kind([2, 0, -2, 0], 'J/kg', 'Btu/lb', 'kJ/kg'),
  'specific heat': kind([2, 0, -2, -1], 'J/(kg·K)', 'Btu/(lb·Δ°F)', 'kJ/(kg·K)'),
  flow: kind([3, 0, -1, 0], 'm3/s', 'gpm', 'L/s'),
  'hourly flow': kind([3, 0, -1, 0], 'm3/s', 'gph', 'L/s'),
  'mass flow': kind([0, 1, -1, 0], 'kg/s', 'lb/h', 'kg/h'),
  velocity: kind([1, 0, -1, 0], 'm/s', 'ft/s', 'm/s'),
  acceleration: kind([1, 0, -2, 0], 'm/s2', 'ft/s2', 'm/s2'),
  time: kind([0, 0, 1, 0], 's', 'min', 'min'),
  frequency: kind([0, 0, -1, 0], '1/s', '1/h', '1/h'),
} as const satisfies Record<string, KindDefinition>

export type Kind = keyof typeof KINDS

export const isKind = (text: string): text is Kind => Object.hasOwn(KINDS, text)

import { KINDS, type Kind } from './kind.ts'
import type { UnitSystem } from './quantity.ts'

/** A unit as a straight line to the SI unit of its kind: `si = number * factor + offset`. */
export interface Unit {
  /** Symbol printed on paper and screen, and accepted in formulas as `[symbol]`. */
  readonly symbol: string
  /** Kind that a bare literal with this unit has (`psi` is a difference, `psig` a gauge reading). */
  readonly kind: Kind
  readonly factor: number
  readonly offset: number
  /** Other spellings that a person may type. */
  readonly spellings: readonly string[]
}

// 1 ft = 0.3048 m, 1 lb = 0.45359237 kg and g = 9.80665 m/s2 are exact by definition (international yard and pound, CGPM 1901).
const FOOT = 0.3048
const INCH = FOOT / 12
const POUND = 0.45359237
const GRAVITY = 9.80665
const PSI = (POUND * GRAVITY) / (INCH * INCH)
const GALLON = 231 * INCH ** 3
const IMPERIAL_GALLON = 4.54609e-3
// International Table Btu: 2326 J/kg per Btu/lb exactly.
const BTU = 2326 * POUND
const FAHRENHEIT = 5 / 9
// Conventional water column: 1000 kg/m3 exactly, ISO 80000-4 remark on conventional millimetre of water.
const WATER = 1000 * GRAVITY

const unit = (kind: Kind, symbol: string, factor: number, spellings: string[] = [], offset = 0): Unit => ({
  symbol,
  kind,
  factor,
  offset,
  spellings,
})

/** Every unit, in the order in which suggestions are offered within its kind. */
export const UNITS: readonly Unit[] = [
  unit('ratio', '1', 1),
  unit('ratio', '%', 0.01, ['percent', 'per cent']),
  unit('length', 'ft', FOOT, ['foot', 'feet', "'", '′']),
  unit('length', 'in', INCH, ['inch', 'inches', '"', '″']),
  unit('length', 'm', 1, ['metre', 'meter', 'metres', 'meters']),
  unit('length', 'mm', 1e-3),
  unit('length', 'cm', 1e-2),
  unit('area', 'ft2', FOOT ** 2, ['ft²', 'sq ft']),
  unit('area', 'm2', 1, ['m²']),
  unit('volume', 'gal', GALLON, ['gals', 'gallon', 'gallons', 'US gal', 'US gallon', 'US gallons']),
  unit('volume', 'L', 1e-3, ['l', 'litre', 'litres', 'liter', 'liters']),
  unit('volume', 'm3', 1, ['m³', 'cubic metres', 'cubic meters']),
  unit('volume', 'ft3', FOOT ** 3, ['ft³', 'cu ft', 'cubic feet']),
  unit('volume', 'imp gal', IMPERIAL_GALLON, ['imperial gallon', 'imperial gallons', 'imperial gal', 'UK gal']),
  unit('volume per length', 'gal/ft', GALLON / FOOT),
  unit('volume per length', 'L/m', 1e-3),
  unit('volume per power', 'gal/MBH', GALLON / (1000 * (BTU / 3600))),
  unit('volume per power', 'L/kW', 1e-6),
  unit('volume per power', 'gal/ton', GALLON / (12000 * (BTU / 3600))),
  unit('volume per power', 'm3/W', 1),
  unit('mass', 'lb', POUND, ['lbs', 'pound', 'pounds']),
  unit('mass', 'kg', 1),
  unit('density', 'lb/ft3', POUND / FOOT ** 3, ['lb/ft³']),
  unit('density', 'kg/m3', 1, ['kg/m³']),
  unit('specific volume', 'ft3/lb', FOOT ** 3 / POUND, ['ft³/lb']),
  unit('specific volume', 'm3/kg', 1, ['m³/kg']),
  unit('temperature', '°F', FAHRENHEIT, ['F', 'degF', 'deg F', 'Fahrenheit'], 273.15 - 32 * FAHRENHEIT),
  unit('temperature', '°C', 1, ['C', 'degC', 'deg C', 'Celsius'], 273.15),
  unit('temperature', 'K', 1),
  unit('temperature difference', 'Δ°F', FAHRENHEIT, ['°F', 'F', 'degF', 'deg F']),
  unit('temperature difference', 'K', 1, ['°C', 'C', 'Δ°C', 'degC', 'deg C']),
  unit('per temperature difference', '1/Δ°F', 1 / FAHRENHEIT, ['1/°F', '/°F', '1/F', '/F']),
  unit('per temperature difference', '1/K', 1, ['1/°C', '/K', '/°C']),
  unit('gauge pressure', 'psig', PSI, ['psi', 'psi g', 'psi gauge']),
  unit('gauge pressure', 'bar g', 1e5, ['bar', 'barg', 'bar gauge']),
  unit('gauge pressure', 'kPa', 1e3, ['kPa g', 'kPag', 'kPa gauge']),
  unit('gauge pressure', 'mbar', 1e2, ['mbar g', 'mbar gauge']),
  unit('gauge pressure', 'MPa', 1e6, ['MPa g', 'MPa gauge']),
  unit('gauge pressure', 'Pa', 1, ['Pa g', 'Pa gauge']),
  unit('gauge pressure', 'ft water', FOOT * WATER, ['ft of water', 'ftH2O']),
  unit('gauge pressure', 'm water', WATER, ['m of water', 'mH2O']),
  unit('absolute pressure', 'psia', PSI, ['psi abs', 'psi a', 'psi absolute']),
  unit('absolute pressure', 'bar abs', 1e5, ['bara', 'bar a', 'bar absolute']),
  unit('absolute pressure', 'kPa abs', 1e3, ['kPa a', 'kPaa', 'kPa absolute']),
  unit('absolute pressure', 'MPa abs', 1e6),
  unit('absolute pressure', 'Pa abs', 1),
  unit('pressure difference', 'psi', PSI),
  unit('pressure difference', 'bar', 1e5),
  unit('pressure difference', 'kPa', 1e3),
  unit('pressure difference', 'mbar', 1e2),
  unit('pressure difference', 'MPa', 1e6),
  unit('pressure difference', 'Pa', 1),
  unit('pressure difference', 'ft water', FOOT * WATER, ['ft of water', 'ftH2O']),
  unit('pressure difference', 'm water', WATER, ['m of water', 'mH2O']),
  unit('power', 'MBH', 1000 * (BTU / 3600), ['kBtu/h', 'kBtu/hr', 'kBtuh', 'MBtuh']),
  unit('power', 'Btu/h', BTU / 3600, ['Btuh', 'BTU/h', 'BTUH', 'Btu/hr']),
  unit('power', 'kW', 1e3),
  unit('power', 'MW', 1e6),
  unit('power', 'W', 1),
  unit('power', 'ton', 12000 * (BTU / 3600), ['tons', 'ton of refrigeration']),
  unit('energy', 'Btu', BTU, ['BTU']),
  unit('energy', 'kWh', 3.6e6),
  unit('energy', 'MWh', 3.6e9),
  unit('energy', 'Wh', 3600),
  unit('energy', 'MJ', 1e6),
  unit('energy', 'kJ', 1e3),
  unit('energy', 'J', 1),
  unit('specific energy', 'Btu/lb', 2326),
  unit('specific energy', 'kJ/kg', 1e3),
  unit('specific energy', 'J/kg', 1),
  unit('specific heat', 'Btu/(lb·Δ°F)', 2326 / FAHRENHEIT, ['Btu/(lb·°F)', 'Btu/lb°F']),
  unit('specific heat', 'kJ/(kg·K)', 1e3, ['kJ/kgK']),
  unit('specific heat', 'J/(kg·K)', 1, ['J/kgK']),
  unit('flow', 'gpm', GALLON / 60, ['gal/min', 'US gpm']),
  unit('flow', 'L/s', 1e-3, ['l/s', 'lps']),
  unit('flow', 'm3/h', 1 / 3600, ['m³/h', 'm3/hr']),
  unit('flow', 'gph', GALLON / 3600, ['gal/h', 'gal/hr']),
  unit('flow', 'L/h', 1e-3 / 3600, ['l/h']),
  unit('flow', 'L/min', 1e-3 / 60, ['l/min', 'lpm']),
  unit('flow', 'm3/s', 1),
  unit('mass flow', 'lb/h', POUND / 3600),
  unit('mass flow', 'kg/h', 1 / 3600),
  unit('mass flow', 'kg/s', 1),
  unit('velocity', 'ft/s', FOOT, ['fps']),
  unit('velocity', 'm/s', 1),
  unit('acceleration', 'm/s2', 1),
  unit('acceleration', 'ft/s2', FOOT),
  unit('time', 'min', 60, ['mins', 'minute', 'minutes']),
  unit('time', 's', 1, ['sec', 'second', 'seconds']),
  unit('time', 'h', 3600, ['hr', 'hrs', 'hour', 'hours']),
  unit('frequency', '1/h', 1 / 3600, ['per hour', '/h']),
  unit('frequency', '1/min', 1 / 60),
  unit('frequency', '1/s', 1),
]

/** Kinds that share one list of units. */
const UNITS_OF: Partial<Record<Kind, Kind>> = { diameter: 'length', count: 'ratio', 'hourly flow': 'flow' }

/** The units in which a quantity of this kind may be written, most usual first. */
export const unitsFor = (kind: Kind): readonly Unit[] => {
  const family = UNITS_OF[kind] ?? kind
  return UNITS.filter((candidate) => candidate.kind === family)
}

/** The unit of a kind by its printed symbol. A wrong symbol is a programmer's mistake and throws. */
export const unitOf = (kind: Kind, symbol: string): Unit => {
  const found = unitsFor(kind).find((candidate) => candidate.symbol === symbol)
  if (found) return found
  if (symbol === KINDS[kind].si) return { symbol, kind, factor: 1, offset: 0, spellings: [] }
  throw new Error(`no unit "${symbol}" for ${kind}`)
}

/** The unit in which a system shows a kind. */
export const displayUnit = (kind: Kind, system: UnitSystem): Unit =>
  unitOf(kind, system === 'US' ? KINDS[kind].us : KINDS[kind].metric)

/** Number in the SI unit of the kind from a number in `unit`. */
export const toSi = (number: number, unit: Unit): number => number * unit.factor + unit.offset

/** Number in `unit` from a value in the SI unit of its kind. */
export const fromSi = (value: number, unit: Unit): number => (value - unit.offset) / unit.factor

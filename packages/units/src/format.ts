import { displayUnit, fromSi, unitOf, type Unit } from './convert.ts'
import type { Kind } from './kind.ts'
import type { Quantity, UnitSystem } from './quantity.ts'

/**
 * A number with `digits` significant digits, trailing zeros kept, without exponent from 0.00001 up to a thousand million million.
 * A whole number longer than `digits` is rounded: 12345 with 3 digits is `12300`. Zero is `0`; what is not finite is `–`.
 */
export const formatNumber = (value: number, digits: number): string => {
  if (!Number.isFinite(value)) return '–'
  if (value === 0) return '0'
  const rounded = Number(value.toPrecision(digits))
  const size = Math.abs(rounded)
  if (size < 1e-5 || size >= 1e15) return rounded.toExponential(digits - 1).replace('e+', 'e')
  const text = value.toPrecision(digits)
  return text.includes('e') ? rounded.toFixed(0) : text
}

/** Decimals of units in which instruments are read and set, whatever the size of the number. */
const DECIMALS: Readonly<Record<string, number>> = {
  psig: 1,
  psia: 2,
  psi: 1,
  kPa: 0,
  'kPa abs': 1,
  '°F': 0,
  '°C': 1,
  'Δ°F': 0,
}

const DIGITS: Partial<Record<Kind, number>> = {
  density: 4,
  'specific volume': 5,
  'specific heat': 4,
  length: 3,
  count: 4,
}

/** Significant digits shown for a kind where nothing else is asked for. Pressures and temperatures show fixed decimals instead. */
export const defaultDigits = (kind: Kind): number => DIGITS[kind] ?? 3

const printed = (symbol: string): string =>
  symbol === '1' ? '' : symbol.replace(/([a-z])2(?![0-9A-Za-z])/gu, '$1²').replace(/([a-z])3(?![0-9A-Za-z])/gu, '$1³')

/** Unit as printed behind a number: `ft³/lb` for `ft3/lb`, nothing for a pure number. */
export const printedUnit = (unit: Unit): string => printed(unit.symbol)

/** Header text of the unit in which a system shows a kind: `gal`, `psig`, `kPa`, `°F`. Empty for a pure number. */
export const unitLabel = (kind: Kind, system: UnitSystem): string => printed(displayUnit(kind, system).symbol)

const fixed = (value: number, decimals: number): string => {
  const text = value.toFixed(decimals)
  return Number(text) === 0 ? (0).toFixed(decimals) : text
}

const number = (kind: Kind, value: number, unit: Unit, digits: number | undefined): string => {
  if (!Number.isFinite(value)) return '–'
  if (digits !== undefined) return formatNumber(value, digits)
  if (kind === 'count' && Number.isInteger(value)) return String(value)
  const decimals = DECIMALS[unit.symbol]
  return decimals === undefined ? formatNumber(value, defaultDigits(kind)) : fixed(value, decimals)
}

/** The number alone, in the unit in which the system shows the kind: `344`, `12.0`. */
export const formatValue = (
  quantity: Quantity,
  system: UnitSystem,
  options: { readonly digits?: number } = {},
): string => {
  const unit = displayUnit(quantity.kind, system)
  return number(quantity.kind, fromSi(quantity.value, unit), unit, options.digits)
}

/** A quantity as documents and screens show it: `344 gal`, `12.0 psig`, `83 kPa`. A pure number has no unit behind it. */
export const formatQuantity = (
  quantity: Quantity,
  system: UnitSystem,
  options: { readonly digits?: number } = {},
): string => `${formatValue(quantity, system, options)} ${unitLabel(quantity.kind, system)}`.trimEnd()

/** A quantity in one particular unit of its kind, by the printed symbol of the unit, which throws where there is none. */
export const formatIn = (quantity: Quantity, symbol: string, options: { readonly digits?: number } = {}): string => {
  const unit = unitOf(quantity.kind, symbol)
  return `${number(quantity.kind, fromSi(quantity.value, unit), unit, options.digits)} ${printed(unit.symbol)}`.trimEnd()
}

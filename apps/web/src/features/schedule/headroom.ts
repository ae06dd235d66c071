import { displayUnit, formatValue, fromSi, printedUnit, unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import type { Vessel } from '#lib/sized-project.ts'

type HeadroomRow = Vessel['headroom'][number]

export interface ShownHeadroom {
  readonly entry: string
  readonly symbol: string
  readonly name: string
  /** The input now, with its unit. */
  readonly now: string
  /** `+1.24 gal per °F` */
  readonly change: string
  /** The value at which the chosen vessel stops being enough; null where none does that. */
  readonly limit: string | null
}

/** Significant digits of what is shown. */
const DIGITS = 4

/** What a reading changes by: a temperature by °F or K, a gauge by psi or kPa. */
const stepWords = (kind: Kind, units: UnitSystem): string => {
  if (kind === 'temperature') return units === 'US' ? '°F' : 'K'
  if (kind === 'gauge pressure' || kind === 'absolute pressure') return unitLabel('pressure difference', units)
  return printedUnit(displayUnit(kind, units)) || 'unit'
}

const plain = (value: number, digits: number): string => {
  const rounded = Number(value.toPrecision(digits))
  const text = String(rounded)
  return text.includes('e')
    ? rounded.toFixed(Math.min(12, digits - 1 - Math.floor(Math.log10(Math.abs(rounded)))))
    : text
}

/** In few digits, rounded towards the present value: what is shown is still enough. */
const limitWords = (limit: number, value: number, kind: Kind): string => {
  const up = limit > value
  if (kind === 'count') return String(up ? Math.floor(limit + 1e-9) : Math.ceil(limit - 1e-9))
  if (limit === 0) return '0'
  const step = 10 ** (Math.floor(Math.log10(Math.abs(limit))) + 1 - DIGITS)
  const rounded = up ? Math.floor(limit / step + 1e-9) : Math.ceil(limit / step - 1e-9)
  return plain(rounded * step, DIGITS)
}

/** How the required volume answers to each input, in the units shown. */
export const shownHeadroom = (rows: readonly HeadroomRow[], units: UnitSystem): readonly ShownHeadroom[] =>
  rows.map((row) => {
    const unit = displayUnit(row.kind, units)
    const volume = displayUnit('volume', units)
    const label = printedUnit(unit)
    const change = (row.sensitivity * unit.factor) / volume.factor
    const now = fromSi(row.value, unit)
    return {
      entry: row.entry,
      symbol: row.symbol,
      name: row.name,
      now: `${plain(now, Math.max(DIGITS, formatValue(row, units).replaceAll(/\D/g, '').length))} ${label}`.trimEnd(),
      change: `${change > 0 ? '+' : '−'}${plain(Math.abs(change), 3)} ${unitLabel('volume', units)} per ${stepWords(row.kind, units)}`,
      limit: row.limit === null ? null : `${limitWords(fromSi(row.limit, unit), now, row.kind)} ${label}`.trimEnd(),
    }
  })

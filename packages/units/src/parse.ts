import { toSi, unitOf, type Unit } from './convert.ts'
import { KINDS, type Kind } from './kind.ts'
import { matchAnyUnit, matchUnit, nearestSpelling } from './match-unit.ts'
import { readNumber } from './read-number.ts'
import type { Quantity } from './quantity.ts'
import { kindName, kindsInWords, usualUnits } from './usual-units.ts'

/** Why a text is not a quantity of the kinds asked for, in a reader's words. */
export interface QuantityProblem {
  readonly reason:
    'empty' | 'not a number' | 'no unit' | 'unknown unit' | 'wrong kind' | 'thousands comma' | 'decimal comma' | 'range'
  readonly message: string
  /** Whole texts that could be written instead, the likeliest first: `12 psi`, `12 kPa`. May be empty. */
  readonly suggestions: readonly string[]
}

export type QuantityReading<K extends Kind> =
  | { readonly ok: true; readonly quantity: Quantity<K>; readonly unit: Unit }
  | { readonly ok: false; readonly problem: QuantityProblem }

/** `12 psi`, `12 bar` and so on; a plain fraction is offered as the percentage it is. */
const withUsualUnits = (number: string, value: number, kinds: readonly Kind[]): string[] => [
  ...new Set(
    kinds.flatMap((kind) =>
      usualUnits(kind).map((unit) =>
        unit === '%' && value !== 0 && Math.abs(value) < 1
          ? `${Number((value * 100).toPrecision(12))} %`
          : `${number} ${unit}`,
      ),
    ),
  ),
]

const list = (texts: readonly string[]): string =>
  texts.length < 2 ? texts.join('') : `${texts.slice(0, -1).join(', ')} or ${texts.at(-1)}`

const wrongKind = (typed: string, number: string, unit: Unit, kinds: readonly Kind[]): QuantityProblem => {
  const due = kindsInWords(kinds)
  const first = kinds[0]
  // The same number is meant where only the suffix is wrong; a reading that needs the atmosphere is never converted.
  const same = unit.kind === 'gauge pressure' && kinds.includes('pressure difference')
  const suffix = same ? /^(psi|bar|mbar|kPa|MPa|Pa)/iu.exec(typed)?.[1] : undefined
  const example = first === undefined ? undefined : usualUnits(first)[0]
  return {
    reason: 'wrong kind',
    message: `“${typed}” is a unit of ${kindName(unit.kind)}; ${due} is due here${example === undefined ? '' : `, as in “${number} ${example}”`}.`,
    suggestions: suffix === undefined ? [] : [`${number} ${suffix}`],
  }
}

const unknownUnit = (typed: string, number: string, value: number, kinds: readonly Kind[]): QuantityProblem => {
  const near = nearestSpelling(typed, kinds)
  const usual = withUsualUnits(number, value, kinds)
  const suggestions = near === undefined ? usual : [`${number} ${near}`]
  const known =
    usual.length === 0 ? ' Write the number alone.' : ` Write ${list(suggestions.map((text) => `“${text}”`))}.`
  return {
    reason: 'unknown unit',
    message: `“${typed}” is not a unit of ${list([...new Set(kinds.map(kindName))])}.${known}`,
    suggestions,
  }
}

/**
 * Reads a number with a unit as a person writes it. The kind is the first of `kinds` in which the unit fits: a pressure
 * without a suffix is a gauge reading where a gauge pressure may stand, and absolute pressures (`psia`, `bar abs`) are
 * read only where an absolute pressure may stand. A number without a unit is a count, or a ratio where nothing else may
 * stand. Fractions (`1-1/2 in`) are read for lengths and diameters only. Never throws; every mistake is a problem.
 */
export const parseQuantity = <K extends Kind>(text: string, kinds: readonly K[]): QuantityReading<K> => {
  const problem = (found: QuantityProblem): QuantityReading<K> => ({ ok: false, problem: found })
  const authored = text.trim()
  const fractions = kinds.some((kind) => kind === 'length' || kind === 'diameter')
  const number = readNumber(authored, fractions)
  if (!number.ok) {
    if (number.reason === 'empty')
      return problem({
        reason: 'empty',
        message: `Nothing is written here; ${kindsInWords(kinds)} is due.`,
        suggestions: [],
      })
    return problem({ reason: number.reason, message: number.message, suggestions: number.suggestions })
  }
  const found = (kind: K, unit: Unit): QuantityReading<K> => {
    const value = toSi(number.value, unit)
    if (!Number.isFinite(value))
      return problem({ reason: 'not a number', message: `“${authored}” is too large a number.`, suggestions: [] })
    return { ok: true, quantity: { kind, value, authored }, unit }
  }
  if (number.rest === '') {
    const bare =
      kinds.find((kind) => kind === 'count') ??
      (kinds.length === 1 ? kinds.find((kind) => kind === 'ratio') : undefined)
    if (bare !== undefined) return found(bare, unitOf(bare, '1'))
    const suggestions = withUsualUnits(number.text, number.value, kinds)
    return problem({
      reason: 'no unit',
      message: `“${number.text}” needs a unit: ${list(suggestions.map((each) => `“${each}”`))}.`,
      suggestions,
    })
  }
  for (const kind of kinds) {
    const unit = matchUnit(number.rest, kind)
    if (unit === undefined) continue
    if (number.fraction && KINDS[kind].exponents.join() !== KINDS.length.exponents.join()) continue
    return found(kind, unit)
  }
  const other = matchAnyUnit(number.rest)
  if (other !== undefined && !kinds.some((kind) => matchUnit(number.rest, kind) !== undefined))
    return problem(wrongKind(number.rest, number.text, other, kinds))
  return problem(unknownUnit(number.rest, number.text, number.value, kinds))
}

import type { QuantityProblem } from './parse.ts'
import { readNumber } from './read-number.ts'

/** Strength of a mixture as a fraction of 1, by volume or by mass. */
export interface Strength {
  readonly value: number
  readonly by: 'volume' | 'mass'
  readonly authored: string
}

export type StrengthReading =
  { readonly ok: true; readonly strength: Strength } | { readonly ok: false; readonly problem: QuantityProblem }

const BY_VOLUME = /^(?:%|per ?cent) ?(?:by )?(?:vol|volume|vol\.|v\/v)$|^(?:vol|volume) ?%$/iu
const BY_MASS = /^(?:%|per ?cent) ?(?:by )?(?:mass|weight|wt|wt\.|m\/m|w\/w)$|^(?:mass|wt) ?%$/iu

/**
 * Reads `30 % vol` or `35 % mass`. Which of the two must be said: 30 % by volume of ethylene glycol is 32.4 % by mass.
 * Whether the strength is one that a fluid has is not asked here.
 */
export const parseStrength = (text: string): StrengthReading => {
  const problem = (
    reason: QuantityProblem['reason'],
    message: string,
    suggestions: readonly string[],
  ): StrengthReading => ({
    ok: false,
    problem: { reason, message, suggestions },
  })
  const authored = text.trim()
  const number = readNumber(authored, false)
  if (!number.ok)
    return number.reason === 'empty'
      ? problem('empty', 'Nothing is written here; a strength is due, as in “30 % vol”.', [])
      : problem(number.reason, number.message, number.suggestions)
  const unit = number.rest.replace(/\s+/gu, ' ')
  if (BY_VOLUME.test(unit)) return { ok: true, strength: { value: number.value / 100, by: 'volume', authored } }
  if (BY_MASS.test(unit)) return { ok: true, strength: { value: number.value / 100, by: 'mass', authored } }
  const suggestions = [`${number.text} % vol`, `${number.text} % mass`]
  const written = `write “${suggestions.join('” or “')}”`
  if (unit === '' || unit === '%')
    return problem('no unit', `Say whether the strength is by volume or by mass: ${written}.`, suggestions)
  return problem('unknown unit', `“${unit}” is not a unit of strength; ${written}.`, suggestions)
}

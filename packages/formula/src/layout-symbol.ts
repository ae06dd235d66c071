import type { Box } from './box.ts'
import { greekLetter } from './greek.ts'

export const row = (...items: Box[]): Box => ({ box: 'row', items })
export const operator = (text: string): Box => ({ box: 'operator', text })
export const word = (text: string): Box => ({ box: 'word', text })
export const number = (text: string): Box => ({ box: 'number', text })
const identifier = (name: string): Box => ({ box: 'identifier', text: greekLetter(name) })

/** A subscript: digits as a number, one letter as a symbol, more as upright words with commas between the parts. */
const subscript = (text: string): Box => {
  if (/^\d+$/.test(text)) return number(text)
  return text.length === 1 ? { box: 'identifier', text } : word(text.replaceAll('_', ','))
}

/**
 * A symbol as drawn: what stands behind the first `_` is its subscript, a Greek name is its letter, and `Delta_` before
 * a letter is a difference: `V_s`, `rho_c`, `Delta_t_h`.
 */
export const layoutSymbol = (name: string): Box => {
  const parts = /^([^_]+)_(.+)$/.exec(name)
  if (!parts) return identifier(name)
  const [, base, rest] = parts
  if (base === 'Delta' && /^[A-Za-z]/.test(rest!)) {
    const of = layoutSymbol(rest!)
    if (of.box === 'subscript') return { ...of, base: row(identifier(base), of.base) }
    return row(identifier(base), of)
  }
  return { box: 'subscript', base: identifier(base!), sub: subscript(rest!) }
}

/** Begins a word that is the unit of the number before it. */
const UNIT_SPACE = '\u00A0'

/** A written number: `-1.2e-6 psi` becomes −1.2 × 10⁻⁶ psi. Text that is no number is drawn upright as it is. */
export const layoutNumber = (text: string): { box: Box; kind: 'plain' | 'compound' | 'negative' } => {
  const parts = /^([-−]?)([\d.,]+)(?:[eE]([-+]?)0*(\d+))?(?:\s+(\S.*))?$/.exec(text.trim())
  if (!parts) return { box: word(text), kind: 'plain' }
  const [, minus, mantissa, sign, exponent, unit] = parts
  let box = number(mantissa!)
  if (exponent !== undefined) {
    const sup = sign === '-' ? row(operator('−'), number(exponent)) : number(exponent)
    box = row(box, operator('×'), { box: 'superscript', base: number('10'), sup })
  }
  if (unit !== undefined) box = row(box, word(UNIT_SPACE + unit))
  if (minus) return { box: row(operator('−'), box), kind: 'negative' }
  return { box, kind: exponent === undefined && unit === undefined ? 'plain' : 'compound' }
}

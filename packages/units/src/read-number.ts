/** The number at the start of a text and what stands behind it, or why there is none. */
export type NumberReading =
  | {
      readonly ok: true
      readonly value: number
      /** As typed, with a plain minus sign. */
      readonly text: string
      /** Behind the number, without spaces around: the unit. */
      readonly rest: string
      readonly fraction: boolean
    }
  | { readonly ok: false; readonly reason: 'empty' }
  | {
      readonly ok: false
      readonly reason: 'not a number' | 'thousands comma' | 'decimal comma' | 'range'
      readonly message: string
      readonly suggestions: readonly string[]
    }

const NUMBER = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)\s*(.*)$/su
const FRACTION = /^([+-]?)(?:(\d+)\s*(?:-|\s)\s*)?(\d+)\s*\/\s*(\d+)(?!\d)\s*(.*)$/su
const VULGAR: Readonly<Record<string, string>> = {
  '¼': '1/4',
  '½': '1/2',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
}

const failed = (
  reason: 'not a number' | 'thousands comma' | 'decimal comma' | 'range',
  message: string,
  suggestions: readonly string[],
): NumberReading => ({ ok: false, reason, message, suggestions })

/** Commas, and spaces or apostrophes that part thousands. The decimal mark is a point and nothing parts thousands. */
const groupedOrComma = (text: string): NumberReading | undefined => {
  const written = (typed: string, repaired: string, rest: string): string =>
    `${repaired}${text.slice(typed.length, text.length - rest.length)}${rest}`
  const grouped = /^([+-]?[1-9]\d{0,2}(?:(?:,|’|'|[ \u00a0\u202f])\d{3})+(?:\.\d+)?)(?![\d,.])(.*)$/su.exec(text)
  if (grouped) {
    const [, typed = '', rest = ''] = grouped
    const repaired = written(typed, typed.replace(/[^\d.+-]/gu, ''), rest)
    return failed('thousands comma', `“${typed}” parts the thousands; write “${repaired}”.`, [repaired])
  }
  const comma = /^([+-]?\d[\d.]*,\d+)(?!\d)(.*)$/su.exec(text)
  if (comma) {
    const [, typed = '', rest = ''] = comma
    const repaired = written(typed, typed.replaceAll('.', '').replace(',', '.'), rest)
    return failed('decimal comma', `The decimal mark is a point; write “${repaired}”.`, [repaired])
  }
  return undefined
}

/** What stands behind the first number of a range: `600..700 ft`, `600 - 700 ft`, `600 ft to 700 ft`. */
const RANGE = /^\s*[^\d\s./-]{0,4}\s*(?:\.\.+|…|–|—|to\b|-)\s*[+-]?\d/u
const FIRST_NUMBER = /^[+-]?(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?/u

/** Feet and inches: `5 ft 6 in`, `5'-6"`. */
const FEET_AND_INCHES = /^(\d+)\s*(?:ft|feet|foot|'|′)\s*-?\s*(\d+(?:\.\d+)?)\s*(?:in|inch|inches|"|″)$/iu

/**
 * Reads the number with which a text begins. Scientific notation is a number; `1-1/2` is one where `fractions`.
 * A comma, a range and a number too large are said as what they are.
 */
export const readNumber = (source: string, fractions: boolean): NumberReading => {
  const text = source
    .trim()
    .replace(/^\u2212/u, '-')
    .replace(
      /(\d?)\s*([¼½¾⅛⅜⅝⅞])/u,
      (_, whole: string, vulgar: string) => (whole === '' ? '' : `${whole}-`) + (VULGAR[vulgar] ?? ''),
    )
  if (text === '') return { ok: false, reason: 'empty' }
  const fraction = FRACTION.exec(text)
  if (fraction && fractions) {
    const [, sign = '', whole = '0', over = '', under = '', rest = ''] = fraction
    const value = (Number(whole) + Number(over) / Number(under)) * (sign === '-' ? -1 : 1)
    if (Number.isFinite(value))
      return {
        ok: true,
        value,
        text: text.slice(0, text.length - rest.length).trim(),
        rest: rest.trim(),
        fraction: true,
      }
    return failed('not a number', `“${source.trim()}” is not a number.`, [])
  }
  if (fraction && !fractions)
    return failed(
      'not a number',
      `A fraction is read in lengths and diameters only; write “${source.trim()}” as a decimal number.`,
      [],
    )
  const feet = FEET_AND_INCHES.exec(text)
  if (feet) {
    const decimal = Number((Number(feet[1]) + Number(feet[2]) / 12).toPrecision(6))
    return failed('not a number', `Write feet and inches as one number: “${decimal} ft”.`, [`${decimal} ft`])
  }
  const comma = groupedOrComma(text)
  if (comma) return comma
  if (FIRST_NUMBER.test(text) && RANGE.test(text.replace(FIRST_NUMBER, '')))
    return failed('range', 'A range is reserved for a later version; write one number.', [])
  const number = NUMBER.exec(text)
  if (!number) {
    const later = /^[^\d]*?([+-]?(?:\d|\.\d).*)$/su.exec(text)?.[1]
    return failed(
      'not a number',
      `“${source.trim()}” does not begin with a number.`,
      later === undefined ? [] : [later],
    )
  }
  const [, typed = '', rest = ''] = number
  const value = Number(typed)
  if (!Number.isFinite(value)) return failed('not a number', `“${typed}” is too large a number.`, [])
  return {
    ok: true,
    value: value === 0 ? 0 : value,
    text: typed.replace(/^\+/u, ''),
    rest: rest.trim(),
    fraction: false,
  }
}

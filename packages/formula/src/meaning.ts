import { type Exponents, KINDS, type Kind, type Sort } from '@coldfill/units'

/** What a part of a formula stands for: its base dimensions and how it may be combined. */
export interface Meaning {
  readonly exponents: Exponents
  /** Factors that are absolute pressures, counted with their exponent: `P_1 · V_1 / V_2` has one, `P_1 / P_2` none. */
  readonly absolutes: number
  readonly sort: Exclude<Sort, 'absolute pressure'> | 'condition'
}

const PRESSURE = KINDS['pressure difference'].exponents
const sameExponents = (a: Exponents, b: Exponents): boolean =>
  a.every((power, index) => Math.abs(power - b[index]!) < 1e-9)

export const isPressure = ({ exponents }: Meaning): boolean => sameExponents(exponents, PRESSURE)
/** A pressure above vacuum: pressure dimensions, made from one absolute pressure. */
export const isAbsolute = (meaning: Meaning): boolean => meaning.absolutes === 1 && isPressure(meaning)
export const isRatio = ({ exponents, sort }: Meaning): boolean =>
  sort === 'plain' && exponents.every((power) => Math.abs(power) < 1e-9)
export const sameDimensions = (a: Meaning, b: Meaning): boolean =>
  sameExponents(a.exponents, b.exponents) && (a.sort === 'condition') === (b.sort === 'condition')

export const meaningOfKind = (kind: Kind): Meaning => {
  const { exponents, sort } = KINDS[kind]
  const absolute = sort === 'absolute pressure'
  return { exponents, absolutes: absolute ? 1 : 0, sort: absolute ? 'plain' : sort }
}

export const RATIO = meaningOfKind('ratio')
export const CONDITION: Meaning = { ...RATIO, sort: 'condition' }

/** The same dimensions, and the same choice of zero. */
export const alike = (a: Meaning, b: Meaning): boolean =>
  sameDimensions(a, b) && a.sort === b.sort && isAbsolute(a) === isAbsolute(b)

/** The meaning of `a · b^power`, sorts left aside. */
export const product = (a: Meaning, b: Meaning, power: number): Meaning => {
  const [metre, kilogram, second, kelvin] = a.exponents
  const [m, kg, s, k] = b.exponents
  const exponents: Exponents = [metre + power * m, kilogram + power * kg, second + power * s, kelvin + power * k]
  const whole: Meaning = { exponents, absolutes: a.absolutes + power * b.absolutes, sort: 'plain' }
  return isRatio(whole) ? RATIO : whole
}

const BASE = ['m', 'kg', 's', 'K']
const named = Object.keys(KINDS) as Kind[]
const article = (noun: string): string => `${/^[aeo]/.test(noun) ? 'an' : 'a'} ${noun}`

/** In words, for a sentence: `a temperature difference`, `a condition`, `a quantity in m·s^-1`. */
export const inWords = (meaning: Meaning): string => {
  if (meaning.sort === 'condition') return 'a condition'
  if (isRatio(meaning)) return 'a pure number'
  const kind = named.find((candidate) => alike(meaningOfKind(candidate), meaning))
  if (kind)
    return article(kind === 'temperature' ? 'temperature reading' : kind === 'gauge pressure' ? 'gauge pressure' : kind)
  const powers = meaning.exponents.flatMap((power, index) =>
    power === 0 ? [] : power === 1 ? [BASE[index]!] : [`${BASE[index]!}^${power}`],
  )
  return `a quantity in ${powers.join('·')}`
}

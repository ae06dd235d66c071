import { formatNumber } from '@coldfill/units'

const RAISED: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
}
const raised = (exponent: string): string => exponent.replace(/./g, (digit) => RAISED[digit] ?? '')

/** A value with its unit for reading: up to five significant digits, none of them a zero that only fills up. */
export const numberText = (value: number): string => {
  const text = formatNumber(value, 5)
  const [mantissa = '', exponent] = text.split('e')
  const short = mantissa.includes('.') ? mantissa.replace(/\.?0+$/, '') : mantissa
  return exponent === undefined ? short : `${short} × 10${raised(exponent)}`
}

export const valueText = ({ value, unit }: { readonly value: number; readonly unit: string }): string =>
  `${numberText(value)} ${unit}`.trimEnd()

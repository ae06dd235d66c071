import { formatNumber } from '@coldfill/units'

/** A value with its unit for reading: up to five significant digits, none of them a zero that only fills up. */
export const numberText = (value: number): string => {
  const text = formatNumber(value, 5)
  return text.includes('.') && !text.includes('e') ? text.replace(/\.?0+$/, '') : text
}

export const valueText = ({ value, unit }: { readonly value: number; readonly unit: string }): string =>
  `${numberText(value)} ${unit}`.trimEnd()

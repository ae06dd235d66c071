/** Number format that shows `digits` significant digits of the value; powers of ten for very small and very large numbers. */
export const significantFormat = (value: number, digits: number, leastDecimals = 0): string => {
  const size = Math.abs(value)
  const zeros = (count: number) => (count > 0 ? `.${'0'.repeat(count)}` : '')
  if (!Number.isFinite(value) || size === 0) return `0${zeros(leastDecimals)}`
  if (size < 1e-4 || size >= 1e9) return `0${zeros(digits - 1)}E+00`
  return `0${zeros(Math.max(leastDecimals, digits - 1 - Math.floor(Math.log10(size))))}`
}

/** Format of a computed cell: five digits, and never fewer than two decimals below a thousand, since the cell may change. */
export const stepFormat = (value: number): string => significantFormat(value, 5, Math.abs(value) < 1000 ? 2 : 0)

/** Format of an input: as it is typed, or seven digits where a conversion left more. */
export const inputFormat = (value: number): string =>
  String(value).length <= 10 ? 'General' : significantFormat(value, 7)

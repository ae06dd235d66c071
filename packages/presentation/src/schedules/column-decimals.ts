/** A number counts as whole when it differs from one by less than conversion noise. */
const isWhole = (value: number): boolean => Math.abs(value - Math.round(value)) <= 1e-9 * Math.max(1, Math.abs(value))

/**
 * Decimals of a column: enough for three significant digits of its smallest number, none where all are whole, at most
 * five. Every number of a column has the same, so that points stand under each other.
 */
export const decimalsFor = (values: readonly number[]): number => {
  const sizes = values.map(Math.abs).filter((size) => size > 0)
  if (sizes.length === 0 || values.every(isWhole)) return 0
  const least = Math.min(...sizes)
  return Math.min(5, Math.max(0, 2 - Math.floor(Math.log10(least))))
}

export const fixedText = (value: number, decimals: number): string => {
  const text = value.toFixed(decimals)
  return /^-0(\.0*)?$/.test(text) ? text.slice(1) : text
}

/**
 * Number format of a computed cell: five significant digits of the value it has now, never fewer than two decimals for
 * numbers below a thousand, since the cell may change; powers of ten for very small and very large numbers.
 */
export const stepFormat = (value: number): string => {
  const size = Math.abs(value)
  if (!Number.isFinite(value) || size === 0) return '0.00'
  if (size < 1e-4 || size >= 1e9) return '0.0000E+00'
  const decimals = Math.max(size < 1000 ? 2 : 0, Math.min(9, 4 - Math.floor(Math.log10(size))))
  return decimals === 0 ? '0' : `0.${'0'.repeat(decimals)}`
}

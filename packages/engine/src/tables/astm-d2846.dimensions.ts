import type { InchRow } from '../pipes/dimensions.ts'

// Inches. The wall is the least one, so the content errs on the large side, by up to 8 % at 1/2 in.

/** SDR 11, copper tube sizes: size, no DN, outside diameter and minimum wall in inches. */
export const cpvcSdr11: readonly InchRow[] = [
  ['1/2', null, 0.625, 0.068],
  ['3/4', null, 0.875, 0.08],
  ['1', null, 1.125, 0.102],
  ['1-1/4', null, 1.375, 0.125],
  ['1-1/2', null, 1.625, 0.148],
  ['2', null, 2.125, 0.193],
]

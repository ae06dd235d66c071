import type { InchRow } from '../pipes/dimensions.ts'

// Inches, average wall. From memory that the standard repeats the copper tube sizes of ASTM F876.

/** SDR 9, copper tube sizes: size, no DN, outside diameter and average wall in inches. */
export const peRtSdr9: readonly InchRow[] = [
  ['3/8', null, 0.5, 0.075, 'from memory'],
  ['1/2', null, 0.625, 0.075, 'from memory'],
  ['5/8', null, 0.75, 0.088, 'from memory'],
  ['3/4', null, 0.875, 0.102, 'from memory'],
  ['1', null, 1.125, 0.1315, 'from memory'],
  ['1-1/4', null, 1.375, 0.1605, 'from memory'],
  ['1-1/2', null, 1.625, 0.1905, 'from memory'],
  ['2', null, 2.125, 0.248, 'from memory'],
]

import type { InchRow } from '../pipes/dimensions.ts'

// Inches. The wall is the average one, minimum plus half the plus-tolerance: it gives the published content of the tube.
// 1-1/4 in and above: minimum wall from outside diameter / 9, tolerance from memory.

/** SDR 9, copper tube sizes: size, no DN, outside diameter and average wall in inches. */
export const pexSdr9: readonly InchRow[] = [
  ['1/4', null, 0.375, 0.067, 'from memory'],
  ['3/8', null, 0.5, 0.075],
  ['1/2', null, 0.625, 0.075],
  ['5/8', null, 0.75, 0.088],
  ['3/4', null, 0.875, 0.102],
  ['1', null, 1.125, 0.1315],
  ['1-1/4', null, 1.375, 0.1605, 'derived'],
  ['1-1/2', null, 1.625, 0.1905, 'derived'],
  ['2', null, 2.125, 0.248, 'derived'],
  ['2-1/2', null, 2.625, 0.307, 'derived'],
  ['3', null, 3.125, 0.3645, 'derived'],
]

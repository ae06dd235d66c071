import type { MetricNominalRow } from '../pipes/dimensions.ts'

/** Medium series: size, DN, specified outside diameter and nominal wall in mm. */
export const steelMedium: readonly MetricNominalRow[] = [
  ['1/4', 8, 13.5, 2.3],
  ['3/8', 10, 17.2, 2.3],
  ['1/2', 15, 21.3, 2.6],
  ['3/4', 20, 26.9, 2.6],
  ['1', 25, 33.7, 3.2],
  ['1-1/4', 32, 42.4, 3.2],
  ['1-1/2', 40, 48.3, 3.2],
  ['2', 50, 60.3, 3.6],
  ['2-1/2', 65, 76.1, 3.6, 'from memory'],
  ['3', 80, 88.9, 4, 'from memory'],
  ['4', 100, 114.3, 4.5],
  ['5', 125, 139.7, 5],
  ['6', 150, 165.1, 5],
]

import type { MetricRow } from '../pipes/dimensions.ts'

/** SDR 11: outside diameter and minimum wall in mm. */
export const hdpeSdr11: readonly MetricRow[] = [
  [20, 2],
  [25, 2.3],
  [32, 3],
  [40, 3.7],
  [50, 4.6],
  [63, 5.8],
  [75, 6.8],
  [90, 8.2],
  [110, 10],
  [125, 11.4],
  [140, 12.7],
  [160, 14.6],
  [180, 16.4],
  [200, 18.2],
  [225, 20.5],
  [250, 22.7],
  [280, 25.4, 'from memory'],
  [315, 28.6, 'from memory'],
  [355, 32.2, 'from memory'],
  [400, 36.3, 'from memory'],
  [450, 40.9, 'from memory'],
  [500, 45.4, 'from memory'],
  [560, 50.8, 'from memory'],
  [630, 57.2, 'from memory'],
]

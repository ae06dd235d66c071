import type { MetricRow } from '../pipes/dimensions.ts'

/** SDR 11 (series S 5): outside diameter and minimum wall in mm. */
export const ppRSdr11: readonly MetricRow[] = [
  [16, 1.8, 'from memory'],
  [20, 1.9],
  [25, 2.3],
  [32, 2.9],
  [40, 3.7],
  [50, 4.6],
  [63, 5.8],
  [75, 6.8],
  [90, 8.2],
  [110, 10],
  [125, 11.4, 'from memory'],
  [160, 14.6],
  [200, 18.2, 'from memory'],
  [250, 22.7, 'from memory'],
]

/** SDR 7.4 (series S 3.2): outside diameter and minimum wall in mm. */
export const ppRSdr7: readonly MetricRow[] = [
  [16, 2.2, 'from memory'],
  [20, 2.8],
  [25, 3.5],
  [32, 4.4],
  [40, 5.5],
  [50, 6.9],
  [63, 8.6],
  [75, 10.3],
  [90, 12.3],
  [110, 15.1],
  [125, 17.1, 'from memory'],
  [160, 21.9],
  [200, 27.4, 'from memory'],
  [250, 34.2, 'from memory'],
]

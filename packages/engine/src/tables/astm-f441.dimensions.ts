import type { InchRow } from '../pipes/dimensions.ts'

// Inches. The wall is the least one, so the content errs on the large side. The 5 in wall is 0.375; 0.420 seen in print is an error.

/** Schedule 80: size, DN, outside diameter and minimum wall in inches. */
export const cpvcSchedule80: readonly InchRow[] = [
  ['1/4', 8, 0.54, 0.119],
  ['3/8', 10, 0.675, 0.126],
  ['1/2', 15, 0.84, 0.147],
  ['3/4', 20, 1.05, 0.154],
  ['1', 25, 1.315, 0.179],
  ['1-1/4', 32, 1.66, 0.191],
  ['1-1/2', 40, 1.9, 0.2],
  ['2', 50, 2.375, 0.218],
  ['2-1/2', 65, 2.875, 0.276],
  ['3', 80, 3.5, 0.3],
  ['3-1/2', 90, 4, 0.318],
  ['4', 100, 4.5, 0.337],
  ['5', 125, 5.563, 0.375],
  ['6', 150, 6.625, 0.432],
  ['8', 200, 8.625, 0.5],
  ['10', 250, 10.75, 0.593],
  ['12', 300, 12.75, 0.687],
  ['14', 350, 14, 0.75],
  ['16', 400, 16, 0.843],
]

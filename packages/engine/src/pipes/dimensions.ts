/** How a row came into our table. Rows without one agree in public copies of the standard. */
export type RowMark =
  | 'from memory'
  /** Computed by the rule of the standard (outside diameter over the dimension ratio), with a tolerance from memory. */
  | 'derived'

/** Size, DN where the standard has one, outside diameter and wall in inches. */
export type InchRow = readonly [size: string, dn: number | null, outside: number, wall: number, mark?: RowMark]

/** Nominal pipe size, DN, outside diameter and wall in mm. */
export type MetricNominalRow = readonly [size: string, dn: number, outside: number, wall: number, mark?: RowMark]

/** Outside diameter and wall in mm, which together are the size. */
export type MetricRow = readonly [outside: number, wall: number, mark?: RowMark]

/** A handbook table of inhibited glycol. Strengths in per cent, temperatures in °C, densities in kg/m3. */
export interface InhibitedGlycolTable {
  readonly density: {
    readonly strengths: readonly number[]
    readonly rows: readonly (readonly [celsius: number, ...densities: (number | null)[]])[]
  }
  readonly strengths: readonly (readonly [volume: number, mass: number, freezing: number])[]
}

type Column = 0 | 1 | 2

/** Straight line between the rows of the table of strengths; undefined outside it. */
const between = (table: InhibitedGlycolTable, from: Column, to: Column, value: number): number | undefined => {
  const rows = table.strengths
  const above = rows.findIndex((row) => row[from] >= value - 1e-9)
  const high = rows[above]
  if (high === undefined || value < -1e-9) return undefined
  const low = rows[above - 1]
  if (low === undefined) return high[to]
  return low[to] + ((high[to] - low[to]) * (value - low[from])) / (high[from] - low[from])
}

/** Per cent by mass from per cent by volume. */
export const massPercent = (table: InhibitedGlycolTable, volume: number): number | undefined =>
  between(table, 0, 1, volume)

/** Per cent by volume from per cent by mass. */
export const volumePercent = (table: InhibitedGlycolTable, mass: number): number | undefined =>
  between(table, 1, 0, mass)

/** Freezing point in °C at a strength by mass. */
export const freezingByMass = (table: InhibitedGlycolTable, mass: number): number | undefined =>
  between(table, 1, 2, mass)

/** Density in kg/m3 by bilinear interpolation at per cent by volume and °C; undefined outside the cells that the table has. */
export const inhibitedDensity = (
  { density }: InhibitedGlycolTable,
  volume: number,
  celsius: number,
): number | undefined => {
  const column = density.strengths.findIndex((strength) => strength >= volume - 1e-9)
  const line = density.rows.findIndex(([temperature]) => temperature >= celsius - 1e-9)
  const right = density.strengths[column]
  const lower = density.rows[line]
  if (right === undefined || lower === undefined) return undefined
  const left = density.strengths[column - 1] ?? right
  const upper = density.rows[line - 1] ?? lower
  // Outside on the near side: weaker than the first column or colder than the first row.
  if (volume < left - 1e-9 || celsius < upper[0] - 1e-9) return undefined
  const across = left === right ? 1 : (volume - left) / (right - left)
  const down = upper === lower ? 1 : (celsius - upper[0]) / (lower[0] - upper[0])
  const cell = (row: typeof lower, at: number): number => row[at + 1] ?? Number.NaN
  const weigh = (weight: number, value: number): number => (Math.abs(weight) < 1e-12 ? 0 : weight * value)
  const along = (row: typeof lower): number =>
    weigh(1 - across, cell(row, Math.max(column - 1, 0))) + weigh(across, cell(row, column))
  const value = weigh(1 - down, along(upper)) + weigh(down, along(lower))
  return Number.isNaN(value) ? undefined : value
}

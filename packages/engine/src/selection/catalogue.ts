/** One row of an office's own catalogue of vessels, SI units. */
export interface CatalogueRow {
  readonly maker: string
  readonly model: string
  /** Vessel kinds the row may serve, as specs name them. */
  readonly kinds: readonly string[]
  readonly construction: string | null
  /** m3 */
  readonly volume: number
  /** Water that the vessel can take up, m3; null where the whole shell is usable. */
  readonly acceptance: number | null
  /** Highest working pressure, gauge Pa. */
  readonly maxPressure: number
  /** K */
  readonly maxTemperature: number
  readonly potable: boolean
  readonly stamped: boolean
  readonly mounting: string | null
  /** m */
  readonly diameter: number | null
  readonly height: number | null
  /** kg */
  readonly weightEmpty: number | null
  readonly connection: string | null
  /** Line of the catalogue, counting its head as line 1. */
  readonly line: number
}

/** What a vessel has to satisfy, SI units. */
export interface Requirement {
  readonly kind: string
  readonly construction: string | null
  /** Of all vessels together, m3. */
  readonly volume: number
  /** Water that all vessels together must take up, m3; null where that is no question. */
  readonly acceptance: number | null
  /** gauge Pa: the relief valve setting where there is one. */
  readonly pressure: number
  /** K */
  readonly temperature: number
  readonly potable: boolean
  readonly stamped: boolean
  readonly mounting: string | null
  /** Fixed number of equal vessels, or null where the number may be chosen. */
  readonly quantity: number | null
}

export interface Choice {
  readonly row: CatalogueRow
  readonly quantity: number
}

export interface Selection {
  readonly choice: Choice | null
  /** Other rows of the same volume and number that would do as well. */
  readonly ties: readonly CatalogueRow[]
  /** The next size down among rows that fail on volume or acceptance alone, and by how much each vessel falls short, m3. */
  readonly nearMiss: {
    readonly row: CatalogueRow
    readonly short: number
    readonly of: 'volume' | 'acceptance volume'
  } | null
  /** Where nothing fits: how many rows fail on each point. */
  readonly refusals: Readonly<Record<string, number>>
}

const MOST_VESSELS = 12

const unfit = (row: CatalogueRow, need: Requirement): string | null => {
  if (!row.kinds.includes(need.kind)) return 'kind'
  if (need.construction !== null && row.construction !== null && row.construction !== need.construction)
    return 'construction'
  if (row.maxPressure < need.pressure) return 'pressure rating'
  if (row.maxTemperature < need.temperature) return 'temperature rating'
  if (need.potable && !row.potable) return 'potable rating'
  if (need.stamped && !row.stamped) return 'stamp'
  if (need.mounting !== null && row.mounting !== need.mounting) return 'mounting'
  return null
}

const shortOf = (row: CatalogueRow, need: Requirement, quantity: number) => {
  const volume = need.volume / quantity - row.volume
  const acceptance = need.acceptance === null ? 0 : need.acceptance / quantity - (row.acceptance ?? row.volume)
  return { volume, acceptance }
}

const enough = (row: CatalogueRow, need: Requirement, quantity: number): boolean => {
  const { volume, acceptance } = shortOf(row, need, quantity)
  return volume <= 0 && acceptance <= 0
}

const byVolume = (a: CatalogueRow, b: CatalogueRow): number =>
  a.volume - b.volume || (a.acceptance ?? a.volume) - (b.acceptance ?? b.volume) || a.line - b.line

/**
 * The smallest row that satisfies the requirement, or the least number of equal ones where one is not enough and the number
 * is free. Ties keep the order of the catalogue.
 */
export const selectRow = (rows: readonly CatalogueRow[], need: Requirement): Selection => {
  const refusals: Record<string, number> = {}
  const fit: CatalogueRow[] = []
  for (const row of rows) {
    const reason = unfit(row, need)
    if (reason === null) fit.push(row)
    else refusals[reason] = (refusals[reason] ?? 0) + 1
  }
  fit.sort(byVolume)
  const counts = need.quantity === null ? Array.from({ length: MOST_VESSELS }, (_, n) => n + 1) : [need.quantity]
  for (const quantity of counts) {
    const row = fit.find((candidate) => enough(candidate, need, quantity))
    if (!row) continue
    const ties = fit.filter((other) => other !== row && other.volume === row.volume && enough(other, need, quantity))
    const below = fit
      .filter((other) => other.volume < row.volume || !enough(other, need, quantity))
      .findLast((other) => !enough(other, need, quantity) && byVolume(other, row) < 0)
    if (!below) return { choice: { row, quantity }, ties, nearMiss: null, refusals }
    const short = shortOf(below, need, quantity)
    const nearMiss =
      short.volume > 0
        ? { row: below, short: short.volume, of: 'volume' as const }
        : { row: below, short: short.acceptance, of: 'acceptance volume' as const }
    return { choice: { row, quantity }, ties, nearMiss, refusals }
  }
  const largest = fit.at(-1)
  if (!largest) return { choice: null, ties: [], nearMiss: null, refusals }
  const quantity = counts.at(-1) ?? 1
  const short = shortOf(largest, need, quantity)
  return {
    choice: null,
    ties: [],
    nearMiss:
      short.volume > 0
        ? { row: largest, short: short.volume, of: 'volume' }
        : { row: largest, short: short.acceptance, of: 'acceptance volume' },
    refusals: { ...refusals, 'volume or acceptance volume': fit.length },
  }
}

import type { VesselResult } from '@coldfill/sizing'

const traced = (vessel: VesselResult, symbol: string, kind: string): number | undefined =>
  vessel.trace.flatMap((section) => section.entries).find((entry) => entry.symbol === symbol && entry.kind === kind)
    ?.value

/** A vessel in the numbers that its water content follows from; pressures gauge in Pa, the atmosphere in Pa abs, volumes in m3. */
export interface ChargedVessel {
  readonly atmosphere: number
  /** Gauge pressure of the gas while there is no water in the vessel. */
  readonly charge: number
  readonly cold: number
  readonly hot: number
  readonly volume: number
  readonly required: number
  readonly acceptance: number | undefined
  readonly relief: number | undefined
}

/** Pa abs. Methods that do not take the atmosphere of the site round it to one bar. */
const ROUND_ATMOSPHERE = 1e5

/** Null where the vessel has no size, or holds no gas that water presses together. */
export const chargedVessel = (vessel: VesselResult): ChargedVessel | null => {
  const { results, selected } = vessel
  const atmosphere = traced(vessel, 'P_a', 'absolute pressure') ?? ROUND_ATMOSPHERE
  const cold = (results['cut-in-pressure'] ?? results['fill-pressure'])?.value
  const hot = (results['final-pressure'] ?? results['maximum-pressure'])?.value
  const required = results['required-volume']?.value
  if (cold === undefined || hot === undefined || required === undefined) return null
  if (vessel.status !== 'sized' || !(hot > cold) || !(required > 0)) return null
  return {
    atmosphere,
    cold,
    hot,
    required,
    // A tank without a diaphragm is filled from the air it stands in.
    charge: results['precharge']?.value ?? 0,
    volume: selected ? selected.volume * selected.quantity : required,
    acceptance: selected?.acceptance === undefined ? undefined : selected.acceptance * selected.quantity,
    relief: traced(vessel, 'p_rv', 'gauge pressure'),
  }
}

/** Water in a vessel of `volume` at a gauge pressure by Boyle and Mariotte: the gas of the empty vessel, pressed together at one temperature. */
export const waterInVessel = (
  volume: number,
  { charge, atmosphere }: Pick<ChargedVessel, 'charge' | 'atmosphere'>,
  pressure: number,
): number => Math.max(0, volume * (1 - (charge + atmosphere) / (pressure + atmosphere)))

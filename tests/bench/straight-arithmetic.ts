import { saturationPressure, specificVolume } from '@coldfill/engine'

export interface StraightJob {
  readonly volume: number
  readonly low: number
  readonly high: number
  readonly height: number
  readonly relief: number
  readonly elevationFeet: number
}

/** The diaphragm tank of the ASHRAE method with its pressures, written straight out: SI in, m3 out. */
export const straightTank = (job: StraightJob): number => {
  const atmosphere = 14.696 * 6894.757293168361 * (1 - 6.8754e-6 * job.elevationFeet) ** 5.2559
  const cold = specificVolume(job.low, saturationPressure(job.low))
  const hot = specificVolume(job.high, saturationPressure(job.high))
  const expansion = job.volume * (hot / cold - 1 - 3 * 11.7e-6 * (job.high - job.low))
  const density = 1 / specificVolume(job.low, saturationPressure(job.low))
  const fill = 4 * 6894.757293168361 + density * 9.80665 * job.height
  const highest = (1 - 0.1) * job.relief
  const first = fill + atmosphere
  const second = highest + atmosphere
  return expansion / (1 - first / second)
}

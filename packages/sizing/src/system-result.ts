import type { Fluid } from '@coldfill/engine'
import type { SystemModel } from '@coldfill/spec'
import { gaugeFromSpec } from './calculate-sections.ts'
import type { PressurePoint, SystemResult, VesselResult } from './result.ts'

const GRAVITY = 9.80665

/** What the drawing of a system's pressures shows. `atmosphere` in Pa abs; heights in m above the vessel connection. */
export const systemResult = (
  system: SystemModel,
  fluid: Fluid,
  vessels: readonly VesselResult[],
  atmosphere: number,
): SystemResult => {
  const set = system.pressure['relief-valve']
  const height = system.pressure['static-height']?.value.value ?? 0
  const reliefHeight = system.pressure['relief-height']?.value.value ?? 0
  const tank = vessels.find((vessel) => vessel.system === system.id && vessel.results['fill-pressure'])
  const fill = tank?.results['fill-pressure']?.value
  const highest = tank?.results['final-pressure']?.value ?? tank?.results['maximum-pressure']?.value
  const fillAt = system.temperatures.fill ?? system.temperatures.low ?? system.temperatures.cold
  const pressures: PressurePoint[] = []
  if (tank && fill !== undefined && highest !== undefined) {
    const rho = fillAt ? fluid.density(fillAt.value.value) : 1000
    const at = (label: string, h: number): PressurePoint => ({
      label,
      height: h,
      cold: fill - rho * GRAVITY * h,
      hot: highest - rho * GRAVITY * h,
    })
    pressures.push(at(tank.mark, 0))
    if (reliefHeight !== 0) pressures.push(at('Relief valve', reliefHeight))
    if (height > 0) pressures.push(at('Highest point', height))
  }
  return {
    id: system.id,
    title: system.title?.value ?? system.id,
    path: system.path,
    service: system.service?.value ?? '',
    fluid: fluid.label,
    pressures,
    relief: set ? { set: gaugeFromSpec(set, atmosphere).value, height: reliefHeight } : null,
  }
}

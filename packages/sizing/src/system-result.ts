import type { Fluid } from '@coldfill/engine'
import type { SystemModel } from '@coldfill/spec'
import { gaugeFromSpec } from './calculate-sections.ts'
import { pressureAt, type PressureModel, pressureWhenRunning } from './pressure-model.ts'
import type { PressurePoint, SystemResult } from './result.ts'

const pointsOf = (
  model: PressureModel,
  places: readonly { readonly label: string; readonly height: number }[],
): readonly PressurePoint[] => {
  const state = model.pump?.moves === 'suction side' ? 'cold' : 'hot'
  return places.map(({ label, height }) => {
    const cold = pressureAt(model, 'cold', height) - model.atmosphere
    const hot = pressureAt(model, 'hot', height) - model.atmosphere
    const running = pressureWhenRunning(model, state, height)
    return running === null
      ? { label, height, cold, hot }
      : { label, height, cold, hot, running: running - model.atmosphere }
  })
}

/**
 * What the drawing of a system's pressures shows, gauge. `held` is the vessel that holds the pressure, with the model that its
 * calculation gives; `atmosphere` in Pa abs; heights in m above the vessel connection.
 */
export const systemResult = (
  system: SystemModel,
  fluid: Fluid,
  held: { readonly mark: string; readonly model: PressureModel } | null,
  atmosphere: number,
): SystemResult => {
  const set = system.pressure['relief-valve']
  const height = system.pressure['static-height']?.value.value ?? 0
  const reliefHeight = system.pressure['relief-height']?.value.value ?? 0
  const places = held && [
    { label: held.mark, height: 0 },
    ...(reliefHeight === 0 ? [] : [{ label: 'Relief valve', height: reliefHeight }]),
    ...(height > 0 ? [{ label: 'Highest point', height }] : []),
  ]
  return {
    id: system.id,
    title: system.title?.value ?? system.id,
    path: system.path,
    service: system.service?.value ?? '',
    fluid: fluid.label,
    pressures: held && places ? pointsOf(held.model, places) : [],
    relief: set ? { set: gaugeFromSpec(set, atmosphere).value, height: reliefHeight } : null,
    ...(held?.model.pump ? { pump: held.model.pump } : {}),
  }
}

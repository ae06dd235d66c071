import type { Fluid } from '@coldfill/engine'
import type { SystemModel } from '@coldfill/spec'
import type { ResultValue } from './result.ts'
import type { VesselContext } from './vessel-context.ts'

const GRAVITY = 9.80665
/** Where no temperature says how cold the water is when it is filled in, kg/m3. */
const PLAIN_WATER = 1000

/**
 * Pressures of one closed system, absolute, in Pa; heights in m above the connection of the vessel. The connection keeps its
 * pressure whether the pump runs or not, so the rest of the system moves by the pump head: up on the discharge side where the
 * vessel stands at the suction, down on the suction side where it stands at the discharge.
 */
export interface PressureModel {
  readonly atmosphere: number
  /** kg/m3, of the fluid as filled. */
  readonly density: number
  /** At the vessel when cold. */
  readonly fill: number
  /** At the vessel when hot: what it comes to with the chosen vessel, or else the highest allowed. */
  readonly highest: number
  /** Head in Pa, and the side whose pressure moves when the pump runs. Null where the spec gives no pump head. */
  readonly pump: { readonly head: number; readonly moves: 'suction side' | 'discharge side' } | null
}

/** Density in kg/m3 of the fluid as it is filled in. */
export const densityAsFilled = (system: SystemModel, fluid: Fluid): number => {
  const { fill, low, cold } = system.temperatures
  const at = fill ?? low ?? cold
  return at ? fluid.density(at.value.value) : PLAIN_WATER
}

/** Pressure in Pa of a column of liquid of that height in m. */
export const column = (density: number, height: number): number => density * GRAVITY * height

const pumpOf = ({ pressure }: SystemModel, density: number): PressureModel['pump'] => {
  const head = pressure['pump-head']
  if (!head) return null
  return {
    head: head.value.kind === 'length' ? column(density, head.value.value) : head.value.value,
    moves: pressure['vessel-connection']?.value === 'pump discharge' ? 'suction side' : 'discharge side',
  }
}

/** The model that the calculation of a vessel gives; null where the vessel holds no system under pressure. `atmosphere` in Pa abs. */
export const pressureModel = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): PressureModel | null => {
  const { calculation, system, fluid } = context
  const fill = results['fill-pressure']?.value
  const highest = (results['final-pressure'] ?? results['maximum-pressure'])?.value
  if (fill === undefined || highest === undefined) return null
  const density = calculation.has('rho_f') ? calculation.value('rho_f') : densityAsFilled(system, fluid)
  return {
    atmosphere,
    density,
    fill: fill + atmosphere,
    highest: highest + atmosphere,
    pump: pumpOf(system, density),
  }
}

/** Pa abs at a height while the pump stands still. */
export const pressureAt = (model: PressureModel, state: 'cold' | 'hot', height: number): number =>
  (state === 'cold' ? model.fill : model.highest) - column(model.density, height)

/** Pa abs at a height, at most or at least, on the side that moves while the pump runs; null where there is no pump. */
export const pressureWhenRunning = (model: PressureModel, state: 'cold' | 'hot', height: number): number | null => {
  const { pump } = model
  if (!pump) return null
  return pressureAt(model, state, height) + (pump.moves === 'suction side' ? -pump.head : pump.head)
}

import { glycolUncertainty, type Method } from '@coldfill/engine'
import type { ResultValue } from '../result.ts'
import type { VesselContext } from '../vessel-context.ts'

/** What the uncertainty of the glycol data means for the size: an upper value beside it, and an assumption that says so. */
export const glycolUpperVolume = (context: VesselContext, method: Method): Record<string, ResultValue> => {
  // Every method of expansion tanks calls its answer V_t, which the upper value starts from.
  if (context.fluid.base === 'water' || method.results['required-volume'] !== 'V_t') return {}
  const { calculation, register, reference } = context
  calculation.section('Uncertainty of the glycol data')
  calculation.run(glycolUncertainty, { u_g: register.number('glycol.expansion-uncertainty', reference) })
  const upper = calculation.entry('V_u')
  return { 'upper-required-volume': { kind: upper.kind, value: upper.value, name: upper.name, entry: upper.id } }
}

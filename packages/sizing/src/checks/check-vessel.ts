import type { Method } from '@coldfill/engine'
import type { ResultValue, SelectedVessel } from '../result.ts'
import { report, type VesselContext } from '../vessel-context.ts'
import { checkCodeMinimum } from './code-minimum.ts'
import { checkDomestic } from './domestic.ts'
import { glycolUpperVolume } from './glycol-uncertainty.ts'
import { checkHydronic } from './hydronic.ts'
import { sayCategory } from './pressure-directive.ts'
import { stampReasons } from './stamp.ts'

const checkStamp = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): void => {
  const fields: Readonly<Record<string, { readonly value: unknown } | undefined>> = context.vessel.fields
  if (fields['stamp'] !== undefined) return
  const reasons = stampReasons(context, results, atmosphere)
  if (reasons.length === 0) return
  report(context, 'CF-E036', {
    message: `${context.vessel.mark} may need the stamp of the pressure vessel code: ${reasons.join(', ')}.`,
    hint: 'Write `stamp: yes`, or `stamp: no` where the authority having jurisdiction exempts it.',
  })
}

/**
 * Raises the checks of a sized vessel and returns results that checks compute beside the method's own. `atmosphere` in Pa abs.
 */
export const checkVessel = (
  context: VesselContext,
  method: Method,
  results: Readonly<Record<string, ResultValue>>,
  construction: string | undefined,
  selected: SelectedVessel | null,
  atmosphere: number,
): Record<string, ResultValue> => {
  checkStamp(context, results, atmosphere)
  sayCategory(context, method, results, selected, atmosphere)
  const { kind } = context.vessel
  if (kind === 'expansion tank') {
    checkHydronic(context, method, results, construction, atmosphere)
    return {
      ...checkCodeMinimum(context, method, results, construction),
      ...glycolUpperVolume(context, method),
    }
  }
  if (kind === 'thermal expansion tank') checkDomestic(context, results, atmosphere)
  return {}
}

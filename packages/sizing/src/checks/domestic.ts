import { adoptsPlumbingCap } from '../adopted-codes.ts'
import { gaugeFromSpec } from '../calculate-sections.ts'
import type { ResultValue } from '../result.ts'
import { report, show, type VesselContext } from '../vessel-context.ts'
import { PSI } from './hydronic.ts'

/** Pressures that a reviewing engineer checks at a thermal expansion tank. `atmosphere` in Pa abs. */
export const checkDomestic = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): void => {
  const { system, spec, vessel } = context
  const { pressure } = system
  if (pressure.maximum && adoptsPlumbingCap(spec) && gaugeFromSpec(pressure.maximum, atmosphere).value > 80.001 * PSI) {
    report(context, 'CF-E055', {
      message: `The maximum of ${pressure.maximum.value.authored ?? 'the vessel'} is above 80 psi, the limit of the adopted plumbing code with thermal expansion.`,
      hint: 'Lower `maximum` to 80 psi; the vessel was sized to the lower limit.',
      at: pressure.maximum,
    })
  }
  const incoming = results['fill-pressure']?.value
  const own = 'precharge' in vessel.fields ? vessel.fields.precharge : undefined
  const charge = results['precharge']?.value
  if (own && incoming !== undefined) {
    const written = gaugeFromSpec(own, atmosphere).value
    if (Math.abs(written - incoming) > 0.05 * PSI) {
      report(context, 'CF-E040', {
        message: `${vessel.mark} is charged to ${show(context, 'gauge pressure', written)}, but the incoming pressure is ${show(context, 'gauge pressure', incoming)}.`,
        hint: 'Charge the vessel to the incoming pressure, with the system empty, or accept this with a reason.',
        at: own,
      })
    }
  }
  if (charge !== undefined && Math.abs(charge - 40 * PSI) > 2 * PSI) {
    report(context, 'CF-E048', {
      message: `${vessel.mark} has to be charged to ${show(context, 'gauge pressure', charge)} on site; a vessel for drinking water usually comes with about 40 psi (276 kPa).`,
      hint: 'Isolate, depressurise and drain the vessel before its charge is read or changed.',
    })
  }
}

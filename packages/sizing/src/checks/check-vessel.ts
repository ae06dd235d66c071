import type { Method } from '@coldfill/engine'
import { saturationPressure } from '@coldfill/engine'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import { adoptsPlumbingCap } from '../adopted-codes.ts'
import { gaugeFromSpec } from '../calculate-sections.ts'
import type { ResultValue } from '../result.ts'
import { report, type VesselContext } from '../vessel-context.ts'
import { checkCodeMinimum } from './code-minimum.ts'

const PSI = 6894.757293168361

const units = (context: VesselContext): UnitSystem => context.spec.project.units?.value ?? 'US'

/** Pressures that a reviewing engineer checks on a closed hydronic system. */
const checkHydronic = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): void => {
  const { system, vessel, calculation } = context
  const { pressure, temperatures } = system
  const show = (kind: 'gauge pressure' | 'pressure difference', value: number) =>
    formatQuantity({ kind, value }, units(context))
  const fill = results['fill-pressure']?.value
  const charge = results['precharge']?.value
  const own = 'precharge' in vessel.fields ? vessel.fields.precharge : undefined
  if (own && fill !== undefined && charge !== undefined && Math.abs(charge - fill) > 0.05 * PSI) {
    report(context, 'CF-E040', {
      message: `${vessel.mark} is charged to ${show('gauge pressure', charge)}, but the fill pressure is ${show('gauge pressure', fill)}.`,
      hint: 'Set the precharge to the fill pressure, or accept this with a reason.',
      at: own,
    })
  }
  const height = pressure['static-height']?.value.value
  const density = calculation.has('rho_f') ? calculation.value('rho_f') : undefined
  const head = calculation.has('dp_p') ? calculation.value('dp_p') : 0
  if (fill !== undefined && height !== undefined) {
    const rho = density ?? 1000
    const top = fill - head - rho * 9.80665 * height
    const margin = pressure['top-margin']
    if (top < 3.999 * PSI && (pressure.fill || margin)) {
      report(context, 'CF-E041', {
        message: `When cold, ${show('gauge pressure', top)} is left at the highest point; 4 psi (0.3 bar) or more is usual.`,
        hint: 'Raise the fill pressure or `top-margin`.',
        at: pressure.fill ?? margin,
      })
    }
    const high = temperatures.high
    if (high && high.value.value > 373.15) {
      const vapour = saturationPressure(high.value.value)
      if (top + atmosphere < vapour) {
        report(context, 'CF-E042', {
          message: `At ${high.value.authored ?? 'the highest temperature'} water boils at ${show('gauge pressure', vapour - atmosphere)}; the highest point has ${show('gauge pressure', top)} when cold.`,
          hint: 'Raise `top-margin` by the vapour pressure, or lower `temperatures.high`.',
          at: high,
        })
      }
    }
  }
  const connection = pressure['vessel-connection']
  if (connection?.value === 'pump discharge') {
    report(context, 'CF-E043', {
      message: `${vessel.mark} is connected at the pump discharge: the pump head is added to its fill pressure, and the suction side falls by it when the pump runs against a closed valve.`,
      hint: 'Connect the vessel at the pump suction where it can be done.',
      at: connection,
    })
  }
  const relief = pressure['relief-valve']
  const maximum = pressure.maximum
  if (relief && maximum) {
    const set = gaugeFromSpec(relief, atmosphere).value
    const given = gaugeFromSpec(maximum, atmosphere).value
    const lift = density === undefined ? 0 : density * 9.80665 * (pressure['relief-height']?.value.value ?? 0)
    if (given > 0.9 * set + lift + 1) {
      report(context, 'CF-E044', {
        message: `The maximum of ${show('gauge pressure', given)} is above 0.9 of the relief valve setting of ${show('gauge pressure', set)}.`,
        hint: 'Lower `maximum`, or raise the relief valve setting within the rating of the equipment.',
        at: maximum,
        related: [{ message: 'The relief valve is set here.', path: relief.path, range: relief.range }],
      })
    }
  }
}

/** Pressures and temperatures that a reviewing engineer checks on a domestic system. */
const checkDomestic = (context: VesselContext, atmosphere: number): void => {
  const { system, spec } = context
  const { pressure } = system
  if (pressure.maximum && adoptsPlumbingCap(spec) && gaugeFromSpec(pressure.maximum, atmosphere).value > 80.001 * PSI) {
    report(context, 'CF-E055', {
      message: `The maximum of ${pressure.maximum.value.authored ?? 'the vessel'} is above 80 psi, the limit of the adopted plumbing code with thermal expansion.`,
      hint: 'Lower `maximum` to 80 psi; the vessel was sized to the lower limit.',
      at: pressure.maximum,
    })
  }
}

const checkFreezing = (context: VesselContext): void => {
  const low = context.system.temperatures.low
  if (!low || context.fluid.base === 'water') return
  if (low.value.value > context.fluid.freezing) return
  report(context, 'CF-E060', {
    message: `${low.value.authored ?? 'The lowest temperature'} is at or below the freezing point of ${context.fluid.label}.`,
    hint: 'Raise the strength of the solution or the lowest temperature.',
    at: low,
  })
}

/** Raises the checks of a sized vessel and returns results that checks compute beside the method's own. */
export const checkVessel = (
  context: VesselContext,
  method: Method,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): Record<string, ResultValue> => {
  checkFreezing(context)
  if (context.vessel.kind === 'expansion tank') {
    checkHydronic(context, results, atmosphere)
    return checkCodeMinimum(context, method, results)
  }
  if (context.vessel.kind === 'thermal expansion tank') checkDomestic(context, atmosphere)
  return {}
}

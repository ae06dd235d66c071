import { ashraeExpansionCheck, type Method, saturationPressure } from '@coldfill/engine'
import { gaugeFromSpec } from '../calculate-sections.ts'
import { column, pressureAt, type PressureModel, pressureModel, pressureWhenRunning } from '../pressure-model.ts'
import type { ResultValue } from '../result.ts'
import { report, show, type VesselContext } from '../vessel-context.ts'

export const PSI = 6894.757293168361
const BOILING = 373.15
/** 30 °C: warmer than any chilled supply, cooler than a plant room in a shutdown. */
const WARM = 303.15
/** 70 °C, EN 13831 (from memory). */
const MEMBRANE = 343.15
/** 240 °F, common practice, no source. */
const USUAL_RATING = (240 + 459.67) / 1.8

type Results = Readonly<Record<string, ResultValue>>

/** A charge that is written and is not the fill pressure; or the word that the factory charge must be changed. */
const checkCharge = (context: VesselContext, results: Results, atmosphere: number): void => {
  const { vessel } = context
  const fill = results['fill-pressure']?.value
  const charge = results['precharge']?.value
  const own = 'precharge' in vessel.fields ? vessel.fields.precharge : undefined
  if (own && fill !== undefined) {
    const written = gaugeFromSpec(own, atmosphere).value
    // A European method keeps a reserve: its fill lies above the charge by design.
    const byDesign = results['water-reserve'] !== undefined
    if (!byDesign && Math.abs(written - fill) > 0.05 * PSI) {
      report(context, 'CF-E040', {
        message: `${vessel.mark} is charged to ${show(context, 'gauge pressure', written)}, but the fill pressure is ${show(context, 'gauge pressure', fill)}.`,
        hint: 'Set the precharge to the fill pressure, or accept this with a reason.',
        at: own,
      })
    }
  }
  if (charge !== undefined && Math.abs(charge - 12 * PSI) > 1 * PSI) {
    report(context, 'CF-E048', {
      message: `${vessel.mark} has to be charged to ${show(context, 'gauge pressure', charge)} on site; a vessel for heating usually comes with about 12 psi (83 kPa).`,
      hint: 'Isolate, depressurise and drain the vessel before its charge is read or changed.',
    })
  }
}

const checkTop = (context: VesselContext, model: PressureModel): void => {
  const { pressure, temperatures } = context.system
  const { atmosphere } = model
  const height = pressure['static-height']?.value.value
  if (height === undefined) return
  // A fill pressure that the program chose covers the head of a pump before the vessel; one given outright is checked by itself.
  const covered = !pressure.fill && model.pump?.moves === 'suction side'
  const lowest = covered ? pressureWhenRunning(model, 'cold', height) : null
  const top = (lowest ?? pressureAt(model, 'cold', height)) - atmosphere
  const margin = pressure['top-margin']
  if (top < -1) {
    report(context, 'CF-E046', {
      message: `When cold, the highest point stands at ${show(context, 'gauge pressure', top)}, below atmosphere.`,
      hint: 'Raise the fill pressure, or correct the static height.',
      at: pressure.fill ?? margin ?? pressure['static-height'],
    })
  } else if (top < 3.999 * PSI && (pressure.fill || margin)) {
    report(context, 'CF-E041', {
      message: `When cold, ${show(context, 'gauge pressure', top)} is left at the highest point; 4 psi (0.3 bar) or more is usual.`,
      hint: 'Raise the fill pressure or `top-margin`.',
      at: pressure.fill ?? margin,
    })
  }
  const { high } = temperatures
  if (!high || high.value.value <= BOILING) return
  const vapour = saturationPressure(high.value.value)
  if (top + atmosphere >= vapour) return
  report(context, 'CF-E042', {
    message: `At ${high.value.authored ?? 'the highest temperature'} water boils at ${show(context, 'gauge pressure', vapour - atmosphere)}; the highest point has ${show(context, 'gauge pressure', top)} when cold.`,
    hint: 'Raise `top-margin` by the vapour pressure, or lower `temperatures.high`.',
    at: high,
  })
}

const checkRelief = (context: VesselContext, model: PressureModel): void => {
  const { atmosphere } = model
  const { pressure } = context.system
  const { maximum } = pressure
  const relief = pressure['relief-valve']
  if (!maximum) return
  if (!relief) {
    report(context, 'CF-E049', {
      message: 'The maximum pressure is given and no relief valve.',
      hint: 'Give `relief-valve`, so that the margin below it can be checked.',
      at: maximum,
    })
    return
  }
  const set = gaugeFromSpec(relief, atmosphere).value
  const given = gaugeFromSpec(maximum, atmosphere).value
  const lift = column(model.density, pressure['relief-height']?.value.value ?? 0)
  if (given <= 0.9 * set + lift + 1) return
  report(context, 'CF-E044', {
    message: `The maximum of ${show(context, 'gauge pressure', given)} is above 0.9 of the relief valve setting of ${show(context, 'gauge pressure', set)}.`,
    hint: 'Lower `maximum`, or raise the relief valve setting within the rating of the equipment.',
    at: maximum,
    related: [{ message: 'The relief valve is set here.', path: relief.path, range: relief.range }],
  })
}

const checkTemperatures = (context: VesselContext, method: Method, construction: string | undefined): void => {
  const { system, vessel } = context
  const { high } = system.temperatures
  const service = system.service?.value
  if (high && (service === 'chilled water' || service === 'condenser water') && high.value.value < WARM) {
    report(context, 'CF-E015', {
      message: `${high.value.authored ?? 'The highest temperature'} is given as the hottest a ${service} loop gets; in a shutdown it warms to the plant room.`,
      hint: 'Give 35 to 40 °C (95 to 104 °F), or accept this with a reason.',
      at: high,
    })
  }
  const membrane = construction === 'diaphragm' || construction === 'bladder'
  const european = method.product === 'EN 13831'
  if (membrane && high && high.value.value > (european ? MEMBRANE : USUAL_RATING) + 0.01) {
    const limit = european ? 'the 70 °C that membranes stand for long' : 'the 240 °F at which usual ratings end'
    report(context, 'CF-E047', {
      message: `${vessel.mark}: ${high.value.authored ?? 'the highest temperature'} is above ${limit}.`,
      hint: 'Connect it in the return or with an intermediate vessel, or check the rating.',
    })
  }
}

const checkGlycol = (context: VesselContext): void => {
  const { fluid, system, vessel } = context
  if (fluid.base === 'water') return
  const { low, high } = system.temperatures
  if (low && low.value.value <= fluid.freezing) {
    report(context, 'CF-E060', {
      message: `${low.value.authored ?? 'The lowest temperature'} is at or below the freezing point of ${fluid.label}, ${show(context, 'temperature', fluid.freezing)}.`,
      hint: 'Raise the strength of the solution or the lowest temperature.',
      at: low,
    })
  }
  const second = low && high && ashraeExpansionCheck(fluid, low.value.value, high.value.value)
  if (second && low && high) {
    const used = fluid.density(low.value.value) / fluid.density(high.value.value) - 1
    report(context, 'CF-E062', {
      message: `${vessel.mark}: ${fluid.label} expands by ${(used * 100).toFixed(2)} % here; the second table has ${(second.ratio * 100).toFixed(2)} %. The size is uncertain in the same proportion, about ten per cent.`,
      hint: '',
    })
  }
}

/** What is left at the pump suction when the pump runs, where the vessel stands at its discharge and the fill is given. */
const checkSuction = (context: VesselContext, model: PressureModel): void => {
  const { pressure } = context.system
  const head = pressure['pump-head']
  if (model.pump?.moves !== 'suction side' || !pressure.fill || !head) return
  const below = (height: number): number => (pressureWhenRunning(model, 'cold', height) ?? Infinity) - model.atmosphere
  const suction = below(0)
  const top = below(pressure['static-height']?.value.value ?? 0)
  if (Math.min(suction, top) >= 0) return
  const where =
    suction < 0
      ? `the suction falls by ${show(context, 'pressure difference', model.pump.head)} to ${show(context, 'gauge pressure', suction)}`
      : `the highest point, where it lies on the suction side, falls to as little as ${show(context, 'gauge pressure', top)}`
  report(context, 'CF-E057', {
    ...(suction < 0 ? {} : { severity: 'warning' as const }),
    message: `With ${context.vessel.mark} at the pump discharge, ${where} when the pump runs.`,
    hint: 'Connect the vessel at the pump suction, or raise the fill pressure by the pump head.',
    at: pressure['vessel-connection'],
    related: [{ message: 'The pump head is given here.', path: head.path, range: head.range }],
  })
}

/** What a relief valve would stand at on the discharge side while the pump runs, where the vessel stands at its suction. */
const checkDischarge = (context: VesselContext, model: PressureModel): void => {
  const { pressure } = context.system
  const relief = pressure['relief-valve']
  const head = pressure['pump-head']
  if (model.pump?.moves !== 'discharge side' || !relief || !head) return
  const height = pressure['relief-height']?.value.value ?? 0
  const highest = (pressureWhenRunning(model, 'hot', height) ?? 0) - model.atmosphere
  const set = gaugeFromSpec(relief, model.atmosphere).value
  if (highest <= set) return
  report(context, 'CF-E059', {
    message: `Hot and with the pump on, the discharge side reaches ${show(context, 'gauge pressure', highest)} at the height of the relief valve, which is set to ${show(context, 'gauge pressure', set)}.`,
    hint: 'Make sure that the relief valve stands on the suction side, with the vessel.',
    at: head,
    related: [{ message: 'The relief valve is set here.', path: relief.path, range: relief.range }],
  })
}

/** Pressures, temperatures and fluid that a reviewing engineer checks at an expansion tank. */
export const checkHydronic = (
  context: VesselContext,
  method: Method,
  results: Results,
  construction: string | undefined,
  atmosphere: number,
): void => {
  const { system, vessel } = context
  const model = pressureModel(context, results, atmosphere)
  checkCharge(context, results, atmosphere)
  if (model) {
    checkTop(context, model)
    checkRelief(context, model)
    checkSuction(context, model)
    checkDischarge(context, model)
  }
  checkTemperatures(context, method, construction)
  checkGlycol(context)
  const connection = system.pressure['vessel-connection']
  if (connection?.value === 'pump discharge') {
    report(context, 'CF-E043', {
      message: `${vessel.mark} is connected at the pump discharge: the connection keeps its pressure, and the suction side falls by the pump head when the pump runs.`,
      hint: 'Connect the vessel at the pump suction where it can be done.',
      at: connection,
    })
  }
}

/** Said once a system: a glycol loop is not made up from the domestic water. */
export const glycolMakeUp =
  'A glycol loop is made up from a feeder or by hand, never through a permanent connection to the domestic water.'

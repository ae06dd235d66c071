import { codeMinimumCheck, type Method, site } from '@coldfill/engine'
import { adoptsCodeMinimum } from '../adopted-codes.ts'
import type { ResultValue } from '../result.ts'
import { fromSpec, report, show, type VesselContext } from '../vessel-context.ts'

/** The least volume of the adopted mechanical code beside a heating vessel that another method sized. */
export const checkCodeMinimum = (
  context: VesselContext,
  method: Method,
  results: Readonly<Record<string, ResultValue>>,
  construction: string | undefined,
): Record<string, ResultValue> => {
  const { calculation, vessel, system, spec } = context
  const required = results['required-volume']
  const fill = method.results['fill-pressure']
  const highest = method.results['maximum-pressure']
  const heats = system.service?.value === 'heating water' || system.service?.value === 'dual temperature water'
  if (!heats || !adoptsCodeMinimum(spec) || method.vessel?.method === 'code minimum') return {}
  const { average, high } = system.temperatures
  const temperature = average ?? high
  if (!required || fill === undefined || highest === undefined || !temperature) return {}
  calculation.section('Check against the code minimum')
  if (!calculation.has('P_a')) {
    const { elevation } = spec.project
    calculation.run(site, {
      Z: elevation ? fromSpec(elevation) : context.register.number('elevation', context.reference),
    })
  }
  if (!average) context.register.words('average-temperature', context.reference)
  const check = codeMinimumCheck(fill, highest, construction === 'plain steel' ? 'plain steel' : 'charged')
  const outcome = calculation.run(check, { t_k: fromSpec(temperature) })
  const entry = calculation.entry('V_k')
  if (outcome.warnings.length > 0) {
    report(context, 'CF-E013', {
      severity: 'note',
      message: `${vessel.mark}: the code equation is stated for 160 to 280 °F and this system is outside it; the minimum of ${show(context, 'volume', entry.value)} is shown all the same.`,
      hint: 'Ask the authority having jurisdiction which minimum it applies.',
    })
  }
  if (required.value < entry.value) {
    report(context, 'CF-E045', {
      message: `${vessel.mark} needs ${show(context, 'volume', required.value)}, but the minimum of the adopted mechanical code is ${show(context, 'volume', entry.value)}.`,
      hint: `Schedule at least ${show(context, 'volume', entry.value)}.`,
    })
  }
  return { 'code-minimum-volume': { kind: 'volume', value: entry.value, name: entry.name, entry: entry.id } }
}

import { cite, citeFromMemory, type Method, sources } from '@coldfill/engine'
import { formatQuantity } from '@coldfill/units'
import { adoptsCodeMinimum } from '../adopted-codes.ts'
import type { ResultValue } from '../result.ts'
import { fromSpec, report, type VesselContext } from '../vessel-context.ts'

const source = (id: string) => {
  const found = sources[id]
  if (!found) throw new Error(`no source ${id}`)
  return found
}

const equation = citeFromMemory(source('imc'), '1009.2 (UMC 1004.4 and ASME IV HG-709 have the same equation)')
const gasLaw = cite(source('boyle'), 'numerator of the code equation for a charged vessel')

/**
 * The least volume of the adopted mechanical code beside a heating vessel that another method sized. Pressures are those
 * of the method, absolute at the site.
 */
export const checkCodeMinimum = (
  context: VesselContext,
  method: Method,
  results: Readonly<Record<string, ResultValue>>,
  construction: string | undefined,
): Record<string, ResultValue> => {
  const { calculation, vessel, system, spec } = context
  const required = results['required-volume']
  const fill = method.results['fill-pressure'] ?? method.results['precharge']
  const highest = method.results['maximum-pressure']
  const heats = system.service?.value === 'heating water' || system.service?.value === 'dual temperature water'
  if (!heats || !adoptsCodeMinimum(spec) || method.vessel?.method === 'code minimum') return {}
  if (!required || !fill || !highest) return {}
  calculation.section('Check against the code minimum')
  if (!calculation.has('P_a')) {
    const elevation = spec.project.elevation
    const Z = elevation ? fromSpec(elevation) : context.register.number('elevation', context.reference)
    calculation.input('Z', 'length', 'elevation', Z)
  }
  const { average, high } = system.temperatures
  const t = average ?? high
  if (!t) return {}
  if (!average) context.register.words('average-temperature', context.reference)
  calculation.input('t_k', 'temperature', 'average operating temperature', fromSpec(t))
  const plain = construction === 'plain steel'
  const pressures = {
    ...(calculation.has('P_a')
      ? {}
      : {
          P_a: {
            kind: 'absolute pressure' as const,
            name: 'atmospheric pressure',
            formula: '14.696[psia] * (1 - 6.8754e-6 * (Z / 1[ft])) ^ 5.2559',
            source: citeFromMemory(source('ashrae-fundamentals'), 'psychrometrics, standard atmosphere'),
          },
        }),
    P_kf: {
      kind: 'absolute pressure' as const,
      name: 'absolute fill pressure',
      formula: `absolute(${fill}, P_a)`,
      source: gasLaw,
    },
    P_ko: {
      kind: 'absolute pressure' as const,
      name: 'absolute highest pressure',
      formula: `absolute(${highest}, P_a)`,
      source: gasLaw,
    },
  }
  const outcome = calculation.run(
    {
      id: 'check.code-minimum',
      revision: 1,
      title: 'Code minimum',
      inputs: {},
      steps: {
        ...pressures,
        E_k: {
          kind: 'ratio',
          name: 'expansion by the code equation',
          formula: 'max(0, 0.00041 * fahrenheit(t_k) - 0.0466)',
          source: equation,
        },
        V_k: {
          kind: 'volume',
          name: 'code minimum volume',
          formula: plain ? 'E_k * V_s / (P_a / P_kf - P_a / P_ko)' : 'E_k * V_s / (1 - P_kf / P_ko)',
          source: plain ? equation : gasLaw,
        },
      },
      checks: [],
      validity: [
        { condition: 'fahrenheit(t_k) >= 159.999', source: equation, message: '' },
        { condition: 'fahrenheit(t_k) <= 280.001', source: equation, message: '' },
      ],
      results: {},
      basis: '',
      examples: [],
    },
    {},
  )
  const entry = calculation.entry('V_k')
  const units = spec.project.units?.value ?? 'US'
  const show = (value: number) => formatQuantity({ kind: 'volume', value }, units)
  if (outcome.warnings.length > 0) {
    report(context, 'CF-E013', {
      severity: 'note',
      message: `${vessel.mark}: the code equation is stated for 160 to 280 °F and this system is outside it; the minimum of ${show(entry.value)} is shown all the same.`,
      hint: 'Ask the authority having jurisdiction which minimum it applies.',
    })
  }
  if (required.value < entry.value) {
    report(context, 'CF-E045', {
      message: `${vessel.mark} needs ${show(required.value)}, but the minimum of the adopted mechanical code is ${show(entry.value)}.`,
      hint: `Schedule at least ${show(entry.value)}.`,
    })
  }
  return { 'code-minimum-volume': { kind: 'volume', value: entry.value, name: entry.name, entry: entry.id } }
}

import type { GivenValue, Method, MethodInput } from '@coldfill/engine'
import type { Located } from '@coldfill/spec'
import type { Quantity } from '@coldfill/units'
import { gaugeFromSpec } from './calculate-sections.ts'
import { fromSpec, numberFromSpec, type VesselContext } from './vessel-context.ts'

type Written = Located<Quantity> | Located<number> | undefined

const written = (
  context: VesselContext,
  at: 'project' | 'vessel' | 'temperatures' | 'pressure' | 'demand',
  key: string,
): Written => {
  const { spec, system, vessel } = context
  const fields: Readonly<Record<string, unknown>> =
    at === 'project'
      ? spec.project
      : at === 'vessel'
        ? vessel.fields
        : at === 'demand'
          ? { ...system.demand }
          : system[at]
  return fields[key] as Written
}

const isQuantity = (value: Located<Quantity> | Located<number>): value is Located<Quantity> =>
  typeof value.value === 'object'

const place = {
  project: 'project.',
  vessel: '',
  temperatures: 'temperatures.',
  pressure: 'pressure.',
  demand: 'demand.',
}

const bindOne = (context: VesselContext, input: MethodInput, atmosphere: number): GivenValue | null => {
  const { from, name } = input
  if (from.at === 'section') throw new Error(`no section gave ${name}`)
  if (from.at === 'fluid') {
    const path = context.system.fluid?.path ?? context.system.path
    return { value: context.fluid.volumeFraction, origin: { from: 'spec', path } }
  }
  if (from.at === 'assumption') return context.register.number(from.id, context.reference)
  let value = written(context, from.at, from.key)
  if (!value && from.standIn !== undefined && from.assumption !== undefined) {
    value = written(context, from.at, from.standIn)
    if (value) context.register.words(from.assumption, context.reference)
  }
  if (value) {
    if (!isQuantity(value)) return numberFromSpec(value)
    return input.kind === 'gauge pressure' ? gaugeFromSpec(value, atmosphere) : fromSpec(value)
  }
  if (from.assumption !== undefined) return context.register.number(from.assumption, context.reference)
  context.missing.push(`\`${place[from.at]}${from.key}\`, the ${name}`)
  return null
}

/** Values for the inputs of a method that its sections have not given, from the spec or from assumptions. */
export const bindInputs = (context: VesselContext, method: Method, atmosphere: number): Record<string, GivenValue> => {
  const given: Record<string, GivenValue> = {}
  for (const [symbol, input] of Object.entries(method.inputs)) {
    if (context.calculation.has(symbol)) continue
    const value = bindOne(context, input, atmosphere)
    if (value) given[symbol] = value
  }
  return given
}

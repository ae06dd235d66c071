import { assumptions, type Method, methodNames, methodsFor } from '@coldfill/engine'
import { namesMaterials } from './calculate-sections.ts'
import type { VesselContext } from './vessel-context.ts'

export interface MethodChoice {
  /** As a spec names it. */
  readonly name: string
  readonly construction?: string
  /** Null where no form of the method fits the vessel. */
  readonly method: Method | null
}

/** Id of the assumption that stands in for the method of a kind of vessel. */
export const assumptionForMethod = (kind: string): string => `method.${kind.replaceAll(' ', '-')}`

const written = (fields: Readonly<Record<string, unknown>>, key: string): string | undefined => {
  const located = fields[key] as { readonly value: unknown } | undefined
  return typeof located?.value === 'string' ? located.value : undefined
}

const fits = (context: VesselContext, method: Method, construction: string | undefined): boolean => {
  const when = method.vessel?.when
  if (!when) return true
  const fields: Readonly<Record<string, unknown>> = context.vessel.fields
  if (when.construction && !when.construction.includes(construction ?? '')) return false
  if (when.written && !when.written.every((key) => fields[key] !== undefined)) return false
  if (when.chosen && !Object.entries(when.chosen).every(([key, words]) => words.includes(written(fields, key) ?? '')))
    return false
  if (when.materials && !namesMaterials(context)) return false
  if (when.glycol && context.fluid.base === 'water') return false
  return true
}

/** The method whose keys the vessel has, where it names none. */
const impliedMethod = ({ vessel }: VesselContext): string | undefined => {
  const fields: Readonly<Record<string, unknown>> = vessel.fields
  return methodNames(vessel.kind).find((name) =>
    methodsFor(vessel.kind, name).some((method) => method.vessel?.impliedBy?.every((key) => fields[key] !== undefined)),
  )
}

/** The method that sizes the vessel: as written, or the documented default of its kind. */
export const chooseMethod = (context: VesselContext): MethodChoice => {
  const { vessel, register, reference } = context
  const byDefault = assumptions[assumptionForMethod(vessel.kind)]
  const name =
    written(vessel.fields, 'method') ??
    impliedMethod(context) ??
    (byDefault ? register.words(byDefault.id, reference) : (methodNames(vessel.kind)[0] ?? ''))
  const candidates = methodsFor(vessel.kind, name)
  const asksConstruction = candidates.some((candidate) => candidate.vessel?.when?.construction)
  const construction =
    written(vessel.fields, 'construction') ?? (asksConstruction ? register.words('construction', reference) : undefined)
  const method = candidates.find((candidate) => fits(context, candidate, construction)) ?? null
  return construction === undefined ? { name, method } : { name, construction, method }
}

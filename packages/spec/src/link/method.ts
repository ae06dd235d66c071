import type { VesselKind } from '../model/vessel.ts'
import { vesselKinds } from '../model/vessel.ts'
import { choiceHint } from '../read/choice.ts'
import type { Context } from '../read/context.ts'
import type { At } from '../report.ts'

/** Methods of a kind with a line each: those that this version offers. */
export const methodsOf = (context: Context, kind: VesselKind): Readonly<Record<string, string>> =>
  context.vocabulary.methods[kind] ?? {}

/** Whether this version sizes by the method. */
export const linkMethod = (context: Context, at: At, kind: VesselKind, method: string): boolean => {
  const offered = Object.keys(methodsOf(context, kind))
  if (offered.includes(method)) return true
  const { fields } = vesselKinds[kind]
  const known = 'method' in fields && Object.hasOwn(fields.method.choices, method)
  context.report.add('CF-S022', at, {
    message: known
      ? `This version does not size ${kind}s by \`${method}\` yet.`
      : `There is no method \`${method}\` for ${kind}s.`,
    ...choiceHint(at, method, offered),
  })
  return false
}

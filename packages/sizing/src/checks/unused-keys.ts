import type { Method, SectionId } from '@coldfill/engine'
import type { Located } from '@coldfill/spec'
import { report, type VesselContext } from '../vessel-context.ts'

/** Keys that every vessel may have, whatever its method. */
const ALWAYS = ['quantity', 'serves', 'location', 'note', 'mounting', 'stamp', 'method', 'construction']

const KEYS_OF_SECTION: Partial<Record<SectionId, readonly string[]>> = {
  material: ['material'],
  contents: ['material'],
  'handbook pressures': ['relief-margin'],
  'european pressures': ['precharge'],
  'british pressures': ['precharge', 'relief-margin'],
  'domestic pressures': ['relief-margin'],
  people: ['demand-level', 'peak-time'],
  'units served': ['units-served'],
}

/** Warns of keys that are written and play no part in the method that sizes the vessel. */
export const checkUnusedKeys = (context: VesselContext, method: Method): void => {
  const used = new Set(ALWAYS)
  for (const { from } of Object.values(method.inputs)) if (from.at === 'vessel') used.add(from.key)
  for (const key of method.vessel?.when?.written ?? []) used.add(key)
  for (const key of Object.keys(method.vessel?.when?.chosen ?? {})) used.add(key)
  for (const section of method.sections ?? []) for (const key of KEYS_OF_SECTION[section] ?? []) used.add(key)
  const fields: Readonly<Record<string, Located<unknown> | undefined>> = context.vessel.fields
  for (const [key, located] of Object.entries(fields)) {
    if (!located || used.has(key)) continue
    report(context, 'CF-E016', {
      message: `\`${key}\` plays no part in the method of ${context.vessel.mark}, ${method.title}.`,
      hint: 'Remove the key, or choose the method that uses it.',
      at: located,
    })
  }
}

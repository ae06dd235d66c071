import { z } from 'zod'
import { Person } from './people.ts'

/** GET and PUT /api/projects/:project/spec */
export const SpecDocument = z.object({
  text: z.string(),
  /** Rises by one with each save. */
  version: z.number().int(),
  savedAt: z.string(),
  savedBy: Person,
  /** Why this person may not save; null where they may. */
  readOnly: z.object({ reason: z.string() }).nullable(),
})
export type SpecDocument = z.infer<typeof SpecDocument>

export const SaveSpecRequest = z.strictObject({
  text: z.string(),
  /** Version the text was made from. Another one on the server answers 409 version_conflict. */
  baseVersion: z.number().int().nonnegative(),
})
export type SaveSpecRequest = z.infer<typeof SaveSpecRequest>

/** `current` of the 409 version_conflict problem. */
export const SpecConflict = SpecDocument.omit({ readOnly: true })
export type SpecConflict = z.infer<typeof SpecConflict>

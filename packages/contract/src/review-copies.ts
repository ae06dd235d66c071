import { z } from 'zod'

/** A review copy: the submittal with the redlines of one moment as comments of a word processor. */
export const ReviewCopy = z.object({
  state: z.enum(['preparing', 'ready', 'failed']),
  /** The redlines are those of this moment. */
  askedAt: z.string(),
  askedBy: z.string(),
  /** Why it could not be made. Asking again tries once more. */
  problem: z.string().nullable(),
  file: z
    .object({
      name: z.string(),
      size: z.number().int(),
      sha256: z.string(),
      /** How many redlines stand in it. */
      redlines: z.number().int(),
      href: z.string(),
    })
    .nullable(),
})
export type ReviewCopy = z.infer<typeof ReviewCopy>

/** GET and POST /api/projects/:project/revisions/:rev/review-copy; null where none was asked for. */
export const ReviewCopyAnswer = z.object({ copy: ReviewCopy.nullable() })
export type ReviewCopyAnswer = z.infer<typeof ReviewCopyAnswer>

import { z } from 'zod'
import { ProjectResult } from './sizing.ts'

/** One result of a vessel that differs from the earlier revision. Values in the SI unit of `kind`; null: not there. */
export const ChangedResult = z.object({
  system: z.string(),
  mark: z.string(),
  /** Name of the result, as `required-volume`; `status` and `selected` carry words instead of numbers. */
  key: z.string(),
  name: z.string(),
  kind: z.string(),
  was: z.union([z.number(), z.string()]).nullable(),
  now: z.union([z.number(), z.string()]).nullable(),
})
export type ChangedResult = z.infer<typeof ChangedResult>

/** GET /api/projects/:project/results?rev= */
export const Results = z.object({
  /** Label of the frozen revision ('' is the first issue); null for the working copy. */
  revision: z.string().nullable(),
  contentHash: z.string(),
  result: ProjectResult,
  /** Who put a value in the place of an assumption, and when; those alone that are known. */
  assumptionChanges: z.array(z.object({ assumption: z.string(), by: z.string(), at: z.string() })),
  /** Against the revision before this one; null where there is none. */
  changedSince: z.object({ revision: z.string(), vessels: z.array(ChangedResult) }).nullable(),
})
export type Results = z.infer<typeof Results>

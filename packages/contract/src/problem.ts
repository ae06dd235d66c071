import { z } from 'zod'

/** One thing that is wrong with a request: `pointer` into the JSON body, a place in the spec text (1-based), or line and column heading of a table. */
export const ProblemIssue = z.object({
  pointer: z.string().optional(),
  line: z.number().optional(),
  col: z.number().optional(),
  column: z.string().optional(),
  code: z.string().optional(),
  message: z.string(),
})
export type ProblemIssue = z.infer<typeof ProblemIssue>

/** Body of every error answer (RFC 9457, application/problem+json). `code` is stable; `detail` is for people. */
export const Problem = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string(),
  /** Id of the request, which the log of the server names too. */
  instance: z.string(),
  code: z.string(),
  errors: z.array(ProblemIssue).optional(),
  /** True where the same request may succeed later. */
  retryable: z.boolean().optional(),
})
export type Problem = z.infer<typeof Problem>

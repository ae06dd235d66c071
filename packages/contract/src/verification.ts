import { z } from 'zod'

/** One figure of the verification manual. Values as text carry their unit; numbers are in the SI unit of `kind`. */
export const VerificationFigure = z.object({
  id: z.string(),
  title: z.string(),
  /** What the figure is: "required volume". */
  what: z.string(),
  kind: z.string(),
  /** As printed, and what the program gives in the same unit; empty where a mistake has no figure. */
  expected: z.string(),
  computed: z.string(),
  /** computed / expected − 1 */
  deviation: z.number().nullable(),
  /** Relative. */
  tolerance: z.number(),
  /** Why the tolerance is what it is. */
  because: z.string(),
  verdict: z.enum(['holds', 'fails', 'known wrong']),
  /** Why a printed figure is wrong. */
  reason: z.string().optional(),
  /** `published`: read on a page; `derived`: evaluated from the published equation apart from the program. */
  origin: z.enum(['published', 'from memory', 'by hand', 'derived']),
})
export type VerificationFigure = z.infer<typeof VerificationFigure>

/** GET /api/verification */
export const Verification = z.object({
  engine: z.string(),
  counts: z.object({ holds: z.number(), fails: z.number(), knownWrong: z.number() }),
  /** In the order of the manual: figures of publications, then the worked examples of the methods. */
  groups: z.array(
    z.object({
      part: z.enum(['published cases', 'worked examples']),
      source: z.string(),
      figures: z.array(VerificationFigure),
    }),
  ),
  /** Known cases that are not run, and why. */
  notRun: z.array(z.object({ id: z.string(), title: z.string(), reason: z.string() })),
})
export type Verification = z.infer<typeof Verification>

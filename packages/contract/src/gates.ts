import { z } from 'zod'

/** `hold` stops the issue; `overridable` stops it unless a reason is given, which is recorded and printed. */
export const Gate = z.object({
  id: z.string(),
  title: z.string(),
  state: z.enum(['pass', 'hold', 'overridable']),
  detail: z.string(),
  /** Address in the web app where the matter is settled, as `/p/FC-241/redlines`. */
  link: z.string().nullable(),
})
export type Gate = z.infer<typeof Gate>

/** GET /api/projects/:project/gates?for= ; also `gates` of the 422 gates_failed problem. */
export const GateList = z.object({ for: z.enum(['review', 'construction']), gates: z.array(Gate) })
export type GateList = z.infer<typeof GateList>

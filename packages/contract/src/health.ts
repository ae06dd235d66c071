import { z } from 'zod'

/** GET /api/health */
export const Health = z.object({ ok: z.literal(true), engine: z.string() })
export type Health = z.infer<typeof Health>

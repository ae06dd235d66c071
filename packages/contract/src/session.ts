import { z } from 'zod'

/** POST /api/session */
export const SignInRequest = z.strictObject({
  email: z.email('Type an e-mail address.').max(254),
  password: z.string().min(1, 'Type the password.').max(128),
})
export type SignInRequest = z.infer<typeof SignInRequest>

/** GET and POST /api/session */
export const Session = z.object({
  user: z.object({
    id: z.string(),
    name: z.string(),
    initials: z.string(),
    email: z.string(),
    office: z.object({ id: z.string(), name: z.string() }),
    administrator: z.boolean(),
    /** Whether POST /api/projects is open to this person. */
    mayCreateProjects: z.boolean(),
  }),
  expiresAt: z.string(),
})
export type Session = z.infer<typeof Session>

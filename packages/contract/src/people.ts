import { z } from 'zod'

/** What a member does in a project. A member may have several roles. */
export const Role = z.enum(['consultant', 'reviewer', 'contractor'])
export type Role = z.infer<typeof Role>

export const Person = z.object({ id: z.string(), name: z.string(), initials: z.string() })
export type Person = z.infer<typeof Person>

export const Member = Person.extend({
  roles: z.array(Role),
  /** A revision is accepted when each required reviewer has accepted it. */
  requiredReviewer: z.boolean(),
})
export type Member = z.infer<typeof Member>

import { z } from 'zod'
import { Role } from './people.ts'

/** `kept`: no mail server is set up, so the mail stays here to be read. */
export const Mail = z.object({
  id: z.string(),
  /** What it is about: `review asked`, `disposition set` … */
  event: z.string(),
  to: z.object({ name: z.string(), email: z.string() }),
  subject: z.string(),
  text: z.string(),
  html: z.string(),
  state: z.enum(['queued', 'sent', 'kept', 'failed']),
  attempts: z.number().int(),
  problem: z.string().nullable(),
  createdAt: z.string(),
  sentAt: z.string().nullable(),
  project: z.string().nullable(),
})
export type Mail = z.infer<typeof Mail>

/** GET /api/office/outbox */
export const Outbox = z.object({ mails: z.array(Mail) })
export type Outbox = z.infer<typeof Outbox>

/** GET /api/office/people */
export const People = z.object({
  people: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      initials: z.string(),
      email: z.string(),
      administrator: z.boolean(),
      mayCreateProjects: z.boolean(),
      projects: z.array(z.object({ number: z.string(), roles: z.array(Role), requiredReviewer: z.boolean() })),
      lastSignIn: z.string().nullable(),
    }),
  ),
})
export type People = z.infer<typeof People>

/** GET /api/office/audit, newest first */
export const AuditTrail = z.object({
  events: z.array(
    z.object({
      id: z.string(),
      at: z.string(),
      who: z.string(),
      action: z.string(),
      project: z.string().nullable(),
      detail: z.string(),
    }),
  ),
})
export type AuditTrail = z.infer<typeof AuditTrail>

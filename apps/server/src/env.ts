import { z } from 'zod'

const Env = z.object({
  PORT: z.coerce.number().int().min(0).max(65535).default(4173),
  /** Address to listen on. Only this machine unless said otherwise. */
  HOST: z.string().min(1).default('127.0.0.1'),
  /** Folder of the database and of the session secret. */
  COLDFILL_DATA: z.string().min(1).default('./data'),
  /** Mail server; without one mail is kept in the outbox. */
  SMTP_URL: z.url({ protocol: /^smtps?$/ }).optional(),
  MAIL_FROM: z.email().default('coldfill@localhost.example'),
  /** Address that mails link to; what the server listens on where not given. */
  PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
  /** Command that starts LibreOffice, which finds page numbers and prints; `none` works without. */
  COLDFILL_OFFICE: z.string().min(1).default('soffice'),
  SESSION_SECRET: z.string().min(32, 'must have at least 32 characters').optional(),
  /** Number of proxies in front of the server whose X-Forwarded-For is believed. */
  TRUST_PROXY: z.coerce.number().int().min(0).max(5).default(0),
})
export type Env = z.infer<typeof Env>

/** Settings that cannot be used; `message` names each. */
export class BadEnvironment extends Error {}

/** @throws {BadEnvironment} */
export const readEnv = (source: Readonly<Record<string, string | undefined>>): Env => {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''))
  const read = Env.safeParse(given)
  if (read.success) return read.data
  throw new BadEnvironment(read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('\n'))
}

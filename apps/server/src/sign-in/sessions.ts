import { and, eq, isNull } from 'drizzle-orm'
import type { Clock } from '../clock.ts'
import type { Database } from '../db/client.ts'
import { offices, sessions, users } from '../db/schema/index.ts'
import { newSessionName, sessionId, type SessionTokens } from './session-token.ts'

const MINUTE = 60_000
/** A session ends an hour after the last request, and a day after sign-in whatever happens. */
export const IDLE_MS = 60 * MINUTE
export const ABSOLUTE_MS = 24 * 60 * MINUTE
/** The time of the last request is written down at most this often. */
const SEEN_EVERY_MS = MINUTE

/** Who asks. Every query of a route starts from one. */
export interface Principal {
  readonly userId: string
  readonly name: string
  readonly initials: string
  readonly email: string
  readonly office: { readonly id: string; readonly name: string }
  readonly administrator: boolean
  readonly mayCreateProjects: boolean
  readonly session: { readonly id: string; readonly expiresAt: Date }
}

export const openSession = async (
  db: Database,
  tokens: SessionTokens,
  userId: string,
  now: Date,
): Promise<{ token: string; expiresAt: Date }> => {
  const name = newSessionName()
  const expiresAt = new Date(now.getTime() + ABSOLUTE_MS)
  await db.insert(sessions).values({ id: sessionId(name), userId, createdAt: now, lastSeenAt: now, expiresAt })
  return { token: await tokens.sign(name, expiresAt), expiresAt }
}

/** The person behind a cookie; null where the session is unknown, revoked, idle or over, or the person is switched off. */
export const principalOf = async (
  db: Database,
  tokens: SessionTokens,
  token: string,
  clock: Clock,
): Promise<Principal | null> => {
  const name = await tokens.read(token)
  if (name === null) return null
  const [row] = await db
    .select({ session: sessions, user: users, office: offices })
    .from(sessions)
    .innerJoin(users, eq(users.id, sessions.userId))
    .innerJoin(offices, eq(offices.id, users.officeId))
    .where(and(eq(sessions.id, sessionId(name)), isNull(sessions.revokedAt)))
  if (!row || !row.user.active) return null
  const now = clock()
  const idle = now.getTime() - row.session.lastSeenAt.getTime()
  if (now >= row.session.expiresAt || idle >= IDLE_MS) return null
  if (idle >= SEEN_EVERY_MS) await db.update(sessions).set({ lastSeenAt: now }).where(eq(sessions.id, row.session.id))
  return {
    userId: row.user.id,
    name: row.user.name,
    initials: row.user.initials,
    email: row.user.email,
    office: { id: row.office.id, name: row.office.name },
    administrator: row.user.administrator,
    mayCreateProjects: row.user.mayCreateProjects || row.user.administrator,
    session: { id: row.session.id, expiresAt: row.session.expiresAt },
  }
}

export const revokeSession = async (db: Database, id: string, now: Date): Promise<void> => {
  await db
    .update(sessions)
    .set({ revokedAt: now })
    .where(and(eq(sessions.id, id), isNull(sessions.revokedAt)))
}

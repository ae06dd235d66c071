import { and, asc, desc, eq } from 'drizzle-orm'
import type { Database, Reader } from '../../db/client.ts'
import { auditEvents, mails, members, projects, users } from '../../db/schema/index.ts'

const MOST_ROWS = 500

export const officeMails = (db: Reader, officeId: string) =>
  db
    .select({ mail: mails, project: projects.number })
    .from(mails)
    .leftJoin(projects, eq(projects.id, mails.projectId))
    .where(eq(mails.officeId, officeId))
    .orderBy(desc(mails.createdAt))
    .limit(MOST_ROWS)

export const officeEvents = (db: Reader, officeId: string) =>
  db.select().from(auditEvents).where(eq(auditEvents.officeId, officeId)).orderBy(desc(auditEvents.id)).limit(MOST_ROWS)

export const officePeople = (db: Reader, officeId: string) =>
  db.select().from(users).where(eq(users.officeId, officeId)).orderBy(asc(users.createdAt))

export const officeMemberships = (db: Reader, officeId: string) =>
  db
    .select({
      userId: members.userId,
      number: projects.number,
      roles: members.roles,
      requiredReviewer: members.requiredReviewer,
    })
    .from(members)
    .innerJoin(projects, eq(projects.id, members.projectId))
    .where(eq(projects.officeId, officeId))
    .orderBy(asc(projects.createdAt))

/** Puts a mail back in the queue; false where the office has none of that id. */
export const requeueMail = async (db: Database, officeId: string, id: string): Promise<boolean> => {
  const queued = await db
    .update(mails)
    .set({ state: 'queued', attempts: 0, problem: null })
    .where(and(eq(mails.id, id), eq(mails.officeId, officeId)))
    .returning({ id: mails.id })
  return queued.length > 0
}

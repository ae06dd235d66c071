import { and, asc, eq, inArray } from 'drizzle-orm'
import type { Reader } from '../../db/client.ts'
import { redlineMessages, redlines, users } from '../../db/schema/index.ts'
import type { ProjectAccess } from '../../policies/project-access.ts'
import { seesRedline } from '../../policies/redlines.ts'

export type RedlineRow = typeof redlines.$inferSelect

export interface MessageRow {
  readonly redlineId: string
  readonly author: { readonly id: string; readonly name: string; readonly initials: string }
  readonly text: string
  readonly did: 'wrote' | 'closed' | 'reopened'
  readonly writtenAt: Date
}

/** Threads with their messages in order. Those that the person may not know of are never among them. */
export interface Threads {
  readonly rows: readonly RedlineRow[]
  readonly messages: ReadonlyMap<string, readonly MessageRow[]>
}

export const visibleThreads = async (db: Reader, access: ProjectAccess, number?: number): Promise<Threads> => {
  const found = await db
    .select()
    .from(redlines)
    .where(
      and(eq(redlines.projectId, access.project.id), ...(number === undefined ? [] : [eq(redlines.number, number)])),
    )
    .orderBy(asc(redlines.number))
  const rows = found.filter((row) => seesRedline(access, row))
  const messages = new Map<string, MessageRow[]>(rows.map((row) => [row.id, []]))
  if (rows.length > 0) {
    const written = await db
      .select({
        redlineId: redlineMessages.redlineId,
        author: { id: users.id, name: users.name, initials: users.initials },
        text: redlineMessages.text,
        did: redlineMessages.did,
        writtenAt: redlineMessages.writtenAt,
      })
      .from(redlineMessages)
      .innerJoin(users, eq(users.id, redlineMessages.authorId))
      .where(
        inArray(
          redlineMessages.redlineId,
          rows.map((row) => row.id),
        ),
      )
      .orderBy(asc(redlineMessages.position))
    for (const message of written) messages.get(message.redlineId)?.push(message)
  }
  return { rows, messages }
}

import { and, asc, eq, inArray, ne, or } from 'drizzle-orm'
import type { Reader } from '../../db/client.ts'
import { redlineMessages, redlines, users } from '../../db/schema/index.ts'

export type RedlineRow = typeof redlines.$inferSelect

export interface MessageRow {
  readonly redlineId: string
  readonly author: { readonly id: string; readonly name: string; readonly initials: string }
  readonly text: string
  readonly did: 'wrote' | 'closed' | 'reopened'
  readonly writtenAt: Date
}

/** Threads with their messages in order. The pending ones of others are never among them. */
export interface Threads {
  readonly rows: readonly RedlineRow[]
  readonly messages: ReadonlyMap<string, readonly MessageRow[]>
}

export const visibleThreads = async (
  db: Reader,
  projectId: string,
  userId: string,
  number?: number,
): Promise<Threads> => {
  const rows = await db
    .select()
    .from(redlines)
    .where(
      and(
        eq(redlines.projectId, projectId),
        or(ne(redlines.state, 'pending'), eq(redlines.authorId, userId)),
        ...(number === undefined ? [] : [eq(redlines.number, number)]),
      ),
    )
    .orderBy(asc(redlines.number))
  const messages = new Map<string, MessageRow[]>(rows.map((row) => [row.id, []]))
  if (rows.length > 0) {
    const found = await db
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
    for (const message of found) messages.get(message.redlineId)?.push(message)
  }
  return { rows, messages }
}

import type { RedlineEntry } from '@coldfill/documents'
import { and, asc, eq, inArray, ne } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { redlineMessages, redlines, users } from '../db/schema/index.ts'
import type { ProjectFacts, RevisionRow } from './project-facts.ts'

type Did = 'wrote' | 'closed' | 'reopened'

/** The words of a message, with what it did to the thread. */
const wordsOf = (text: string, did: Did): string => {
  const done = { wrote: '', closed: 'Closed.', reopened: 'Reopened.' }[did]
  return [text, done].filter((part) => part !== '').join(' ')
}

/**
 * The redlines of a revision as they stood at one moment, for documents: those written on it or carried to it, with the answers
 * given until then. Pending ones are their author's alone, and what is for the office only never leaves it: neither is among them.
 */
export const redlineEntries = async (
  db: Reader,
  facts: ProjectFacts,
  revision: RevisionRow,
  at: Date,
): Promise<RedlineEntry[]> => {
  const rows = await db
    .select()
    .from(redlines)
    .where(and(eq(redlines.projectId, facts.project.id), ne(redlines.state, 'pending'), eq(redlines.officeOnly, false)))
    .orderBy(asc(redlines.number))
  const sequences = new Map(facts.revisions.map(({ id, sequence }) => [id, sequence]))
  const carried = rows.filter(
    ({ revisionId, publishedAt, createdAt }) =>
      (sequences.get(revisionId) ?? Infinity) <= revision.sequence && (publishedAt ?? createdAt) <= at,
  )
  if (carried.length === 0) return []
  const found = await db
    .select({
      redlineId: redlineMessages.redlineId,
      author: { name: users.name, initials: users.initials },
      text: redlineMessages.text,
      did: redlineMessages.did,
      writtenAt: redlineMessages.writtenAt,
    })
    .from(redlineMessages)
    .innerJoin(users, eq(users.id, redlineMessages.authorId))
    .where(
      inArray(
        redlineMessages.redlineId,
        carried.map(({ id }) => id),
      ),
    )
    .orderBy(asc(redlineMessages.position))
  return carried.flatMap((row) => {
    const messages = found.filter(({ redlineId, writtenAt }) => redlineId === row.id && writtenAt <= at)
    const closed = messages.findLast(({ did }) => did !== 'wrote')?.did === 'closed'
    // A closed one stands up to the revision on which it was closed, as on the Redlines sheet.
    const last = closed ? (sequences.get(row.closedOn ?? row.revisionId) ?? Infinity) : Infinity
    if (messages.length === 0 || revision.sequence > last) return []
    return [
      {
        number: row.number,
        anchor: row.anchor,
        quoted: row.quoted,
        proposedValue: row.proposedValue,
        mustAnswer: row.mustAnswer,
        state: closed ? ('closed' as const) : ('open' as const),
        messages: messages.map(({ author, text, did, writtenAt }) => ({
          author,
          at: writtenAt.toISOString(),
          text: wordsOf(text, did),
        })),
      },
    ]
  })
}

import { and, count, eq } from 'drizzle-orm'
import type { Deps } from '../deps.ts'
import { redlineMessages, redlines } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { notFound } from '../errors.ts'
import { redlineReply } from '../mail/project-mails.ts'
import { queueMail } from '../mail/queue-mail.ts'
import { is, type ProjectAccess } from '../policies/project-access.ts'
import { requireRedline } from '../policies/redlines.ts'
import { projectFacts } from '../review/project-facts.ts'
import { recordEvent } from './record-event.ts'

const ACT = { wrote: 'reply', closed: 'close', reopened: 'reopen' } as const
const ACTION = { wrote: 'redline answered', closed: 'redline closed', reopened: 'redline reopened' } as const

/** Adds a message to a thread, and closes or reopens it where asked. @throws {AppError} 403, 404, 409 wrong_state */
export const continueThread = async (
  deps: Deps,
  access: ProjectAccess,
  number: number,
  message: { readonly did: 'wrote' | 'closed' | 'reopened'; readonly text: string },
): Promise<void> => {
  const now = deps.clock()
  const { principal, project } = access
  await withTx(deps.db, async (tx) => {
    const [row] = await tx
      .select()
      .from(redlines)
      .where(and(eq(redlines.projectId, project.id), eq(redlines.number, number)))
    if (!row) throw notFound()
    requireRedline(access, row, ACT[message.did])
    const facts = await projectFacts(tx, project)
    const [counted] = await tx
      .select({ count: count() })
      .from(redlineMessages)
      .where(eq(redlineMessages.redlineId, row.id))
    await tx.insert(redlineMessages).values({
      redlineId: row.id,
      position: counted?.count ?? 0,
      authorId: principal.userId,
      text: message.text,
      did: message.did,
      writtenAt: now,
    })
    if (message.did === 'closed')
      await tx
        .update(redlines)
        .set({ state: 'closed', closedBy: principal.userId, closedOn: facts.revisions[0]?.id ?? row.revisionId })
        .where(eq(redlines.id, row.id))
    if (message.did === 'reopened')
      await tx.update(redlines).set({ state: 'open', closedBy: null, closedOn: null }).where(eq(redlines.id, row.id))
    await recordEvent(tx, principal, now, {
      action: ACTION[message.did],
      project: project.number,
      detail: `Redline ${number}`,
    })
    const label = facts.revisions.find((revision) => revision.id === row.revisionId)?.label ?? ''
    // The consultant's words go to the author of the redline, the reviewer's and those for the office to the consultants.
    const to = facts.members.filter(
      (member) =>
        member.id !== principal.userId &&
        (row.officeOnly || is(access, 'reviewer') ? member.roles.includes('consultant') : member.id === row.authorId),
    )
    await queueMail(
      tx,
      { officeId: project.officeId, projectId: project.id, address: deps.address(), at: now },
      to,
      redlineReply(
        { number: project.number, title: project.title, label },
        { by: principal.name, redline: number, text: message.text, did: message.did },
      ),
    )
  })
  deps.postman.wake()
}

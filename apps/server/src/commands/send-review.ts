import { and, eq } from 'drizzle-orm'
import { OUTCOME_LABELS, type Outcome, revisionTitle } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { dispositions, redlines } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError } from '../errors.ts'
import { reviewSent } from '../mail/project-mails.ts'
import { queueMail } from '../mail/queue-mail.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../policies/project-permissions.ts'
import { projectFacts, type RevisionRow } from '../review/project-facts.ts'
import { newestRevision } from '../review/standing.ts'
import { recordEvent } from './record-event.ts'

/**
 * Publishes the reviewer's pending redlines and sets their disposition on the content they had before them, both or neither.
 * @throws {AppError} 403; 409 stale_content where a newer revision or other content stands there now
 */
export const sendReview = async (
  deps: Deps,
  access: ProjectAccess,
  revision: RevisionRow,
  review: { readonly outcome: Outcome; readonly reason: string; readonly contentHash: string },
): Promise<void> => {
  const now = deps.clock()
  const { principal, project } = access
  await withTx(deps.db, async (tx) => {
    const facts = await projectFacts(tx, project)
    requirePermission(projectPermissions(access, facts).dispose)
    const newest = newestRevision(facts)
    const row = facts.revisions.find(({ id }) => id === revision.id)
    if (!row || newest?.id !== revision.id || review.contentHash !== row.contentHash)
      throw new AppError(
        409,
        'stale_content',
        'You looked at other content',
        newest
          ? `${revisionTitle(newest.label)} is what is to be reviewed now. Your pending redlines are kept: look at it and send the review again.`
          : 'The revision was withdrawn. Your pending redlines are kept.',
        { extension: { current: newest ? { revision: newest.label, contentHash: newest.contentHash } : null } },
      )
    const published = await tx
      .update(redlines)
      .set({ state: 'open', publishedAt: now })
      .where(
        and(eq(redlines.projectId, project.id), eq(redlines.authorId, principal.userId), eq(redlines.state, 'pending')),
      )
      .returning({ number: redlines.number })
    await tx.insert(dispositions).values({
      revisionId: row.id,
      reviewerId: principal.userId,
      outcome: review.outcome,
      reason: review.reason,
      contentHash: review.contentHash,
      setAt: now,
    })
    await recordEvent(tx, principal, now, {
      action: 'disposition set',
      project: project.number,
      detail: `${revisionTitle(row.label)}: ${OUTCOME_LABELS[review.outcome]}; redlines published: ${published.length}${review.reason === '' ? '' : `. Reason: ${review.reason}`}`,
    })
    await queueMail(
      tx,
      { officeId: project.officeId, projectId: project.id, address: deps.address(), at: now },
      facts.members.filter((member) => member.roles.includes('consultant') && member.id !== principal.userId),
      reviewSent(
        { number: project.number, title: project.title, label: row.label },
        { by: principal.name, outcome: review.outcome, reason: review.reason, redlines: published.length },
      ),
    )
  })
  deps.postman.wake()
}

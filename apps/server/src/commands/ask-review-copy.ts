import { and, eq, isNull } from 'drizzle-orm'
import type { Deps } from '../deps.ts'
import { reviewCopies } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import type { RevisionRow } from '../review/project-facts.ts'
import { recordEvent } from './record-event.ts'

/**
 * Asks for the review copy of a revision with the redlines of now. It takes the place of the one before; where one is being made
 * already, that one is waited for.
 */
export const askReviewCopy = async (deps: Deps, access: ProjectAccess, revision: RevisionRow): Promise<void> => {
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    const [preparing] = await tx
      .select({ revisionId: reviewCopies.revisionId })
      .from(reviewCopies)
      .where(and(eq(reviewCopies.revisionId, revision.id), isNull(reviewCopies.problem), isNull(reviewCopies.sha256)))
    if (preparing) return
    await tx.delete(reviewCopies).where(eq(reviewCopies.revisionId, revision.id))
    await tx.insert(reviewCopies).values({ revisionId: revision.id, askedAt: now, askedBy: access.principal.name })
    await recordEvent(tx, access.principal, now, {
      action: 'review copy asked for',
      project: access.project.number,
      detail: revision.label === '' ? 'First issue' : `Rev ${revision.label}`,
    })
  })
  deps.fileMaker.wake()
}

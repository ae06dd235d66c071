import { and, eq, isNotNull } from 'drizzle-orm'
import { type ContentsChoice, revisionTitle } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { makings } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError } from '../errors.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../policies/project-permissions.ts'
import { frozenContent } from '../review/frozen.ts'
import { constructionGates, holding, overridable } from '../review/gates.ts'
import { projectFacts, type RevisionRow } from '../review/project-facts.ts'
import { newestRevision } from '../review/standing.ts'
import { titleBlockInForce } from '../title-block/stored-title-block.ts'
import { gatesFailed } from './issue-for-review.ts'
import { recordEvent } from './record-event.ts'

/**
 * Asks for the files with the construction status on their pages. The issue takes effect when they are stored (finish-making.ts), and
 * the gates are looked at again then.
 * @throws {AppError} 403, 409 not_newest, 422 gates_failed
 */
export const issueForConstruction = async (
  deps: Deps,
  access: ProjectAccess,
  revision: RevisionRow,
  overrideReason: string | null,
  contents: ContentsChoice,
): Promise<void> => {
  const frozen = await frozenContent(deps.db, revision.id)
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    const facts = await projectFacts(tx, access.project)
    requirePermission(projectPermissions(access, facts).issueForConstruction)
    const newest = newestRevision(facts)
    if (newest?.id !== revision.id)
      throw new AppError(
        409,
        'not_newest',
        'There is a newer revision',
        newest
          ? `${revisionTitle(newest.label)} has taken the place of ${revisionTitle(revision.label)}.`
          : `${revisionTitle(revision.label)} is withdrawn.`,
      )
    const gates = constructionGates(facts, frozen)
    if (holding(gates).length > 0) throw gatesFailed(gates, holding(gates))
    const open = overridable(gates)
    if (open.length > 0 && overrideReason === null) throw gatesFailed(gates, open)
    // Only an override of something is one.
    const reason = open.length > 0 ? overrideReason : null
    const reviewed = facts.fileSets.find((row) => row.revisionId === revision.id && row.set === 'review')
    await tx
      .delete(makings)
      .where(and(eq(makings.revisionId, revision.id), eq(makings.set, 'construction'), isNotNull(makings.problem)))
    await tx.insert(makings).values({
      revisionId: revision.id,
      set: 'construction',
      askedBy: access.principal.userId,
      askedAt: now,
      overrideReason: reason,
      units: contents.units ?? reviewed?.units ?? null,
      withRedlines: contents.redlines ?? reviewed?.withRedlines ?? false,
      withVerification: contents.verification ?? reviewed?.withVerification ?? false,
      titleBlockId: await titleBlockInForce(tx, access.project.officeId),
    })
    if (reason !== null)
      await recordEvent(tx, access.principal, now, {
        action: 'gates overridden',
        project: access.project.number,
        detail: `${revisionTitle(revision.label)}: ${open.map((gate) => gate.id).join(', ')}. Reason: ${reason}`,
      })
  })
  deps.fileMaker.wake()
}

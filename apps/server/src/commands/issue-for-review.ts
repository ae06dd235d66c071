import { and, eq, isNull, sql } from 'drizzle-orm'
import { type ContentsChoice, type Gate, revisionTitle } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { makings, revisions, specs } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError } from '../errors.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../policies/project-permissions.ts'
import { holding, reviewGates } from '../review/gates.ts'
import { projectFacts } from '../review/project-facts.ts'
import { revisionLetter } from '../review/revision-letter.ts'
import { titleBlockInForce } from '../title-block/stored-title-block.ts'
import { workingCopy } from '../review/working-copy.ts'
import { recordEvent } from './record-event.ts'

export const gatesFailed = (gates: readonly Gate[], failing: readonly Gate[]): AppError =>
  new AppError(
    422,
    'gates_failed',
    'The gate list is not clear',
    failing.map((gate) => `${gate.title}: ${gate.detail}`).join(' '),
    {
      extension: { gates },
      issues: failing.map((gate) => ({ code: gate.id, message: `${gate.title}: ${gate.detail}` })),
    },
  )

/**
 * Freezes the working copy as the next revision and asks for its files. Returns the id of the revision.
 * @throws {AppError} 403, 422 gates_failed
 */
export const issueForReview = async (
  deps: Deps,
  access: ProjectAccess,
  note: string,
  contents: ContentsChoice,
): Promise<string> => {
  // Sized before the transaction: sizing is slow, and the text is compared by version inside.
  const working = await workingCopy(deps.db, deps.sizing, access.project)
  const now = deps.clock()
  const id = await withTx(deps.db, async (tx) => {
    const facts = await projectFacts(tx, access.project)
    requirePermission(projectPermissions(access, facts).issueForReview)
    const gates = reviewGates(facts, working)
    if (holding(gates).length > 0) throw gatesFailed(gates, holding(gates))
    const [spec] = await tx.select({ version: specs.version }).from(specs).where(eq(specs.projectId, access.project.id))
    if (spec?.version !== working.version)
      throw new AppError(
        409,
        'version_conflict',
        'The spec was saved in the meantime',
        'Look at it once more and issue again.',
      )
    const sequence = facts.revisions.length
    const label = revisionLetter(sequence)
    await tx
      .update(revisions)
      .set({ supersededAt: now })
      .where(
        and(
          eq(revisions.projectId, access.project.id),
          isNull(revisions.constructionAt),
          isNull(revisions.withdrawnAt),
          isNull(revisions.supersededAt),
        ),
      )
    // Work on a set that never came to be is over with the revision it belonged to.
    await tx
      .delete(makings)
      .where(
        sql`${makings.revisionId} in (select ${revisions.id} from ${revisions} where ${revisions.projectId} = ${access.project.id})`,
      )
    const [revision] = await tx
      .insert(revisions)
      .values({
        projectId: access.project.id,
        sequence,
        label,
        specText: working.text,
        resultJson: working.json,
        catalogueId: working.catalogue?.id ?? null,
        engine: working.result.engine,
        contentHash: working.contentHash,
        note,
        issuedAt: now,
        issuedBy: access.principal.userId,
      })
      .returning({ id: revisions.id })
    if (!revision) throw new Error('The revision was not written.')
    await tx.insert(makings).values({
      revisionId: revision.id,
      set: 'review',
      askedBy: access.principal.userId,
      askedAt: now,
      units: contents.units ?? null,
      withRedlines: contents.redlines ?? false,
      withVerification: contents.verification ?? false,
      titleBlockId: await titleBlockInForce(tx, access.project.officeId),
    })
    await recordEvent(tx, access.principal, now, {
      action: 'issued for review',
      project: access.project.number,
      detail: `${revisionTitle(label)}, content ${working.contentHash.slice(0, 12)}`,
    })
    return revision.id
  })
  deps.fileMaker.wake()
  return id
}

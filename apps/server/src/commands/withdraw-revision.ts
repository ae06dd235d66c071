import { eq } from 'drizzle-orm'
import { revisionTitle } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { makings, revisions } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError } from '../errors.ts'
import { withdrawn } from '../mail/project-mails.ts'
import { queueMail } from '../mail/queue-mail.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../policies/project-permissions.ts'
import { projectFacts, type RevisionRow } from '../review/project-facts.ts'
import { recordEvent } from './record-event.ts'

/**
 * Takes a revision back. It stays readable with its reason, and nobody may work by it. An issue that it superseded does not come back
 * into force by itself.
 * @throws {AppError} 403, 409 already_withdrawn
 */
export const withdrawRevision = async (
  deps: Deps,
  access: ProjectAccess,
  revision: RevisionRow,
  reason: string,
): Promise<void> => {
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    const facts = await projectFacts(tx, access.project)
    requirePermission(projectPermissions(access, facts).withdraw)
    const row = facts.revisions.find(({ id }) => id === revision.id)
    const title = revisionTitle(revision.label)
    if (!row || row.withdrawnAt)
      throw new AppError(409, 'already_withdrawn', 'It is withdrawn already', `${title} was withdrawn before.`)
    await tx
      .update(revisions)
      .set({ withdrawnAt: now, withdrawnBy: access.principal.userId, withdrawReason: reason })
      .where(eq(revisions.id, revision.id))
    await tx.delete(makings).where(eq(makings.revisionId, revision.id))
    await recordEvent(tx, access.principal, now, {
      action: 'withdrawn',
      project: access.project.number,
      detail: `${title}. Reason: ${reason}`,
    })
    const about = { number: access.project.number, title: access.project.title, label: revision.label }
    const mail = { officeId: access.project.officeId, projectId: access.project.id, address: deps.address(), at: now }
    const content = { by: access.principal.name, reason }
    const contractors = facts.members.filter(({ roles }) => roles.includes('contractor'))
    const others = facts.members.filter(({ roles }) => !roles.includes('contractor'))
    if (row.constructionAt) await queueMail(tx, mail, contractors, withdrawn(about, content, 'contractor'))
    await queueMail(tx, mail, others, withdrawn(about, content, 'other'))
  })
  deps.postman.wake()
}

import { type ReviewCopy, type ReviewCopyAnswer, revisionSegment } from '@coldfill/contract'
import { eq, getTableColumns } from 'drizzle-orm'
import { Router } from 'express'
import { askReviewCopy } from '../../commands/ask-review-copy.ts'
import { recordEvent } from '../../commands/record-event.ts'
import { reviewCopies } from '../../db/schema/index.ts'
import type { Deps } from '../../deps.ts'
import { notFound } from '../../errors.ts'
import { accessIn } from '../../middleware/require-project.ts'
import type { ProjectAccess } from '../../policies/project-access.ts'
import { findRevision } from '../../review/find-revision.ts'
import { projectFacts, type RevisionRow } from '../../review/project-facts.ts'
import { sendStored } from '../revisions/send-file.ts'

type Named = { project: string; rev: string }

const { content: _content, ...light } = getTableColumns(reviewCopies)

/** The submittal with redlines as comments, for those who see redlines. Mounted behind requireInsider. */
export const reviewCopyRouter = (deps: Deps): Router => {
  const revisionOf = async (access: ProjectAccess, rev: string): Promise<RevisionRow> =>
    findRevision(await projectFacts(deps.db, access.project), rev)

  const present = async (access: ProjectAccess, revision: RevisionRow): Promise<ReviewCopyAnswer> => {
    const [row] = await deps.db.select(light).from(reviewCopies).where(eq(reviewCopies.revisionId, revision.id))
    if (!row) return { copy: null }
    const { askedAt, askedBy, problem, name, size, sha256, redlines } = row
    const made = name !== null && size !== null && sha256 !== null
    return {
      copy: {
        state: made ? 'ready' : problem === null ? 'preparing' : 'failed',
        askedAt: askedAt.toISOString(),
        askedBy,
        problem,
        file: made
          ? {
              name,
              size,
              sha256,
              redlines: redlines ?? 0,
              href: `/api/projects/${access.project.number}/revisions/${revisionSegment(revision.label)}/review-copy/file`,
            }
          : null,
      } satisfies ReviewCopy,
    }
  }

  const router = Router({ mergeParams: true })
  router.get<'/:rev/review-copy', Named>('/:rev/review-copy', async (req, res) => {
    const access = accessIn(res)
    res.json(await present(access, await revisionOf(access, req.params.rev)))
  })
  router.post<'/:rev/review-copy', Named>('/:rev/review-copy', async (req, res) => {
    const access = accessIn(res)
    const revision = await revisionOf(access, req.params.rev)
    await askReviewCopy(deps, access, revision)
    res.status(202).json(await present(access, revision))
  })
  router.get<'/:rev/review-copy/file', Named>('/:rev/review-copy/file', async (req, res) => {
    const access = accessIn(res)
    const revision = await revisionOf(access, req.params.rev)
    const [row] = await deps.db.select().from(reviewCopies).where(eq(reviewCopies.revisionId, revision.id))
    if (!row?.content || row.name === null || row.sha256 === null) throw notFound()
    const { name, sha256, content } = row
    await sendStored(res, { kind: 'submittal', name, sha256, content }, () =>
      recordEvent(deps.db, access.principal, deps.clock(), {
        action: 'review copy downloaded',
        project: access.project.number,
        detail: name,
      }),
    )
  })
  return router
}

import {
  IssueForConstructionRequest,
  IssueForReviewRequest,
  type Revision,
  ReviewRequest,
  WithdrawRequest,
} from '@coldfill/contract'
import { type Response, Router } from 'express'
import { issueForConstruction } from '../../commands/issue-for-construction.ts'
import { issueForReview } from '../../commands/issue-for-review.ts'
import { retryMaking } from '../../commands/retry-making.ts'
import { sendReview } from '../../commands/send-review.ts'
import { withdrawRevision } from '../../commands/withdraw-revision.ts'
import type { Deps } from '../../deps.ts'
import { notAllowed, notFound } from '../../errors.ts'
import { accessIn, requireInsider } from '../../middleware/require-project.ts'
import { parseBody } from '../../parse-request.ts'
import { is, type ProjectAccess } from '../../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../../policies/project-permissions.ts'
import { findRevision } from '../../review/find-revision.ts'
import { projectFacts, type RevisionRow } from '../../review/project-facts.ts'
import { presentRevision } from './revisions.presenter.ts'
import { sendFile } from './send-file.ts'

type Named = { project: string; rev: string }

export const revisionsRouter = (deps: Deps): Router => {
  const present = async (access: ProjectAccess, id: string): Promise<Revision> => {
    const facts = await projectFacts(deps.db, access.project)
    const row = facts.revisions.find((revision) => revision.id === id)
    if (!row) throw notFound()
    return presentRevision(facts, row)
  }
  const revisionOf = async (res: Response, rev: string): Promise<{ access: ProjectAccess; revision: RevisionRow }> => {
    const access = accessIn(res)
    return { access, revision: findRevision(await projectFacts(deps.db, access.project), rev) }
  }

  const router = Router({ mergeParams: true })
  // Open to contractors too, who get the files of the issue in force and nothing else.
  router.get<'/:rev/files/:name', Named & { name: string }>('/:rev/files/:name', async (req, res) => {
    await sendFile(deps, req, res)
  })
  router.use(requireInsider)
  router.post('/', async (req, res) => {
    const access = accessIn(res)
    requirePermission(projectPermissions(access, await projectFacts(deps.db, access.project)).issueForReview)
    const { note, contents } = parseBody(IssueForReviewRequest, req)
    res.status(201).json(await present(access, await issueForReview(deps, access, note, contents)))
  })
  router.get<'/:rev', Named>('/:rev', async (req, res) => {
    const { access, revision } = await revisionOf(res, req.params.rev)
    res.json(await present(access, revision.id))
  })
  router.post<'/:rev/files', Named>('/:rev/files', async (req, res) => {
    const { access, revision } = await revisionOf(res, req.params.rev)
    if (!is(access, 'consultant')) throw notAllowed('Only a consultant of the project has files made.')
    await retryMaking(deps, revision)
    res.status(202).json(await present(access, revision.id))
  })
  router.post<'/:rev/reviews', Named>('/:rev/reviews', async (req, res) => {
    const { access, revision } = await revisionOf(res, req.params.rev)
    if (!is(access, 'reviewer')) throw notAllowed('Only a reviewer of the project sets a disposition.')
    await sendReview(deps, access, revision, parseBody(ReviewRequest, req))
    res.status(201).json(await present(access, revision.id))
  })
  router.post<'/:rev/construction', Named>('/:rev/construction', async (req, res) => {
    const { access, revision } = await revisionOf(res, req.params.rev)
    if (!is(access, 'consultant')) throw notAllowed('Only a consultant of the project issues for construction.')
    const { override, contents } = parseBody(IssueForConstructionRequest, req)
    await issueForConstruction(deps, access, revision, override?.reason ?? null, contents)
    res.status(202).json(await present(access, revision.id))
  })
  router.post<'/:rev/withdraw', Named>('/:rev/withdraw', async (req, res) => {
    const { access, revision } = await revisionOf(res, req.params.rev)
    requirePermission(projectPermissions(access, await projectFacts(deps.db, access.project)).withdraw)
    const { reason } = parseBody(WithdrawRequest, req)
    await withdrawRevision(deps, access, revision, reason)
    res.json(await present(access, revision.id))
  })
  return router
}

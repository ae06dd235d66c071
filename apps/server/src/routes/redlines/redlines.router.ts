import {
  CloseRedlineRequest,
  CreateRedlineRequest,
  EditRedlineRequest,
  type Redline,
  type RedlineList,
  ReplyRequest,
} from '@coldfill/contract'
import { type Request, Router } from 'express'
import { continueThread } from '../../commands/continue-thread.ts'
import { changePendingRedline, writeRedline } from '../../commands/write-redline.ts'
import type { Deps } from '../../deps.ts'
import { notFound } from '../../errors.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { parseBody, queryText } from '../../parse-request.ts'
import type { ProjectAccess } from '../../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../../policies/project-permissions.ts'
import { findRevision } from '../../review/find-revision.ts'
import { type Frozen, frozenContent } from '../../review/frozen.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { presentRedline } from './redlines.presenter.ts'
import { visibleThreads } from './redlines.queries.ts'

type Numbered = { project: string; number: string }

const numberIn = (req: Request<Numbered>): number => {
  if (!/^\d{1,9}$/.test(req.params.number)) throw notFound()
  return Number(req.params.number)
}

/** Threads as they stand towards the revision that is looked at; all of the project, or the one of that number. */
const presentThreads = async (
  deps: Deps,
  access: ProjectAccess,
  { rev, number }: { rev?: string | undefined; number?: number },
): Promise<Redline[]> => {
  const facts = await projectFacts(deps.db, access.project)
  const viewed = rev === undefined ? facts.revisions[0] : findRevision(facts, rev)
  if (!viewed) return []
  const { rows, messages } = await visibleThreads(deps.db, access, number)
  const sequence = new Map(facts.revisions.map((revision) => [revision.id, revision.sequence]))
  // A redline is shown from the revision it was written on; a closed one up to the revision on which it was closed.
  const shown = rows.filter(({ revisionId, state, closedOn }) => {
    const written = sequence.get(revisionId) ?? 0
    const last = state === 'closed' ? (sequence.get(closedOn ?? revisionId) ?? written) : Infinity
    return number !== undefined || (written <= viewed.sequence && viewed.sequence <= last)
  })
  const contents = new Map<string, Frozen>()
  for (const id of new Set([viewed.id, ...shown.map(({ revisionId }) => revisionId)]))
    contents.set(id, await frozenContent(deps.db, id))
  const contentOf = (id: string): Frozen => {
    const content = contents.get(id)
    if (!content) throw new Error(`The content of revision ${id} was not read.`)
    return content
  }
  return shown.map((row) => presentRedline(access, facts, row, messages.get(row.id) ?? [], { viewed, contentOf }))
}

const presentOne = async (deps: Deps, access: ProjectAccess, number: number): Promise<Redline> => {
  const [redline] = await presentThreads(deps, access, { number })
  if (!redline) throw notFound()
  return redline
}

export const redlinesRouter = (deps: Deps): Router => {
  const router = Router({ mergeParams: true })
    .get('/', async (req, res) => {
      const redlines = await presentThreads(deps, accessIn(res), { rev: queryText(req, 'rev') })
      res.json({ redlines } satisfies RedlineList)
    })
    .post('/', async (req, res) => {
      const access = accessIn(res)
      const facts = await projectFacts(deps.db, access.project)
      const { redline, officeRedline } = projectPermissions(access, facts)
      // One who may write neither is told so, whatever the body says.
      if (!officeRedline.allowed) requirePermission(redline)
      const number = await writeRedline(deps, access, facts, parseBody(CreateRedlineRequest, req))
      res.status(201).json(await presentOne(deps, access, number))
    })
  router.get<'/:number', Numbered>('/:number', async (req, res) => {
    res.json(await presentOne(deps, accessIn(res), numberIn(req)))
  })
  router.patch<'/:number', Numbered>('/:number', async (req, res) => {
    await changePendingRedline(deps, accessIn(res), numberIn(req), parseBody(EditRedlineRequest, req))
    res.json(await presentOne(deps, accessIn(res), numberIn(req)))
  })
  router.delete<'/:number', Numbered>('/:number', async (req, res) => {
    await changePendingRedline(deps, accessIn(res), numberIn(req), null)
    res.status(204).end()
  })
  router.post<'/:number/replies', Numbered>('/:number/replies', async (req, res) => {
    const { text } = parseBody(ReplyRequest, req)
    await continueThread(deps, accessIn(res), numberIn(req), { did: 'wrote', text })
    res.status(201).json(await presentOne(deps, accessIn(res), numberIn(req)))
  })
  router.post<'/:number/close', Numbered>('/:number/close', async (req, res) => {
    const { comment } = parseBody(CloseRedlineRequest, req)
    await continueThread(deps, accessIn(res), numberIn(req), { did: 'closed', text: comment })
    res.json(await presentOne(deps, accessIn(res), numberIn(req)))
  })
  router.post<'/:number/reopen', Numbered>('/:number/reopen', async (req, res) => {
    const { comment } = parseBody(CloseRedlineRequest, req)
    await continueThread(deps, accessIn(res), numberIn(req), { did: 'reopened', text: comment })
    res.json(await presentOne(deps, accessIn(res), numberIn(req)))
  })
  return router
}

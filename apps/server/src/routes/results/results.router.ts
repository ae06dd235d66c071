import type { Results } from '@coldfill/contract'
import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { queryText } from '../../parse-request.ts'
import { seesWorkingCopy } from '../../policies/project-access.ts'
import { changedAssumptions } from '../../review/assumption-changes.ts'
import { changedResults } from '../../review/changed-results.ts'
import { revisionOrNewest } from '../../review/find-revision.ts'
import { frozenContent } from '../../review/frozen.ts'
import { projectFacts, type RevisionRow } from '../../review/project-facts.ts'
import { workingCopy } from '../../review/working-copy.ts'

/** Results of the working copy for those who may see it; frozen ones of `?rev=`, or of the newest issue, for the others. */
export const resultsRouter = (deps: Deps): Router =>
  Router({ mergeParams: true }).get('/', async (req, res) => {
    const access = accessIn(res)
    const facts = await projectFacts(deps.db, access.project)
    const rev = queryText(req, 'rev')
    const since = async (before: RevisionRow | undefined, now: Results['result']): Promise<Results['changedSince']> =>
      before
        ? { revision: before.label, vessels: changedResults((await frozenContent(deps.db, before.id)).result, now) }
        : null
    const changes = async (result: Results['result'], until: Date | null): Promise<Results['assumptionChanges']> =>
      (await changedAssumptions(deps.db, access.project.id, result, until)).map(({ at, ...change }) => ({
        ...change,
        at: at.toISOString(),
      }))
    if (rev === undefined && seesWorkingCopy(access)) {
      const { result, contentHash } = await workingCopy(deps.db, deps.sizing, access.project)
      const changedSince = await since(facts.revisions[0], result)
      const assumptionChanges = await changes(result, null)
      res.json({ revision: null, contentHash, result, assumptionChanges, changedSince } satisfies Results)
      return
    }
    const revision = revisionOrNewest(facts, rev)
    const { result, contentHash } = await frozenContent(deps.db, revision.id)
    const before = facts.revisions.find(({ sequence }) => sequence < revision.sequence)
    const changedSince = await since(before, result)
    const assumptionChanges = await changes(result, revision.issuedAt)
    res.json({ revision: revision.label, contentHash, result, assumptionChanges, changedSince } satisfies Results)
  })

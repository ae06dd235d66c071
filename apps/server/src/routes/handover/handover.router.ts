import { revisionLabel } from '@coldfill/contract'
import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { queryText } from '../../parse-request.ts'
import { frozenContent } from '../../review/frozen.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { constructionRevision } from '../../review/standing.ts'
import { presentHandover } from './handover.presenter.ts'

/** What the contractor works by: the issue in force, or the word why there is none. */
export const handoverRouter = (deps: Deps): Router =>
  Router({ mergeParams: true }).get('/', async (req, res) => {
    const access = accessIn(res)
    const facts = await projectFacts(deps.db, access.project)
    const current = constructionRevision(facts)
    const rev = queryText(req, 'rev')
    // Only what was once issued for construction can be superseded here: of other revisions nothing is said.
    const asked =
      rev === undefined
        ? null
        : (facts.revisions.find((row) => row.constructionAt && row.label === revisionLabel(rev)) ?? null)
    const result = current ? (await frozenContent(deps.db, current.id)).result : null
    res.json(presentHandover(access, facts, result, asked))
  })

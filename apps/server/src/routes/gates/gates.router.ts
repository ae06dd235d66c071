import type { GateList } from '@coldfill/contract'
import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { AppError, notAllowed } from '../../errors.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { queryText } from '../../parse-request.ts'
import { seesWorkingCopy } from '../../policies/project-access.ts'
import { frozenContent } from '../../review/frozen.ts'
import { constructionGates, reviewGates } from '../../review/gates.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { newestRevision } from '../../review/standing.ts'
import { workingCopy } from '../../review/working-copy.ts'

export const gatesRouter = (deps: Deps): Router =>
  Router({ mergeParams: true }).get('/', async (req, res) => {
    const access = accessIn(res)
    const purpose = queryText(req, 'for') ?? 'construction'
    const facts = await projectFacts(deps.db, access.project)
    if (purpose === 'review') {
      if (!seesWorkingCopy(access)) throw notAllowed('The gates of the working copy are for those who see it.')
      const working = await workingCopy(deps.db, deps.sizing, access.project)
      res.json({ for: 'review', gates: reviewGates(facts, working) } satisfies GateList)
      return
    }
    if (purpose !== 'construction')
      throw new AppError(400, 'bad_query', 'The address is not right', 'for is review or construction.')
    const newest = newestRevision(facts)
    const frozen = newest ? await frozenContent(deps.db, newest.id) : null
    res.json({ for: 'construction', gates: constructionGates(facts, frozen) } satisfies GateList)
  })

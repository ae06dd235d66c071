import { revisionTitle, SaveSpecRequest } from '@coldfill/contract'
import { Router } from 'express'
import { saveSpec } from '../../commands/save-spec.ts'
import type { Deps } from '../../deps.ts'
import { notFound } from '../../errors.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { parseBody, queryText } from '../../parse-request.ts'
import { seesWorkingCopy } from '../../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../../policies/project-permissions.ts'
import { revisionOrNewest } from '../../review/find-revision.ts'
import { frozenContent } from '../../review/frozen.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { presentSpec } from './spec.presenter.ts'
import { savedSpec } from './spec.queries.ts'

/** The working copy for those who may see it; the frozen text of `?rev=`, or of the newest issue, for the others. */
export const specRouter = (deps: Deps): Router =>
  Router({ mergeParams: true })
    .get('/', async (req, res) => {
      const access = accessIn(res)
      const facts = await projectFacts(deps.db, access.project)
      const rev = queryText(req, 'rev')
      if (rev === undefined && seesWorkingCopy(access)) {
        const spec = await savedSpec(deps.db, access.project.id)
        if (!spec) throw notFound()
        res.json(presentSpec(spec, projectPermissions(access, facts).editSpec.why ?? null))
        return
      }
      const revision = revisionOrNewest(facts, rev)
      const { specText } = await frozenContent(deps.db, revision.id)
      const by = facts.people.get(revision.issuedBy)
      const savedBy = { id: revision.issuedBy, name: by?.name ?? '', initials: by?.initials ?? '' }
      res.json(
        presentSpec(
          { text: specText, version: 0, savedAt: revision.issuedAt, savedBy },
          `${revisionTitle(revision.label)} is frozen as it was issued.`,
        ),
      )
    })
    .put('/', async (req, res) => {
      const access = accessIn(res)
      const facts = await projectFacts(deps.db, access.project)
      requirePermission(projectPermissions(access, facts).editSpec)
      res.json(presentSpec(await saveSpec(deps, access, parseBody(SaveSpecRequest, req)), null))
    })

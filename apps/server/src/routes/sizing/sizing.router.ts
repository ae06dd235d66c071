import { SizeTextRequest } from '@coldfill/contract'
import { Router } from 'express'
import { catalogueInForce } from '../../catalogue/catalogue-in-force.ts'
import type { Deps } from '../../deps.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { parseBody } from '../../parse-request.ts'
import { projectPermissions, requirePermission } from '../../policies/project-permissions.ts'
import { projectFacts } from '../../review/project-facts.ts'

/** Sizes a text as it is typed. Nothing is saved. */
export const sizingRouter = (deps: Deps): Router =>
  Router({ mergeParams: true }).post('/', async (req, res) => {
    const access = accessIn(res)
    requirePermission(projectPermissions(access, await projectFacts(deps.db, access.project)).editSpec)
    const { text } = parseBody(SizeTextRequest, req)
    const { json } = await deps.sizing.size(text, await catalogueInForce(deps.db, access.project.officeId))
    res.type('application/json').send(json)
  })

import {
  CreateProjectRequest,
  type MemberList,
  type Project,
  type ProjectList,
  SetMemberRequest,
} from '@coldfill/contract'
import { Router } from 'express'
import { z } from 'zod'
import { createProject } from '../../commands/create-project.ts'
import { setMember } from '../../commands/set-member.ts'
import type { Deps } from '../../deps.ts'
import { AppError, notAllowed, notFound } from '../../errors.ts'
import { accessIn, requireInsider, requireProject } from '../../middleware/require-project.ts'
import { principalIn } from '../../middleware/require-user.ts'
import { parseBody } from '../../parse-request.ts'
import { type ProjectAccess, projectAccess, seesWorkingCopy } from '../../policies/project-access.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { workingCopy } from '../../review/working-copy.ts'
import { presentMembers, presentProject, presentSummary } from './projects.presenter.ts'
import { visibleProjects } from './projects.queries.ts'

/** Hash of the working copy; null where the person may not see it or it cannot be sized. */
const workingHash = async (deps: Deps, access: ProjectAccess): Promise<string | null> => {
  if (!seesWorkingCopy(access)) return null
  try {
    return (await workingCopy(deps.db, deps.sizing, access.project)).contentHash
  } catch (error) {
    if (error instanceof AppError && error.status === 422) return null
    throw error
  }
}

const present = async (deps: Deps, access: ProjectAccess): Promise<Project> =>
  presentProject(access, await projectFacts(deps.db, access.project), await workingHash(deps, access))

export const projectsRouter = (deps: Deps): Router => {
  const router = Router()
    .get('/', async (_req, res) => {
      const principal = principalIn(res)
      const summaries: ProjectList['projects'] = []
      for (const { project, roles } of await visibleProjects(deps.db, principal)) {
        const access = { principal, project, roles, administrator: principal.administrator }
        summaries.push(presentSummary(access, await projectFacts(deps.db, project)))
      }
      res.json({ projects: summaries } satisfies ProjectList)
    })
    .post('/', async (req, res) => {
      const principal = principalIn(res)
      if (!principal.mayCreateProjects) throw notAllowed('The administrator of the office says who opens projects.')
      const number = await createProject(deps, principal, parseBody(CreateProjectRequest, req))
      res.status(201).json(await present(deps, await projectAccess(deps.db, principal, number)))
    })
  router.get('/:project', requireProject(deps), requireInsider, async (_req, res) => {
    res.json(await present(deps, accessIn(res)))
  })
  router.put<'/:project/members/:user', { project: string; user: string }>(
    '/:project/members/:user',
    requireProject(deps),
    requireInsider,
    async (req, res) => {
      const access = accessIn(res)
      if (!access.administrator) throw notAllowed('Only the administrator of the office gives roles.')
      if (!z.uuid().safeParse(req.params.user).success) throw notFound()
      await setMember(deps, access, req.params.user, parseBody(SetMemberRequest, req))
      res.json({ members: presentMembers(await projectFacts(deps.db, access.project)) } satisfies MemberList)
    },
  )
  return router
}

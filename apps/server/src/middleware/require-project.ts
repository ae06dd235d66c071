import type { RequestHandler, Response } from 'express'
import type { Deps } from '../deps.ts'
import { type ProjectAccess, projectAccess, requireInside } from '../policies/project-access.ts'
import { principalIn } from './require-user.ts'

/** Lets a request through with the project of its address, where the person may know of it. */
export const requireProject =
  ({ db }: Deps): RequestHandler<{ project: string }> =>
  async (req, res, next) => {
    res.locals['access'] = await projectAccess(db, principalIn(res), req.params.project)
    next()
  }

/** Stops one who sees the handover only: for them the rest of the project does not exist. */
export const requireInsider: RequestHandler = (_req, res, next) => {
  requireInside(accessIn(res))
  next()
}

/** Programmer's mistake where the route does not stand behind requireProject: throws. */
export const accessIn = (res: Response): ProjectAccess => {
  const access = res.locals['access'] as ProjectAccess | undefined
  if (!access) throw new Error('This route does not require a project.')
  return access
}

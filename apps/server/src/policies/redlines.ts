import type { Redline } from '@coldfill/contract'
import { AppError, notAllowed, notFound } from '../errors.ts'
import { is, type ProjectAccess } from './project-access.ts'

interface Subject {
  readonly authorId: string
  readonly state: 'pending' | 'open' | 'closed'
}

/** What a person may do with one redline. Its opener and any reviewer close it; nobody deletes one that was published. */
export const redlinePermissions = (access: ProjectAccess, redline: Subject): Redline['may'] => {
  const own = redline.authorId === access.principal.userId
  const reviewer = is(access, 'reviewer')
  const takesPart = reviewer || is(access, 'consultant')
  return {
    edit: own && redline.state === 'pending',
    remove: own && redline.state === 'pending',
    reply: takesPart && redline.state === 'open',
    close: (reviewer || own) && redline.state === 'open',
    reopen: (reviewer || own) && redline.state === 'closed',
  }
}

/** @throws {AppError} 404 for the pending redline of another, 403 or 409 with the reason where the act is not open */
export const requireRedline = (access: ProjectAccess, redline: Subject, act: keyof Redline['may']): void => {
  if (redline.state === 'pending' && redline.authorId !== access.principal.userId) throw notFound()
  if (redlinePermissions(access, redline)[act]) return
  if (!is(access, 'reviewer') && !is(access, 'consultant'))
    throw notAllowed('Only members who review or consult take part in redlines.')
  if (act === 'close' || act === 'reopen')
    if (!is(access, 'reviewer') && redline.authorId !== access.principal.userId)
      throw notAllowed('The person who opened the redline or a reviewer closes and reopens it.')
  if ((act === 'edit' || act === 'remove') && redline.authorId !== access.principal.userId)
    throw notAllowed('Only its author changes a pending redline.')
  throw new AppError(409, 'wrong_state', 'The redline is in another state', `It is ${redline.state}.`)
}

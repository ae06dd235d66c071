import type { Redline } from '@coldfill/contract'
import { AppError, notAllowed, notFound } from '../errors.ts'
import { is, type ProjectAccess, seesWorkingCopy } from './project-access.ts'

interface Subject {
  readonly authorId: string
  readonly state: 'pending' | 'open' | 'closed'
  readonly officeOnly: boolean
}

/** Whether a person may know of a redline: a pending one is its author's, one for the office the consultants' and administrator's. */
export const seesRedline = (access: ProjectAccess, redline: Subject): boolean =>
  (redline.state !== 'pending' || redline.authorId === access.principal.userId) &&
  (!redline.officeOnly || seesWorkingCopy(access))

/** What a person may do with one redline. Its opener and any reviewer close it; nobody deletes one that was published. */
export const redlinePermissions = (access: ProjectAccess, redline: Subject): Redline['may'] => {
  const own = redline.authorId === access.principal.userId
  const reviewer = is(access, 'reviewer')
  const takesPart = reviewer || is(access, 'consultant')
  const settles = own || (redline.officeOnly ? is(access, 'consultant') : reviewer)
  return {
    edit: own && redline.state === 'pending',
    remove: own && redline.state === 'pending',
    reply: takesPart && redline.state === 'open',
    close: settles && redline.state === 'open',
    reopen: settles && redline.state === 'closed',
  }
}

/** @throws {AppError} 404 for one that the person may not know of, 403 or 409 with the reason where the act is not open */
export const requireRedline = (access: ProjectAccess, redline: Subject, act: keyof Redline['may']): void => {
  if (!seesRedline(access, redline)) throw notFound()
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

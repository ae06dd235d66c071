import { type Permission, type Permissions, revisionTitle } from '@coldfill/contract'
import { notAllowed } from '../errors.ts'
import { constructionRevision, newestRevision, revisionState } from '../review/standing.ts'
import type { ProjectFacts } from '../review/project-facts.ts'
import { is, type ProjectAccess, seesHandoverOnly, seesWorkingCopy } from './project-access.ts'

const yes: Permission = { allowed: true }
const no = (why: string): Permission => ({ allowed: false, why })

/** The first reason against it, or leave to do it. */
const unless = (...reasons: (string | false)[]): Permission => {
  const why = reasons.find((reason) => reason !== false)
  return why === undefined ? yes : no(why)
}

const NOTHING_ISSUED = 'Nothing has been issued for review yet.'

/** The table of who may do what, with the standing of the project put in. Each route asks it; the screens show its reasons. */
export const projectPermissions = (access: ProjectAccess, facts: ProjectFacts): Permissions => {
  const consultant = is(access, 'consultant')
  const reviewer = is(access, 'reviewer')
  const newest = newestRevision(facts)
  const title = newest ? revisionTitle(newest.label) : ''
  const state = newest ? revisionState(facts, newest) : null
  const making = facts.makings.some((row) => row.problem === null)
  const inForce = constructionRevision(facts)
  return {
    editSpec: unless(!consultant && 'Only a consultant of the project edits the spec.'),
    seeWorkingCopy: unless(!seesWorkingCopy(access) && 'Reviewers see what is issued, not the working copy.'),
    redline: unless(
      !reviewer && 'Only a reviewer of the project redlines.',
      !newest && NOTHING_ISSUED,
      state === 'issued for construction' && `${title} is issued for construction. Redline the next revision.`,
    ),
    officeRedline: unless(
      !consultant && 'Only a consultant of the project writes for the office only.',
      !newest && NOTHING_ISSUED,
    ),
    reply: unless(!consultant && !reviewer && 'Only a consultant or a reviewer of the project replies.'),
    dispose: unless(
      !reviewer && 'Only a reviewer of the project sets a disposition.',
      !newest && NOTHING_ISSUED,
      state === 'issued for construction' && `${title} is issued for construction.`,
    ),
    issueForReview: unless(
      !consultant && 'Only a consultant of the project issues a revision.',
      making && 'Files of a revision are being made.',
    ),
    issueForConstruction: unless(
      !consultant && 'Only a consultant of the project issues for construction.',
      !newest && NOTHING_ISSUED,
      state === 'issued for construction' && `${title} is issued for construction already.`,
      making && 'Files of a revision are being made.',
    ),
    withdraw: unless(
      !consultant && !access.administrator && 'Only a consultant or the administrator withdraws a revision.',
      !newest && 'There is no revision to withdraw.',
    ),
    download: seesHandoverOnly(access)
      ? unless(!inForce && 'Nothing is issued for construction yet.')
      : unless(facts.files.length === 0 && 'No files have been made yet.'),
  }
}

/** @throws {AppError} 403 with the reason */
export const requirePermission = (permission: Permission): void => {
  if (!permission.allowed) throw notAllowed(permission.why ?? 'This is not open to you.')
}

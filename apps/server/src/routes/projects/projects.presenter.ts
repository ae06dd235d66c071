import type { Project, ProjectState, ProjectSummary, Sheet } from '@coldfill/contract'
import { is, type ProjectAccess, seesHandoverOnly, seesWorkingCopy } from '../../policies/project-access.ts'
import { projectPermissions } from '../../policies/project-permissions.ts'
import type { ProjectFacts } from '../../review/project-facts.ts'
import { revisionLetter } from '../../review/revision-letter.ts'
import { constructionRevision, newestRevision, revisionState, standingDispositions } from '../../review/standing.ts'
import { presentRevision } from '../revisions/revisions.presenter.ts'
import { nextStep, waitingOn } from './next-step.ts'

const projectState = (access: ProjectAccess, facts: ProjectFacts): ProjectState => {
  if (seesHandoverOnly(access)) {
    if (constructionRevision(facts)) return 'issued for construction'
    return facts.revisions.some((row) => row.constructionAt && row.withdrawnAt) ? 'withdrawn' : 'not issued'
  }
  const newest = newestRevision(facts)
  if (!newest) return facts.revisions.length > 0 ? 'withdrawn' : 'working copy'
  const state = revisionState(facts, newest)
  // The newest revision is never one that another took the place of.
  return state === 'superseded' ? 'working copy' : state
}

const sheetsOf = (access: ProjectAccess, facts: ProjectFacts): Sheet[] => {
  if (seesHandoverOnly(access)) return ['handover']
  if (!seesWorkingCopy(access) && facts.revisions.length === 0) return ['cover']
  return ['cover', 'spec', 'schedule', 'basis', 'redlines', 'issue', 'handover']
}

const lastIssue = (access: ProjectAccess, facts: ProjectFacts): ProjectSummary['lastIssue'] => {
  const issues = facts.revisions.flatMap((row) => [
    ...(row.constructionAt
      ? [{ revision: row.label, purpose: 'construction' as const, at: row.constructionAt, row }]
      : []),
    ...(seesHandoverOnly(access) ? [] : [{ revision: row.label, purpose: 'review' as const, at: row.issuedAt, row }]),
  ])
  const shown = seesHandoverOnly(access)
    ? issues.filter(({ row }) => row.id === constructionRevision(facts)?.id)
    : issues
  const last = shown.reduce<(typeof shown)[number] | null>(
    (best, one) => (!best || one.at > best.at ? one : best),
    null,
  )
  return last ? { revision: last.revision, purpose: last.purpose, date: last.at.toISOString() } : null
}

const waitsOn = (access: ProjectAccess, facts: ProjectFacts): boolean => {
  const me = access.principal.userId
  const newest = newestRevision(facts)
  const state = newest ? revisionState(facts, newest) : null
  if (is(access, 'consultant')) {
    if (state === null || state === 'revise' || state === 'rejected' || state === 'accepted') return true
    if (facts.openThreads.some((thread) => thread.waitingOn === 'consultant')) return true
  }
  if (is(access, 'reviewer') && newest) {
    const mine = standingDispositions(facts, newest).find(({ row }) => row.reviewerId === me)
    if (state !== 'issued for construction' && (!mine || mine.stale)) return true
    return facts.openThreads.some((thread) => thread.waitingOn === 'reviewer' && thread.authorId === me)
  }
  return false
}

export const presentSummary = (access: ProjectAccess, facts: ProjectFacts): ProjectSummary => ({
  number: facts.project.number,
  title: facts.project.title,
  client: facts.project.client,
  roles: [...access.roles],
  state: projectState(access, facts),
  revision: (seesHandoverOnly(access) ? constructionRevision(facts) : facts.revisions[0])?.label ?? null,
  openRedlines: seesHandoverOnly(access) ? 0 : facts.openThreads.length,
  waitingOnYou: waitsOn(access, facts),
  lastIssue: lastIssue(access, facts),
  sheets: sheetsOf(access, facts),
})

export const presentMembers = (facts: ProjectFacts): Project['members'] =>
  facts.members.map(({ id, name, initials, roles, requiredReviewer }) => ({
    id,
    name,
    initials,
    roles: [...roles],
    requiredReviewer,
  }))

/** `workingHash` is the content hash of the working copy, where the person may see it. */
export const presentProject = (access: ProjectAccess, facts: ProjectFacts, workingHash: string | null): Project => {
  const differs = workingHash === null ? null : facts.revisions[0]?.contentHash !== workingHash
  const by = (role: 'consultant' | 'reviewer' | 'contractor', part: string) =>
    facts.members.filter(({ roles }) => roles.includes(role)).map(({ name }) => ({ part, name }))
  return {
    ...presentSummary(access, facts),
    office: access.principal.office,
    parties: [
      ...(facts.project.client === '' ? [] : [{ part: 'Prepared for', name: facts.project.client }]),
      { part: 'Prepared by', name: access.principal.office.name },
      ...by('consultant', 'Consultant'),
      ...by('reviewer', 'Reviewer'),
      ...by('contractor', 'Contractor'),
    ],
    members: presentMembers(facts),
    permissions: projectPermissions(access, facts),
    revisions: facts.revisions.map((row) => presentRevision(facts, row)),
    nextRevision: revisionLetter(facts.revisions.length),
    workingCopyDiffers: differs,
    nextStep: nextStep(facts, differs),
    waitingOn: waitingOn(facts),
  }
}

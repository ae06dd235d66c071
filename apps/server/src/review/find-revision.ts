import { revisionLabel } from '@coldfill/contract'
import { notFound } from '../errors.ts'
import type { ProjectFacts, RevisionRow } from './project-facts.ts'

/** The revision that an address names: '-' is the first issue. @throws {AppError} 404 */
export const findRevision = (facts: ProjectFacts, segment: string): RevisionRow => {
  const revision = facts.revisions.find(({ label }) => label === revisionLabel(segment))
  if (!revision) throw notFound()
  return revision
}

/** The revision that `?rev=` names, else the newest there is. @throws {AppError} 404 where there is none */
export const revisionOrNewest = (facts: ProjectFacts, segment: string | undefined): RevisionRow => {
  if (segment !== undefined) return findRevision(facts, segment)
  const [newest] = facts.revisions
  if (!newest) throw notFound()
  return newest
}

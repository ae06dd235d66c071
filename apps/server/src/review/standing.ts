import type { RevisionState } from '@coldfill/contract'
import { type DispositionRow, type ProjectFacts, requiredReviewers, type RevisionRow } from './project-facts.ts'

/** A reviewer's last word as it stands towards one revision. */
export interface StandingDisposition {
  readonly row: DispositionRow
  readonly required: boolean
  /** The content it was set on is not the content of the revision. */
  readonly stale: boolean
}

/**
 * The dispositions of a revision. A disposition is bound to content, not to a letter: on the newest revision each reviewer's last word
 * counts wherever it was set, and is stale where the content is another.
 */
export const standingDispositions = (facts: ProjectFacts, revision: RevisionRow): StandingDisposition[] => {
  const isNewest = facts.revisions[0]?.id === revision.id
  const last = new Map<string, DispositionRow>()
  for (const row of facts.dispositions) if (isNewest || row.revisionId === revision.id) last.set(row.reviewerId, row)
  const required = new Set(requiredReviewers(facts).map((member) => member.id))
  return [...last.values()].map((row) => ({
    row,
    required: required.has(row.reviewerId),
    stale: row.contentHash !== revision.contentHash,
  }))
}

const ACCEPTING = new Set(['accepted', 'accepted_noted', 'information'])

export const isAccepting = (row: DispositionRow): boolean => ACCEPTING.has(row.outcome)

export const revisionState = (facts: ProjectFacts, revision: RevisionRow): RevisionState => {
  if (revision.withdrawnAt) return 'withdrawn'
  if (revision.supersededAt) return 'superseded'
  if (revision.constructionAt) return 'issued for construction'
  const fresh = standingDispositions(facts, revision).filter((standing) => !standing.stale)
  if (fresh.some(({ row }) => row.outcome === 'rejected')) return 'rejected'
  if (fresh.some(({ row }) => row.outcome === 'revise')) return 'revise'
  const accepted = new Set(fresh.filter(({ row }) => isAccepting(row)).map(({ row }) => row.reviewerId))
  const required = requiredReviewers(facts)
  return required.length > 0 && required.every((member) => accepted.has(member.id)) ? 'accepted' : 'in review'
}

/** The revision in force on site; null where none is. */
export const constructionRevision = (facts: ProjectFacts): RevisionRow | null =>
  facts.revisions.find((row) => row.constructionAt && !row.supersededAt && !row.withdrawnAt) ?? null

/** The revision that is under review or in force: the newest that nothing has taken the place of. Null where there is none. */
export const newestRevision = (facts: ProjectFacts): RevisionRow | null =>
  facts.revisions.find((row) => !row.withdrawnAt && !row.supersededAt) ?? null

import {
  type FileSet,
  type Making,
  type Person,
  type Revision,
  type RevisionFile,
  revisionSegment,
} from '@coldfill/contract'
import { MAKING_STAGES } from '../../documents/making-stages.ts'
import type { FileRow, FileSetRow, MakingRow, ProjectFacts, RevisionRow } from '../../review/project-facts.ts'
import { revisionState, standingDispositions } from '../../review/standing.ts'

const presentPerson = (facts: ProjectFacts, id: string): Person => {
  const person = facts.people.get(id)
  return { id, name: person?.name ?? 'A former member', initials: person?.initials ?? '–' }
}

export const presentFile = (project: string, revision: RevisionRow, file: FileRow): RevisionFile => ({
  name: file.name,
  kind: file.kind,
  set: file.set,
  size: file.size,
  sha256: file.sha256,
  href: `/api/projects/${project}/revisions/${revisionSegment(revision.label)}/files/${encodeURIComponent(file.name)}`,
})

const presentFileSet = (row: FileSetRow): FileSet => ({
  set: row.set,
  contents: { units: row.units, redlines: row.withRedlines, verification: row.withVerification },
  noPages: row.noPages,
  noPdf: row.noPdf,
})

const presentMaking = (making: MakingRow): Making => ({
  set: making.set,
  stage: making.stage + 1,
  of: MAKING_STAGES.length,
  name: MAKING_STAGES[making.stage] ?? MAKING_STAGES[0],
  problem: making.problem,
})

export const presentRevision = (facts: ProjectFacts, revision: RevisionRow): Revision => {
  const making = facts.makings.find((row) => row.revisionId === revision.id)
  const labels = new Map(facts.revisions.map((row) => [row.id, row.label]))
  return {
    id: revision.id,
    label: revision.label,
    state: revisionState(facts, revision),
    purpose: revision.constructionAt ? 'construction' : 'review',
    issuedAt: revision.issuedAt.toISOString(),
    issuedBy: presentPerson(facts, revision.issuedBy),
    note: revision.note,
    contentHash: revision.contentHash,
    engine: revision.engine,
    files: facts.files
      .filter((file) => file.revisionId === revision.id)
      .map((file) => presentFile(facts.project.number, revision, file)),
    sets: facts.fileSets.filter((row) => row.revisionId === revision.id).map(presentFileSet),
    making: making ? presentMaking(making) : null,
    dispositions: standingDispositions(facts, revision).map(({ row, required, stale }) => ({
      reviewer: presentPerson(facts, row.reviewerId),
      required,
      outcome: row.outcome,
      reason: row.reason,
      at: row.setAt.toISOString(),
      contentHash: row.contentHash,
      revision: labels.get(row.revisionId) ?? '',
      stale,
    })),
    constructionIssue:
      revision.constructionAt && revision.constructionBy
        ? {
            at: revision.constructionAt.toISOString(),
            by: presentPerson(facts, revision.constructionBy),
            override: revision.overrideReason === null ? null : { reason: revision.overrideReason },
          }
        : null,
    withdrawal:
      revision.withdrawnAt && revision.withdrawnBy
        ? {
            at: revision.withdrawnAt.toISOString(),
            by: presentPerson(facts, revision.withdrawnBy),
            reason: revision.withdrawReason ?? '',
          }
        : null,
  }
}

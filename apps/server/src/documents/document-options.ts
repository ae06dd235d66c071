import { OUTCOME_LABELS } from '@coldfill/contract'
import type { DispositionEntry, DocumentOptions, RedlineEntry, RevisionEntry } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import type { AssumptionChange } from '../review/assumption-changes.ts'
import type { MakingRow, ProjectFacts, RevisionRow } from '../review/project-facts.ts'
import { isAccepting, standingDispositions } from '../review/standing.ts'
import type { StoredTitleBlock } from '../title-block/stored-title-block.ts'

/** The words by which @coldfill/documents leaves out the draft warning. Its code runs in a thread and is not loaded here. */
export const CONSTRUCTION_STATUS = 'Issued for construction'
const REVIEW_STATUS = 'Issued for review'

const day = (date: Date): string => date.toISOString().slice(0, 10)

const constructionPurpose = (override: string | null): string =>
  override === null ? CONSTRUCTION_STATUS : `${CONSTRUCTION_STATUS}. Gates overridden: ${override}`

/** The revision block as it stands when these files are made, newest first. */
const revisionBlock = (facts: ProjectFacts, revision: RevisionRow, order: Order): RevisionEntry[] => {
  const name = (id: string | null): string => (id === null ? '' : (facts.people.get(id)?.name ?? ''))
  const entries: RevisionEntry[] = []
  if (order.set === 'construction')
    entries.push({
      revision: revision.label,
      date: day(order.askedAt),
      purpose: constructionPurpose(order.overrideReason),
      by: name(order.askedBy),
    })
  for (const row of facts.revisions) {
    if (row.sequence > revision.sequence) continue
    if (row.constructionAt && row.id !== revision.id)
      entries.push({
        revision: row.label,
        date: day(row.constructionAt),
        purpose: constructionPurpose(row.overrideReason),
        by: name(row.constructionBy),
      })
    entries.push({ revision: row.label, date: day(row.issuedAt), purpose: REVIEW_STATUS, by: name(row.issuedBy) })
  }
  return entries
}

/** The reviewers' last words on this content, in the words of the office. */
const dispositionsOf = (facts: ProjectFacts, revision: RevisionRow): DispositionEntry[] =>
  standingDispositions(facts, revision).map(({ row, stale }) => ({
    reviewer: facts.people.get(row.reviewerId)?.name ?? '',
    outcome: OUTCOME_LABELS[row.outcome],
    reason: row.reason,
    date: day(row.setAt),
    stale,
  }))

/** What the files are asked for with. */
export type Order = Pick<
  MakingRow,
  'set' | 'askedAt' | 'askedBy' | 'overrideReason' | 'units' | 'withRedlines' | 'withVerification' | 'titleBlockId'
>

/** Parts of a document that are read from the store. */
export interface Enclosed {
  readonly comparison: DocumentOptions['comparison']
  readonly assumptionChanges: readonly AssumptionChange[]
  /** Null where the order asks for none. */
  readonly redlines: readonly RedlineEntry[] | null
  /** The office's title block of the order; null where it has none of its own. */
  readonly titleBlock: StoredTitleBlock | null
}

const ofOffice = (stored: StoredTitleBlock | null, office: string) => ({
  office: stored?.name ?? office,
  ...(stored ? { lines: stored.lines, captions: stored.captions } : {}),
})

export const documentOptions = (
  facts: ProjectFacts,
  office: string,
  revision: RevisionRow,
  order: Order,
  result: ProjectResult,
  { comparison, assumptionChanges, redlines, titleBlock }: Enclosed,
): DocumentOptions => {
  const forConstruction = order.set === 'construction'
  const accepting = standingDispositions(facts, revision).filter(({ row, stale }) => !stale && isAccepting(row))
  const reviewers = accepting
    .map(({ row }) => facts.people.get(row.reviewerId)?.name ?? '')
    .filter((name) => name !== '')
  const prepared = facts.people.get(revision.issuedBy)?.name
  const approved = facts.people.get(order.askedBy)?.name
  return {
    units: order.units ?? result.project.units,
    titleBlock: {
      ...ofOffice(titleBlock, office),
      ...(prepared === undefined ? {} : { preparedBy: prepared }),
      ...(forConstruction && reviewers.length > 0 ? { checkedBy: reviewers.join(', ') } : {}),
      ...(forConstruction && approved !== undefined ? { approvedBy: approved } : {}),
      date: day(forConstruction ? order.askedAt : revision.issuedAt),
      revision: revision.label,
      status: forConstruction ? CONSTRUCTION_STATUS : REVIEW_STATUS,
    },
    revisions: revisionBlock(facts, revision, order),
    ...(comparison ? { comparison } : {}),
    assumptionChanges: assumptionChanges.map(({ assumption, by, at }) => ({ assumption, by, date: day(at) })),
    ...(redlines ? { redlines } : {}),
    ...(titleBlock?.logo ? { logo: titleBlock.logo } : {}),
    ...(titleBlock && titleBlock.paper !== 'by units' ? { paper: titleBlock.paper } : {}),
    ...(forConstruction ? { dispositions: dispositionsOf(facts, revision) } : {}),
    ...(forConstruction && order.overrideReason !== null
      ? { override: { reason: order.overrideReason, by: approved ?? '', date: day(order.askedAt) } }
      : {}),
    contentHash: revision.contentHash,
  }
}

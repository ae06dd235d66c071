import { eq } from 'drizzle-orm'
import type { DocumentOptions } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import type { Database } from '../db/client.ts'
import { offices, projects, revisions } from '../db/schema/index.ts'
import { changedAssumptions } from '../review/assumption-changes.ts'
import { changedResults } from '../review/changed-results.ts'
import { frozenContent } from '../review/frozen.ts'
import { type ProjectFacts, projectFacts, type RevisionRow } from '../review/project-facts.ts'
import { redlineEntries } from '../review/redline-entries.ts'
import { storedTitleBlock } from '../title-block/stored-title-block.ts'
import { documentOptions, type Order } from './document-options.ts'

export interface Gathered {
  readonly facts: ProjectFacts
  readonly revision: RevisionRow
  readonly result: ProjectResult
  readonly options: DocumentOptions
}

/**
 * Reads what the documents of a revision are written from; null where the revision is gone. Where the order asks for redlines they
 * are those of `redlinesAt`.
 */
export const gatherDocuments = async (
  db: Database,
  revisionId: string,
  redlinesAt: Date,
  orderFor: (facts: ProjectFacts, revision: RevisionRow) => Order,
): Promise<Gathered | null> => {
  const [found] = await db
    .select({ project: projects, office: offices.name })
    .from(revisions)
    .innerJoin(projects, eq(projects.id, revisions.projectId))
    .innerJoin(offices, eq(offices.id, projects.officeId))
    .where(eq(revisions.id, revisionId))
  if (!found) return null
  const facts = await projectFacts(db, found.project)
  const revision = facts.revisions.find((row) => row.id === revisionId)
  if (!revision) return null
  const order = orderFor(facts, revision)
  const { result } = await frozenContent(db, revision.id)
  const before = facts.revisions.find((row) => row.sequence === revision.sequence - 1)
  const options = documentOptions(facts, found.office, revision, order, result, {
    comparison: before && {
      revision: before.label,
      changed: changedResults((await frozenContent(db, before.id)).result, result),
    },
    assumptionChanges: await changedAssumptions(db, found.project.id, result, revision.issuedAt),
    redlines: order.withRedlines ? await redlineEntries(db, facts, revision, redlinesAt) : null,
    titleBlock: await storedTitleBlock(db, order.titleBlockId),
  })
  return { facts, revision, result, options }
}

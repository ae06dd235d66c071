import { and, eq } from 'drizzle-orm'
import type { Database } from '../db/client.ts'
import { reviewCopies } from '../db/schema/index.ts'
import { sha256 } from '../review/content-hash.ts'
import type { ProjectFacts, RevisionRow } from '../review/project-facts.ts'
import type { Order } from './document-options.ts'
import { gatherDocuments } from './gather-documents.ts'
import type { Maker } from './make-files.ts'
import { writeDocuments } from './write-documents.ts'

type CopyRow = typeof reviewCopies.$inferSelect

/** Changes what is known of a review copy, unless another was asked for in the meantime. */
export const noteReviewCopy = async (db: Database, copy: CopyRow, values: Partial<CopyRow>): Promise<void> => {
  await db
    .update(reviewCopies)
    .set(values)
    .where(and(eq(reviewCopies.revisionId, copy.revisionId), eq(reviewCopies.askedAt, copy.askedAt)))
}

/** The revision as it was issued last, with its redlines. */
const orderFor = (facts: ProjectFacts, revision: RevisionRow): Order => {
  const set = revision.constructionAt ? 'construction' : 'review'
  const made = facts.fileSets.find((row) => row.revisionId === revision.id && row.set === set)
  return {
    set,
    askedAt: revision.constructionAt ?? revision.issuedAt,
    askedBy: revision.constructionBy ?? revision.issuedBy,
    overrideReason: revision.overrideReason,
    units: made?.units ?? null,
    withRedlines: true,
    withVerification: false,
    titleBlockId: made?.titleBlockId ?? null,
  }
}

/** Makes and stores one review copy. */
export const makeReviewCopy = async (
  { db, printer }: Pick<Maker, 'db' | 'printer'>,
  copy: CopyRow,
  signal: AbortSignal,
): Promise<void> => {
  const gathered = await gatherDocuments(db, copy.revisionId, copy.askedAt, orderFor)
  if (!gathered) return
  const { result, options } = gathered
  const written = await writeDocuments(
    { write: 'review copy', result, options, withVerification: false },
    printer,
    () => undefined,
    signal,
  )
  const [file] = written.files
  if (!file) throw new Error('The thread gave no review copy.')
  await noteReviewCopy(db, copy, {
    name: file.name,
    redlines: options.redlines?.length ?? 0,
    size: file.content.byteLength,
    sha256: sha256(file.content),
    content: file.content,
  })
}

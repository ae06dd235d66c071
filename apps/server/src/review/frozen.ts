import type { ProjectResult } from '@coldfill/sizing'
import { eq } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { catalogues, revisions } from '../db/schema/index.ts'
import { contentHash, sha256 } from './content-hash.ts'

export interface Frozen {
  readonly specText: string
  readonly resultJson: string
  readonly result: ProjectResult
  readonly contentHash: string
}

/**
 * The frozen content of a revision. Its hash is worked out anew each time it is read: what reviewers judged is what is shown, or
 * nothing is.
 * @throws where the stored content is not the one that was frozen
 */
export const frozenContent = async (db: Reader, revisionId: string): Promise<Frozen> => {
  const [row] = await db
    .select({
      specText: revisions.specText,
      resultJson: revisions.resultJson,
      engine: revisions.engine,
      contentHash: revisions.contentHash,
      rowsJson: catalogues.rowsJson,
    })
    .from(revisions)
    .leftJoin(catalogues, eq(catalogues.id, revisions.catalogueId))
    .where(eq(revisions.id, revisionId))
  if (!row) throw new Error(`There is no revision ${revisionId}.`)
  const { rowsJson, ...frozen } = row
  const catalogueHash = rowsJson === null ? null : sha256(rowsJson)
  if (contentHash(row.engine, row.specText, row.resultJson, catalogueHash) !== row.contentHash)
    throw new Error(`The stored content of revision ${revisionId} is not the content that was frozen.`)
  return { ...frozen, result: JSON.parse(row.resultJson) as ProjectResult }
}

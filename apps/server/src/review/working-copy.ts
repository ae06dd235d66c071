import { eq } from 'drizzle-orm'
import { type CatalogueInForce, catalogueInForce } from '../catalogue/catalogue-in-force.ts'
import type { Reader } from '../db/client.ts'
import { specs } from '../db/schema/index.ts'
import { notFound } from '../errors.ts'
import type { Sized, SizingService } from '../sizing-service.ts'
import { contentHash } from './content-hash.ts'
import type { ProjectRow } from './project-facts.ts'

export interface WorkingCopy extends Sized {
  readonly text: string
  readonly version: number
  readonly catalogue: CatalogueInForce | null
  readonly contentHash: string
}

/** The saved text of a project, sized now with the catalogue of its office. @throws {AppError} 422 where it cannot be sized */
export const workingCopy = async (
  db: Reader,
  sizing: SizingService,
  project: Pick<ProjectRow, 'id' | 'officeId'>,
): Promise<WorkingCopy> => {
  const [row] = await db
    .select({ text: specs.text, version: specs.version })
    .from(specs)
    .where(eq(specs.projectId, project.id))
  if (!row) throw notFound()
  const catalogue = await catalogueInForce(db, project.officeId)
  const sized = await sizing.size(row.text, catalogue)
  return {
    ...row,
    ...sized,
    catalogue,
    contentHash: contentHash(sized.result.engine, row.text, sized.json, catalogue?.hash ?? null),
  }
}

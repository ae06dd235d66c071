import { eq } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { specs } from '../db/schema/index.ts'
import { notFound } from '../errors.ts'
import type { Sized, SizingService } from '../sizing-service.ts'
import { contentHash } from './content-hash.ts'

export interface WorkingCopy extends Sized {
  readonly text: string
  readonly version: number
  readonly contentHash: string
}

/** The saved text of a project, sized now. @throws {AppError} 422 where it cannot be sized */
export const workingCopy = async (db: Reader, sizing: SizingService, projectId: string): Promise<WorkingCopy> => {
  const [row] = await db
    .select({ text: specs.text, version: specs.version })
    .from(specs)
    .where(eq(specs.projectId, projectId))
  if (!row) throw notFound()
  const sized = await sizing.size(row.text)
  return { ...row, ...sized, contentHash: contentHash(sized.result.engine, row.text, sized.json) }
}

import { and, eq } from 'drizzle-orm'
import type { Reader } from '../../db/client.ts'
import { revisionFiles } from '../../db/schema/index.ts'

export const storedFile = async (db: Reader, revisionId: string, name: string) => {
  const [row] = await db
    .select()
    .from(revisionFiles)
    .where(and(eq(revisionFiles.revisionId, revisionId), eq(revisionFiles.name, name)))
  return row ?? null
}

import { desc, eq, getTableColumns } from 'drizzle-orm'
import type { Reader } from '../../db/client.ts'
import { catalogues } from '../../db/schema/index.ts'

const MOST_EARLIER = 50
const { rowsJson: _rowsJson, problemsJson: _problemsJson, ...light } = getTableColumns(catalogues)

/** Catalogues of an office, newest first, without their rows. */
export const officeCatalogues = (db: Reader, officeId: string) =>
  db
    .select(light)
    .from(catalogues)
    .where(eq(catalogues.officeId, officeId))
    .orderBy(desc(catalogues.uploadedAt))
    .limit(MOST_EARLIER + 1)

export const catalogueContent = async (db: Reader, id: string) => {
  const [row] = await db
    .select({ rowsJson: catalogues.rowsJson, problemsJson: catalogues.problemsJson })
    .from(catalogues)
    .where(eq(catalogues.id, id))
  return row ?? { rowsJson: '[]', problemsJson: '[]' }
}

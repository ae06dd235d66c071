import { and, eq, isNull } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { catalogues } from '../db/schema/index.ts'
import type { SizingCatalogue } from '../sizing-service.ts'

export interface CatalogueInForce extends SizingCatalogue {
  readonly id: string
}

/** The catalogue that an office chooses vessels from now. Its rows are read only when somebody asks for them. */
export const catalogueInForce = async (db: Reader, officeId: string): Promise<CatalogueInForce | null> => {
  const [found] = await db
    .select({ id: catalogues.id, hash: catalogues.hash })
    .from(catalogues)
    .where(and(eq(catalogues.officeId, officeId), isNull(catalogues.endedAt)))
  if (!found) return null
  const { id, hash } = found
  return {
    id,
    hash,
    rowsJson: async () => {
      const [row] = await db.select({ rowsJson: catalogues.rowsJson }).from(catalogues).where(eq(catalogues.id, id))
      if (!row) throw new Error(`There is no catalogue ${id}.`)
      return row.rowsJson
    },
  }
}

import type { Paper } from '@coldfill/contract'
import type { Logo } from '@coldfill/documents'
import { and, eq, isNull } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { officeLogos, titleBlocks } from '../db/schema/index.ts'

/** A title block as documents take it. */
export interface StoredTitleBlock {
  readonly name: string
  readonly lines: readonly string[]
  readonly captions: { readonly prepared: string; readonly checked: string; readonly approved: string }
  readonly paper: Paper
  readonly logo: Logo | null
}

/** Id of the title block that documents of an office get now; null where it has none of its own. */
export const titleBlockInForce = async (db: Reader, officeId: string): Promise<string | null> => {
  const [found] = await db
    .select({ id: titleBlocks.id })
    .from(titleBlocks)
    .where(and(eq(titleBlocks.officeId, officeId), isNull(titleBlocks.endedAt)))
  return found?.id ?? null
}

/** The title block of that id, whether or not another has taken its place. */
export const storedTitleBlock = async (db: Reader, id: string | null): Promise<StoredTitleBlock | null> => {
  if (id === null) return null
  const [row] = await db
    .select({ block: titleBlocks, logo: officeLogos })
    .from(titleBlocks)
    .leftJoin(officeLogos, eq(officeLogos.id, titleBlocks.logoId))
    .where(eq(titleBlocks.id, id))
  if (!row) throw new Error(`There is no title block ${id}.`)
  const { name, lines, prepared, checked, approved, paper } = row.block
  return {
    name,
    lines,
    captions: { prepared, checked, approved },
    paper,
    logo: row.logo && {
      data: row.logo.content,
      type: row.logo.type,
      width: row.logo.width,
      height: row.logo.height,
    },
  }
}

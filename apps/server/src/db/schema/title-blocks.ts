import { sql } from 'drizzle-orm'
import { foreignKey, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { officeLogos } from './office-logos.ts'
import { offices } from './offices.ts'

/**
 * What an office prints on its documents: logo, name, address, captions and paper. A row never changes, since the files of revisions
 * are made by it; one that is replaced ends and is kept.
 */
export const titleBlocks = pgTable(
  'title_blocks',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    /** The office's name as it is printed. */
    name: text('name').notNull(),
    /** Address and contact, line by line. */
    lines: text('lines').array().notNull(),
    /** Captions of the people of the title block. */
    prepared: text('prepared').notNull(),
    checked: text('checked').notNull(),
    approved: text('approved').notNull(),
    paper: text('paper', { enum: ['by units', 'Letter', 'A4'] }).notNull(),
    logoId: uuid('logo_id'),
    setAt: instant('set_at').notNull(),
    /** The name as it was, so that the row outlives people. */
    setBy: text('set_by').notNull(),
    endedAt: instant('ended_at'),
  },
  (t) => [
    primaryKey({ name: 'title_blocks_pk', columns: [t.id] }),
    foreignKey({ name: 'title_blocks_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'title_blocks_logo_fk', columns: [t.logoId], foreignColumns: [officeLogos.id] }),
    uniqueIndex('title_blocks_in_force_unique')
      .on(t.officeId)
      .where(sql`${t.endedAt} is null`),
  ],
)

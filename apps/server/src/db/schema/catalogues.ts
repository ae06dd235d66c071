import { sql } from 'drizzle-orm'
import { check, foreignKey, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { offices } from './offices.ts'

/**
 * A vessel catalogue as an office uploaded it. Rows and hash never change: revisions point here. One that is replaced or taken away
 * ends and is kept.
 */
export const catalogues = pgTable(
  'catalogues',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    fileName: text('file_name').notNull(),
    /** The rows as the JSON text that was hashed: a json column would give back other bytes. */
    rowsJson: text('rows_json').notNull(),
    rowCount: integer('row_count').notNull(),
    hash: text('hash').notNull(),
    /** CatalogueProblem[] of when the file was read, as JSON text: a json column refuses some characters that a file may hold. */
    problemsJson: text('problems_json').notNull(),
    uploadedAt: instant('uploaded_at').notNull(),
    /** The name as it was, so that the catalogue outlives people. */
    uploadedBy: text('uploaded_by').notNull(),
    endedAt: instant('ended_at'),
  },
  (t) => [
    primaryKey({ name: 'catalogues_pk', columns: [t.id] }),
    foreignKey({ name: 'catalogues_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete(
      'cascade',
    ),
    uniqueIndex('catalogues_in_force_unique')
      .on(t.officeId)
      .where(sql`${t.endedAt} is null`),
    check('catalogues_not_empty', sql`${t.rowCount} > 0`),
  ],
)

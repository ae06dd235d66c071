import { foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { bytes, instant } from './columns.ts'
import { revisions } from './revisions.ts'

/** A document as it was issued. */
export const revisionFiles = pgTable(
  'revision_files',
  {
    id: uuid('id').notNull().defaultRandom(),
    revisionId: uuid('revision_id').notNull(),
    /** The files as they went to review, or with the construction status on their pages. */
    set: text('set', { enum: ['review', 'construction'] }).notNull(),
    kind: text('kind', { enum: ['schedule', 'submittal', 'pdf'] }).notNull(),
    name: text('name').notNull(),
    size: integer('size').notNull(),
    sha256: text('sha256').notNull(),
    content: bytes('content').notNull(),
    madeAt: instant('made_at').notNull(),
  },
  (t) => [
    primaryKey({ name: 'revision_files_pk', columns: [t.id] }),
    unique('revision_files_kind_unique').on(t.revisionId, t.set, t.kind),
    unique('revision_files_name_unique').on(t.revisionId, t.name),
    foreignKey({
      name: 'revision_files_revision_fk',
      columns: [t.revisionId],
      foreignColumns: [revisions.id],
    }).onDelete('cascade'),
  ],
)

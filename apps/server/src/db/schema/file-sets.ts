import { boolean, foreignKey, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { revisions } from './revisions.ts'
import { titleBlocks } from './title-blocks.ts'

/** What the files of a set were made with, written together with them. */
export const fileSets = pgTable(
  'file_sets',
  {
    revisionId: uuid('revision_id').notNull(),
    set: text('set', { enum: ['review', 'construction'] }).notNull(),
    units: text('units', { enum: ['US', 'SI'] }).notNull(),
    withRedlines: boolean('with_redlines').notNull(),
    withVerification: boolean('with_verification').notNull(),
    titleBlockId: uuid('title_block_id'),
    /** Why the contents list of the submittal has no page numbers. */
    noPages: text('no_pages'),
    /** Why there is no PDF. */
    noPdf: text('no_pdf'),
    madeAt: instant('made_at').notNull(),
  },
  (t) => [
    primaryKey({ name: 'file_sets_pk', columns: [t.revisionId, t.set] }),
    foreignKey({ name: 'file_sets_revision_fk', columns: [t.revisionId], foreignColumns: [revisions.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'file_sets_title_block_fk', columns: [t.titleBlockId], foreignColumns: [titleBlocks.id] }),
  ],
)

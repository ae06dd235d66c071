import { boolean, foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { revisions } from './revisions.ts'
import { titleBlocks } from './title-blocks.ts'
import { users } from './users.ts'

/** Files of a revision that are to be made. The row is there until they are stored, so that a restart finds the work again. */
export const makings = pgTable(
  'makings',
  {
    revisionId: uuid('revision_id').notNull(),
    set: text('set', { enum: ['review', 'construction'] }).notNull(),
    stage: integer('stage').notNull().default(0),
    attempts: integer('attempts').notNull().default(0),
    /** Why the files could not be made; the work waits until a person asks for it again. */
    problem: text('problem'),
    askedBy: uuid('asked_by').notNull(),
    askedAt: instant('asked_at').notNull(),
    overrideReason: text('override_reason'),
    /** Null: those of the spec. */
    units: text('units', { enum: ['US', 'SI'] }),
    withRedlines: boolean('with_redlines').notNull().default(false),
    withVerification: boolean('with_verification').notNull().default(false),
    /** The title block of the office when the files were asked for. */
    titleBlockId: uuid('title_block_id'),
  },
  (t) => [
    primaryKey({ name: 'makings_pk', columns: [t.revisionId, t.set] }),
    foreignKey({ name: 'makings_revision_fk', columns: [t.revisionId], foreignColumns: [revisions.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'makings_title_block_fk', columns: [t.titleBlockId], foreignColumns: [titleBlocks.id] }),
    foreignKey({ name: 'makings_asked_by_fk', columns: [t.askedBy], foreignColumns: [users.id] }),
  ],
)

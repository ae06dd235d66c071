import { foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { bytes, instant } from './columns.ts'
import { revisions } from './revisions.ts'

/**
 * The review copy of a revision that was asked for last, with the redlines of that moment. Without content it is still to be made, so
 * that a restart finds the work again.
 */
export const reviewCopies = pgTable(
  'review_copies',
  {
    revisionId: uuid('revision_id').notNull(),
    askedAt: instant('asked_at').notNull(),
    /** The name as it was. */
    askedBy: text('asked_by').notNull(),
    attempts: integer('attempts').notNull().default(0),
    /** Why it could not be made; it waits until a person asks for it again. */
    problem: text('problem'),
    name: text('name'),
    redlines: integer('redlines'),
    size: integer('size'),
    sha256: text('sha256'),
    content: bytes('content'),
  },
  (t) => [
    primaryKey({ name: 'review_copies_pk', columns: [t.revisionId] }),
    foreignKey({
      name: 'review_copies_revision_fk',
      columns: [t.revisionId],
      foreignColumns: [revisions.id],
    }).onDelete('cascade'),
  ],
)

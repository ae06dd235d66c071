import { foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { revisions } from './revisions.ts'
import { users } from './users.ts'

/** A reviewer's word on a revision. The last one of a reviewer counts; the earlier ones are kept. */
export const dispositions = pgTable(
  'dispositions',
  {
    id: uuid('id').notNull().defaultRandom(),
    revisionId: uuid('revision_id').notNull(),
    reviewerId: uuid('reviewer_id').notNull(),
    outcome: text('outcome', { enum: ['accepted', 'accepted_noted', 'revise', 'rejected', 'information'] }).notNull(),
    reason: text('reason').notNull(),
    /** Content that the reviewer had before them. */
    contentHash: text('content_hash').notNull(),
    setAt: instant('set_at').notNull(),
  },
  (t) => [
    primaryKey({ name: 'dispositions_pk', columns: [t.id] }),
    index('dispositions_revision_index').on(t.revisionId),
    foreignKey({
      name: 'dispositions_revision_fk',
      columns: [t.revisionId],
      foreignColumns: [revisions.id],
    }).onDelete('cascade'),
    foreignKey({ name: 'dispositions_reviewer_fk', columns: [t.reviewerId], foreignColumns: [users.id] }),
  ],
)

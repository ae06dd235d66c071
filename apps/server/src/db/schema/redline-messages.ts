import { foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { redlines } from './redlines.ts'
import { users } from './users.ts'

/** What was said in a thread, in order; message 0 is the redline itself. */
export const redlineMessages = pgTable(
  'redline_messages',
  {
    redlineId: uuid('redline_id').notNull(),
    position: integer('position').notNull(),
    authorId: uuid('author_id').notNull(),
    text: text('text').notNull(),
    did: text('did', { enum: ['wrote', 'closed', 'reopened'] }).notNull(),
    writtenAt: instant('written_at').notNull(),
  },
  (t) => [
    primaryKey({ name: 'redline_messages_pk', columns: [t.redlineId, t.position] }),
    foreignKey({
      name: 'redline_messages_redline_fk',
      columns: [t.redlineId],
      foreignColumns: [redlines.id],
    }).onDelete('cascade'),
    foreignKey({ name: 'redline_messages_author_fk', columns: [t.authorId], foreignColumns: [users.id] }),
  ],
)

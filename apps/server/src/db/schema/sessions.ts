import { foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { users } from './users.ts'

/** A sign-in. The cookie names the row; a row that is revoked or over answers nothing from the next request on. */
export const sessions = pgTable(
  'sessions',
  {
    /** SHA-256 of the 256 random bits in the cookie's token, so that a copy of the database opens no session. */
    id: text('id').notNull(),
    userId: uuid('user_id').notNull(),
    createdAt: instant('created_at').notNull(),
    lastSeenAt: instant('last_seen_at').notNull(),
    expiresAt: instant('expires_at').notNull(),
    revokedAt: instant('revoked_at'),
  },
  (t) => [
    primaryKey({ name: 'sessions_pk', columns: [t.id] }),
    foreignKey({ name: 'sessions_user_fk', columns: [t.userId], foreignColumns: [users.id] }).onDelete('cascade'),
    index('sessions_user_index').on(t.userId),
  ],
)

import { boolean, foreignKey, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { offices } from './offices.ts'

export const users = pgTable(
  'users',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    /** Lower case. */
    email: text('email').notNull(),
    name: text('name').notNull(),
    initials: text('initials').notNull(),
    passwordHash: text('password_hash').notNull(),
    administrator: boolean('administrator').notNull().default(false),
    mayCreateProjects: boolean('may_create_projects').notNull().default(false),
    /** A person who is switched off can neither sign in nor use a session that is open. */
    active: boolean('active').notNull().default(true),
    lastSignInAt: instant('last_sign_in_at'),
    createdAt: instant('created_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'users_pk', columns: [t.id] }),
    unique('users_email_unique').on(t.email),
    foreignKey({ name: 'users_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete('cascade'),
  ],
)

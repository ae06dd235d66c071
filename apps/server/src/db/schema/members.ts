import type { Role } from '@coldfill/contract'
import { sql } from 'drizzle-orm'
import { boolean, check, foreignKey, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { projects } from './projects.ts'
import { users } from './users.ts'

export const members = pgTable(
  'members',
  {
    projectId: uuid('project_id').notNull(),
    userId: uuid('user_id').notNull(),
    roles: text('roles').array().$type<Role[]>().notNull(),
    requiredReviewer: boolean('required_reviewer').notNull().default(false),
  },
  (t) => [
    primaryKey({ name: 'members_pk', columns: [t.projectId, t.userId] }),
    foreignKey({ name: 'members_project_fk', columns: [t.projectId], foreignColumns: [projects.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'members_user_fk', columns: [t.userId], foreignColumns: [users.id] }).onDelete('cascade'),
    check('members_roles_known', sql`${t.roles} <@ array['consultant', 'reviewer', 'contractor']`),
  ],
)

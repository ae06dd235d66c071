import { foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { projects } from './projects.ts'
import { users } from './users.ts'

/** The working copy of a project, exactly as typed. */
export const specs = pgTable(
  'specs',
  {
    projectId: uuid('project_id').notNull(),
    text: text('text').notNull(),
    /** Rises by one with each save, so that two tabs cannot overwrite each other. */
    version: integer('version').notNull().default(1),
    savedAt: instant('saved_at').notNull(),
    savedBy: uuid('saved_by').notNull(),
  },
  (t) => [
    primaryKey({ name: 'specs_pk', columns: [t.projectId] }),
    foreignKey({ name: 'specs_project_fk', columns: [t.projectId], foreignColumns: [projects.id] }).onDelete('cascade'),
    foreignKey({ name: 'specs_saved_by_fk', columns: [t.savedBy], foreignColumns: [users.id] }),
  ],
)

import { bigint, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { projects } from './projects.ts'
import { users } from './users.ts'

/**
 * Who put which value in the place of a documented default, and why. The newest row of an assumption is how it stood when the
 * spec was last saved; without a value the default was restored.
 */
export const assumptionChanges = pgTable(
  'assumption_changes',
  {
    id: bigint('id', { mode: 'number' })
      .notNull()
      .generatedAlwaysAsIdentity({ name: 'assumption_changes_id_sequence' }),
    projectId: uuid('project_id').notNull(),
    assumption: text('assumption').notNull(),
    value: text('value'),
    reason: text('reason').notNull(),
    changedAt: instant('changed_at').notNull(),
    changedBy: uuid('changed_by').notNull(),
  },
  (t) => [
    primaryKey({ name: 'assumption_changes_pk', columns: [t.id] }),
    index('assumption_changes_project_index').on(t.projectId, t.id),
    foreignKey({
      name: 'assumption_changes_project_fk',
      columns: [t.projectId],
      foreignColumns: [projects.id],
    }).onDelete('cascade'),
    foreignKey({ name: 'assumption_changes_changed_by_fk', columns: [t.changedBy], foreignColumns: [users.id] }),
  ],
)

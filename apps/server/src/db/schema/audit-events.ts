import { bigint, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { offices } from './offices.ts'

/** Who did what, when. Names are kept as they were, so that the trail outlives people and projects. */
export const auditEvents = pgTable(
  'audit_events',
  {
    id: bigint('id', { mode: 'number' }).notNull().generatedAlwaysAsIdentity({ name: 'audit_events_id_sequence' }),
    officeId: uuid('office_id').notNull(),
    at: instant('at').notNull(),
    who: text('who').notNull(),
    action: text('action').notNull(),
    project: text('project'),
    detail: text('detail').notNull(),
  },
  (t) => [
    primaryKey({ name: 'audit_events_pk', columns: [t.id] }),
    index('audit_events_office_index').on(t.officeId, t.id),
    foreignKey({ name: 'audit_events_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete(
      'cascade',
    ),
  ],
)

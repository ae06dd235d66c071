import { sql } from 'drizzle-orm'
import { foreignKey, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { offices } from './offices.ts'

export const projects = pgTable(
  'projects',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    /** As in addresses: FC-241. */
    number: text('number').notNull(),
    /** Title and client as the spec last said them. */
    title: text('title').notNull(),
    client: text('client').notNull().default(''),
    /** Redlines are numbered through the life of the project; this is the last number given out. */
    lastRedline: integer('last_redline').notNull().default(0),
    createdAt: instant('created_at').notNull().defaultNow(),
  },
  (t) => [
    primaryKey({ name: 'projects_pk', columns: [t.id] }),
    foreignKey({ name: 'projects_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete('cascade'),
    uniqueIndex('projects_number_unique').on(t.officeId, sql`lower(${t.number})`),
  ],
)

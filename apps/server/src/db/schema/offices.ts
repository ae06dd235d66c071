import { pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'

/** A firm. Everything below it is seen by its own people alone. */
export const offices = pgTable(
  'offices',
  {
    id: uuid('id').notNull().defaultRandom(),
    name: text('name').notNull(),
    createdAt: instant('created_at').notNull().defaultNow(),
  },
  (t) => [primaryKey({ name: 'offices_pk', columns: [t.id] })],
)

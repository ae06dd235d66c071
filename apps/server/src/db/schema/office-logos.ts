import { foreignKey, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { bytes, instant } from './columns.ts'
import { offices } from './offices.ts'

/** A picture for the covers of documents, as an office uploaded it. It never changes: title blocks point here. */
export const officeLogos = pgTable(
  'office_logos',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    fileName: text('file_name').notNull(),
    type: text('type', { enum: ['png', 'jpg'] }).notNull(),
    /** Pixels, as the file says. */
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    sha256: text('sha256').notNull(),
    content: bytes('content').notNull(),
    uploadedAt: instant('uploaded_at').notNull(),
  },
  (t) => [
    primaryKey({ name: 'office_logos_pk', columns: [t.id] }),
    foreignKey({ name: 'office_logos_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete(
      'cascade',
    ),
  ],
)

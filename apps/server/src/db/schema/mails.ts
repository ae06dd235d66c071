import { foreignKey, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { offices } from './offices.ts'
import { projects } from './projects.ts'

/** The outbox: a mail is written in the transaction of what it reports, and sent after it. */
export const mails = pgTable(
  'mails',
  {
    id: uuid('id').notNull().defaultRandom(),
    officeId: uuid('office_id').notNull(),
    projectId: uuid('project_id'),
    event: text('event').notNull(),
    toName: text('to_name').notNull(),
    toEmail: text('to_email').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull(),
    /** `kept`: no mail server is set up, the mail stays here to be read. */
    state: text('state', { enum: ['queued', 'sent', 'kept', 'failed'] }).notNull(),
    attempts: integer('attempts').notNull().default(0),
    problem: text('problem'),
    createdAt: instant('created_at').notNull(),
    sentAt: instant('sent_at'),
  },
  (t) => [
    primaryKey({ name: 'mails_pk', columns: [t.id] }),
    index('mails_office_index').on(t.officeId, t.createdAt),
    foreignKey({ name: 'mails_office_fk', columns: [t.officeId], foreignColumns: [offices.id] }).onDelete('cascade'),
    foreignKey({ name: 'mails_project_fk', columns: [t.projectId], foreignColumns: [projects.id] }).onDelete('cascade'),
  ],
)

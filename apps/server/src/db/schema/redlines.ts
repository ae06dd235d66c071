import type { Anchor } from '@coldfill/contract'
import { boolean, foreignKey, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { projects } from './projects.ts'
import { revisions } from './revisions.ts'
import { users } from './users.ts'

/** One thread of review. Pending until its author sends the review, then open, then closed. */
export const redlines = pgTable(
  'redlines',
  {
    id: uuid('id').notNull().defaultRandom(),
    projectId: uuid('project_id').notNull(),
    number: integer('number').notNull(),
    /** Revision it was written on: the anchor is read there. */
    revisionId: uuid('revision_id').notNull(),
    anchor: jsonb('anchor').$type<Anchor>().notNull(),
    quoted: text('quoted').notNull(),
    proposedValue: text('proposed_value'),
    mustAnswer: boolean('must_answer').notNull(),
    /** Seen by the consultants and the administrator alone, and in no document. Fixed when it is written. */
    officeOnly: boolean('office_only').notNull().default(false),
    authorId: uuid('author_id').notNull(),
    state: text('state', { enum: ['pending', 'open', 'closed'] }).notNull(),
    createdAt: instant('created_at').notNull(),
    /** When it left its author's hands; null while it is pending. */
    publishedAt: instant('published_at'),
    closedBy: uuid('closed_by'),
    /** Newest revision when it was closed: it stands on that one still, and no longer on later ones. */
    closedOn: uuid('closed_on'),
  },
  (t) => [
    primaryKey({ name: 'redlines_pk', columns: [t.id] }),
    unique('redlines_number_unique').on(t.projectId, t.number),
    foreignKey({ name: 'redlines_project_fk', columns: [t.projectId], foreignColumns: [projects.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'redlines_revision_fk', columns: [t.revisionId], foreignColumns: [revisions.id] }),
    foreignKey({ name: 'redlines_author_fk', columns: [t.authorId], foreignColumns: [users.id] }),
    foreignKey({ name: 'redlines_closed_on_fk', columns: [t.closedOn], foreignColumns: [revisions.id] }),
    foreignKey({ name: 'redlines_closed_by_fk', columns: [t.closedBy], foreignColumns: [users.id] }),
  ],
)

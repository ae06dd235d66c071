import { sql } from 'drizzle-orm'
import { check, foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { instant } from './columns.ts'
import { catalogues } from './catalogues.ts'
import { projects } from './projects.ts'
import { users } from './users.ts'

/** A frozen issue. Text, result, catalogue, engine and hash never change after the row is written; only what became of it does. */
export const revisions = pgTable(
  'revisions',
  {
    id: uuid('id').notNull().defaultRandom(),
    projectId: uuid('project_id').notNull(),
    /** 0 for the first issue, then 1, 2 … */
    sequence: integer('sequence').notNull(),
    /** '' for the first issue, then A, B … */
    label: text('label').notNull(),
    specText: text('spec_text').notNull(),
    /** ProjectResult as the JSON text that was hashed: a json column would give back other bytes. */
    resultJson: text('result_json').notNull(),
    /** The catalogue that vessels were chosen from, where the office had one. */
    catalogueId: uuid('catalogue_id'),
    engine: text('engine').notNull(),
    contentHash: text('content_hash').notNull(),
    note: text('note').notNull(),
    issuedAt: instant('issued_at').notNull(),
    issuedBy: uuid('issued_by').notNull(),
    constructionAt: instant('construction_at'),
    constructionBy: uuid('construction_by'),
    /** Reason with which the gates were overridden, where they were. */
    overrideReason: text('override_reason'),
    supersededAt: instant('superseded_at'),
    withdrawnAt: instant('withdrawn_at'),
    withdrawnBy: uuid('withdrawn_by'),
    withdrawReason: text('withdraw_reason'),
  },
  (t) => [
    primaryKey({ name: 'revisions_pk', columns: [t.id] }),
    unique('revisions_sequence_unique').on(t.projectId, t.sequence),
    unique('revisions_label_unique').on(t.projectId, t.label),
    foreignKey({ name: 'revisions_project_fk', columns: [t.projectId], foreignColumns: [projects.id] }).onDelete(
      'cascade',
    ),
    foreignKey({ name: 'revisions_catalogue_fk', columns: [t.catalogueId], foreignColumns: [catalogues.id] }),
    foreignKey({ name: 'revisions_issued_by_fk', columns: [t.issuedBy], foreignColumns: [users.id] }),
    foreignKey({ name: 'revisions_construction_by_fk', columns: [t.constructionBy], foreignColumns: [users.id] }),
    foreignKey({ name: 'revisions_withdrawn_by_fk', columns: [t.withdrawnBy], foreignColumns: [users.id] }),
    check('revisions_construction_whole', sql`(${t.constructionAt} is null) = (${t.constructionBy} is null)`),
    check('revisions_withdrawal_whole', sql`(${t.withdrawnAt} is null) = (${t.withdrawReason} is null)`),
  ],
)

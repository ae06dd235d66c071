import type { Role } from '@coldfill/contract'
import { and, asc, desc, eq, getTableColumns, inArray } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import {
  dispositions,
  fileSets,
  makings,
  members,
  projects,
  redlineMessages,
  redlines,
  revisionFiles,
  revisions,
  users,
} from '../db/schema/index.ts'

export type ProjectRow = typeof projects.$inferSelect
export type DispositionRow = typeof dispositions.$inferSelect
export type MakingRow = typeof makings.$inferSelect
export type FileSetRow = typeof fileSets.$inferSelect

const { specText: _specText, resultJson: _resultJson, ...lightColumns } = getTableColumns(revisions)
/** A revision without its frozen text and result, which are large. */
export type RevisionRow = Omit<typeof revisions.$inferSelect, 'specText' | 'resultJson'>

const { content: _content, ...fileColumns } = getTableColumns(revisionFiles)
export type FileRow = Omit<typeof revisionFiles.$inferSelect, 'content'>

export interface PersonRow {
  readonly id: string
  readonly name: string
  readonly initials: string
  readonly email: string
}

export interface MemberRow extends PersonRow {
  readonly roles: readonly Role[]
  readonly requiredReviewer: boolean
}

/** An open redline, as far as it is needed to say whose turn it is. */
export interface OpenThread {
  readonly authorId: string
  readonly mustAnswer: boolean
  readonly waitingOn: 'consultant' | 'reviewer'
}

/** Whose turn it is in a thread: the reviewer's after a consultant's word, else the consultant's. */
export const turnAfter = (members: readonly MemberRow[], lastAuthor: string): 'consultant' | 'reviewer' => {
  const roles = members.find((member) => member.id === lastAuthor)?.roles ?? []
  return roles.includes('consultant') && !roles.includes('reviewer') ? 'reviewer' : 'consultant'
}

/** Everything about the standing of a project that is needed to say what may happen next. Small: no texts, no results, no bytes. */
export interface ProjectFacts {
  readonly project: ProjectRow
  readonly members: readonly MemberRow[]
  /** Newest first. */
  readonly revisions: readonly RevisionRow[]
  readonly files: readonly FileRow[]
  readonly fileSets: readonly FileSetRow[]
  /** Oldest first. */
  readonly dispositions: readonly DispositionRow[]
  readonly makings: readonly MakingRow[]
  readonly openThreads: readonly OpenThread[]
  /** Everybody named by the facts, members and former members, by id. */
  readonly people: ReadonlyMap<string, PersonRow>
}

const person = { id: users.id, name: users.name, initials: users.initials, email: users.email }

export const projectFacts = async (db: Reader, project: ProjectRow): Promise<ProjectFacts> => {
  const memberRows = await db
    .select({ ...person, roles: members.roles, requiredReviewer: members.requiredReviewer })
    .from(members)
    .innerJoin(users, eq(users.id, members.userId))
    .where(eq(members.projectId, project.id))
  const revisionRows = await db
    .select(lightColumns)
    .from(revisions)
    .where(eq(revisions.projectId, project.id))
    .orderBy(asc(revisions.sequence))
  const ids = revisionRows.map((revision) => revision.id)
  const files =
    ids.length === 0
      ? []
      : await db.select(fileColumns).from(revisionFiles).where(inArray(revisionFiles.revisionId, ids))
  const dispositionRows =
    ids.length === 0
      ? []
      : await db
          .select()
          .from(dispositions)
          .where(inArray(dispositions.revisionId, ids))
          .orderBy(asc(dispositions.setAt))
  const fileSetRows = ids.length === 0 ? [] : await db.select().from(fileSets).where(inArray(fileSets.revisionId, ids))
  const makingRows = ids.length === 0 ? [] : await db.select().from(makings).where(inArray(makings.revisionId, ids))
  const threads = await db
    .selectDistinctOn([redlineMessages.redlineId], {
      authorId: redlines.authorId,
      mustAnswer: redlines.mustAnswer,
      lastAuthor: redlineMessages.authorId,
    })
    .from(redlineMessages)
    .innerJoin(redlines, eq(redlines.id, redlineMessages.redlineId))
    .where(and(eq(redlines.projectId, project.id), eq(redlines.state, 'open'), eq(redlines.officeOnly, false)))
    .orderBy(redlineMessages.redlineId, desc(redlineMessages.position))
  const named = new Set([
    ...revisionRows.flatMap((row) => [row.issuedBy, row.constructionBy, row.withdrawnBy]),
    ...dispositionRows.map((row) => row.reviewerId),
  ])
  const people = await db
    .select(person)
    .from(users)
    .where(inArray(users.id, [...named].filter((id) => id !== null).concat(memberRows.map((member) => member.id))))
  return {
    project,
    // Sorted here, since databases differ in how they order letters.
    members: memberRows.toSorted((a, b) => a.name.localeCompare(b.name, 'en')),
    revisions: revisionRows.toReversed(),
    files: files.toSorted((a, b) => a.name.localeCompare(b.name, 'en')),
    fileSets: fileSetRows,
    dispositions: dispositionRows,
    makings: makingRows,
    openThreads: threads.map(({ authorId, mustAnswer, lastAuthor }) => ({
      authorId,
      mustAnswer,
      waitingOn: turnAfter(memberRows, lastAuthor),
    })),
    people: new Map(people.map((row) => [row.id, row])),
  }
}

export const reviewersOf = (facts: ProjectFacts): readonly MemberRow[] =>
  facts.members.filter((member) => member.roles.includes('reviewer'))

/** Reviewers whose word is needed: those marked required, or all where none is marked. */
export const requiredReviewers = (facts: ProjectFacts): readonly MemberRow[] => {
  const reviewers = reviewersOf(facts)
  const required = reviewers.filter((member) => member.requiredReviewer)
  return required.length > 0 ? required : reviewers
}

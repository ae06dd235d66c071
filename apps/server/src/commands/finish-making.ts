import { and, eq, isNotNull, isNull, ne } from 'drizzle-orm'
import type { Database, Tx } from '../db/client.ts'
import { fileSets, makings, offices, projects, revisionFiles, revisions } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import type { Written, WrittenFile } from '../documents/write-documents.ts'
import { issuedForConstruction, reviewAsked } from '../mail/project-mails.ts'
import { queueMail } from '../mail/queue-mail.ts'
import { sha256 } from '../review/content-hash.ts'
import { frozenContent } from '../review/frozen.ts'
import { constructionGates, holding, overridable } from '../review/gates.ts'
import {
  type MakingRow,
  type ProjectFacts,
  projectFacts,
  reviewersOf,
  type RevisionRow,
} from '../review/project-facts.ts'
import { recordEvent } from './record-event.ts'

/** `FC-241-rev-A-schedule.xlsx` → `FC-241-rev-A-schedule-for-construction.xlsx`: the two sets must not be taken for each other. */
const nameIn = (set: MakingRow['set'], name: string): string =>
  set === 'construction' ? name.replace(/(\.[a-z]+)$/, '-for-construction$1') : name

const kindOf = ({ kind }: WrittenFile): Exclude<WrittenFile['kind'], 'review-copy'> => {
  if (kind === 'review-copy') throw new Error('A review copy is no file of an issue.')
  return kind
}

interface Finish {
  readonly making: MakingRow
  /** Those that the documents were written in. */
  readonly units: 'US' | 'SI'
  readonly written: Written
  readonly address: string
  readonly now: Date
}

/**
 * Stores the files of a making and lets its issue take effect: all of it in one transaction, so that a contractor never finds an issue
 * without files, or two issues in force.
 */
export const finishMaking = (db: Database, finish: Finish): Promise<void> => {
  // Hashed before the transaction begins: everybody waits for that.
  const { making, units, written, now } = finish
  const hashed = written.files.map((file) => ({ ...file, kind: kindOf(file), sha256: sha256(file.content) }))
  return withTx(db, async (tx) => {
    const [row] = await tx
      .delete(makings)
      .where(and(eq(makings.revisionId, making.revisionId), eq(makings.set, making.set)))
      .returning()
    const [found] = await tx
      .select({ project: projects, office: offices })
      .from(revisions)
      .innerJoin(projects, eq(projects.id, revisions.projectId))
      .innerJoin(offices, eq(offices.id, projects.officeId))
      .where(eq(revisions.id, making.revisionId))
    // Withdrawn in the meantime: nothing is issued any more.
    if (!row || !found) return
    const facts = await projectFacts(tx, found.project)
    const revision = facts.revisions.find(({ id }) => id === making.revisionId)
    if (!revision || revision.withdrawnAt) return
    if (making.set === 'construction' && !(await gatesStillPass(tx, facts, revision, row))) {
      await tx.insert(makings).values({
        ...row,
        problem: 'A gate closed while the files were being made. Look at the gate list and issue again.',
      })
      return
    }
    await tx.insert(revisionFiles).values(
      hashed.map((file) => ({
        revisionId: making.revisionId,
        set: making.set,
        kind: file.kind,
        name: nameIn(making.set, file.name),
        size: file.content.byteLength,
        sha256: file.sha256,
        content: file.content,
        madeAt: now,
      })),
    )
    const { noPages, noPdf } = written
    const { withRedlines, withVerification, titleBlockId } = row
    const made = { units, withRedlines, withVerification, titleBlockId, noPages, noPdf, madeAt: now }
    await tx
      .insert(fileSets)
      .values({ revisionId: making.revisionId, set: making.set, ...made })
      .onConflictDoUpdate({ target: [fileSets.revisionId, fileSets.set], set: made })
    if (making.set === 'construction') await putInForce(tx, facts, revision, row, found.office, finish)
    else await askForReview(tx, facts, revision, found.office, finish)
  })
}

const gatesStillPass = async (
  tx: Tx,
  facts: ProjectFacts,
  revision: RevisionRow,
  making: MakingRow,
): Promise<boolean> => {
  const gates = constructionGates(facts, await frozenContent(tx, revision.id))
  return holding(gates).length === 0 && (making.overrideReason !== null || overridable(gates).length === 0)
}

const aboutOf = (facts: ProjectFacts, revision: RevisionRow) => ({
  number: facts.project.number,
  title: facts.project.title,
  label: revision.label,
})

const askForReview = async (
  tx: Tx,
  facts: ProjectFacts,
  revision: RevisionRow,
  office: { id: string },
  { address, now }: Finish,
): Promise<void> => {
  const by = facts.people.get(revision.issuedBy)?.name ?? 'The consultant'
  await queueMail(
    tx,
    { officeId: office.id, projectId: facts.project.id, address, at: now },
    reviewersOf(facts),
    reviewAsked(aboutOf(facts, revision), by, revision.note),
  )
}

const putInForce = async (
  tx: Tx,
  facts: ProjectFacts,
  revision: RevisionRow,
  making: MakingRow,
  office: { id: string; name: string },
  { address, now }: Finish,
): Promise<void> => {
  await tx
    .update(revisions)
    .set({ supersededAt: now })
    .where(
      and(
        eq(revisions.projectId, facts.project.id),
        ne(revisions.id, revision.id),
        isNotNull(revisions.constructionAt),
        isNull(revisions.supersededAt),
        isNull(revisions.withdrawnAt),
      ),
    )
  await tx
    .update(revisions)
    .set({ constructionAt: now, constructionBy: making.askedBy, overrideReason: making.overrideReason })
    .where(eq(revisions.id, revision.id))
  const by = facts.members.find(({ id }) => id === making.askedBy)?.name ?? 'A consultant'
  await recordEvent(tx, { name: by, office }, now, {
    action: 'issued for construction',
    project: facts.project.number,
    detail: [revision.label === '' ? 'First issue' : `Rev ${revision.label}`, making.overrideReason]
      .filter((part) => part !== null)
      .join('. Gates overridden: '),
  })
  const issue = { by, override: making.overrideReason }
  const mail = { officeId: office.id, projectId: facts.project.id, address, at: now }
  const contractors = facts.members.filter(({ roles }) => roles.includes('contractor'))
  const others = facts.members.filter(({ roles }) => !roles.includes('contractor'))
  await queueMail(tx, mail, contractors, issuedForConstruction(aboutOf(facts, revision), issue, 'contractor'))
  await queueMail(tx, mail, others, issuedForConstruction(aboutOf(facts, revision), issue, 'other'))
}

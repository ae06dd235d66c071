import { and, asc, eq, isNull } from 'drizzle-orm'
import { finishMaking } from '../commands/finish-making.ts'
import type { Clock } from '../clock.ts'
import type { Database } from '../db/client.ts'
import { makings, offices, projects, revisions } from '../db/schema/index.ts'
import { describeError } from '../describe-error.ts'
import type { Log } from '../log.ts'
import type { Postman } from '../mail/postman.ts'
import { createRounds, type Rounds } from '../rounds.ts'
import { changedResults } from '../review/changed-results.ts'
import { frozenContent } from '../review/frozen.ts'
import { type MakingRow, projectFacts } from '../review/project-facts.ts'
import { documentOptions } from './document-options.ts'
import { writeDocuments } from './write-documents.ts'

/** A making that has begun this often and never came to an end is not begun again by itself. */
const MOST_ATTEMPTS = 3

/** Goes through the makings that wait when it is woken; their stages are in the database. */
export type FileMaker = Rounds

/**
 * Makes the files of issued revisions, one revision after the other, from rows of the table `makings`. The row goes away in the
 * transaction that stores the files, so that after a stop the work is found again and done from its beginning; it has no effect before.
 */
export const createFileMaker = ({
  db,
  clock,
  log,
  postman,
  address,
}: {
  db: Database
  clock: Clock
  log: Log
  postman: Postman
  address: () => string
}): FileMaker => {
  const closing = new AbortController()

  const keyOf = (making: MakingRow) => and(eq(makings.revisionId, making.revisionId), eq(makings.set, making.set))
  const note = async (making: MakingRow, values: Partial<MakingRow>): Promise<void> => {
    await db.update(makings).set(values).where(keyOf(making))
  }

  const make = async (making: MakingRow): Promise<void> => {
    const [found] = await db
      .select({ project: projects, office: offices.name })
      .from(revisions)
      .innerJoin(projects, eq(projects.id, revisions.projectId))
      .innerJoin(offices, eq(offices.id, projects.officeId))
      .where(eq(revisions.id, making.revisionId))
    if (!found) return
    const facts = await projectFacts(db, found.project)
    const revision = facts.revisions.find((row) => row.id === making.revisionId)
    if (!revision) return
    const { result } = await frozenContent(db, revision.id)
    const before = facts.revisions.find((row) => row.sequence === revision.sequence - 1)
    const comparison = before && {
      revision: before.label,
      changed: changedResults((await frozenContent(db, before.id)).result, result),
    }
    // Stage notes are written one after the other and before the files are stored.
    let noted: Promise<void> = Promise.resolve()
    const files = await writeDocuments(
      { result, options: documentOptions(facts, found.office, revision, making, result, comparison) },
      (stage) => {
        noted = noted.then(() => note(making, { stage }))
      },
      closing.signal,
    )
    await noted
    await note(making, { stage: 3 })
    await finishMaking(db, { making, files, address: address(), now: clock() })
    postman.wake()
  }

  const attempt = async (making: MakingRow): Promise<void> => {
    if (making.attempts >= MOST_ATTEMPTS) {
      await note(making, { problem: 'Making the files stopped several times before it was done.' })
      return
    }
    await note(making, { attempts: making.attempts + 1, stage: 0 })
    try {
      await make(making)
    } catch (error) {
      if (closing.signal.aborted) {
        // Not the fault of the work: it has all its attempts at the next start.
        await note(making, { attempts: making.attempts })
        return
      }
      const reason = describeError(error)
      log.error(`files of revision ${making.revisionId}: ${reason}`)
      await note(making, { problem: 'The files could not be made. Try again; the revision itself is kept.' })
    }
  }

  const rounds = createRounds('files', log, async (closed) => {
    const waiting = await db.select().from(makings).where(isNull(makings.problem)).orderBy(asc(makings.askedAt))
    for (const making of waiting) {
      if (closed()) return
      await attempt(making)
    }
  })

  return {
    ...rounds,
    close: async () => {
      closing.abort()
      await rounds.close()
    },
  }
}

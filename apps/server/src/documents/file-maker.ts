import { and, asc, isNull } from 'drizzle-orm'
import { makings, reviewCopies } from '../db/schema/index.ts'
import { describeError } from '../describe-error.ts'
import type { Log } from '../log.ts'
import type { Postman } from '../mail/postman.ts'
import { createRounds, type Rounds } from '../rounds.ts'
import { makeFiles, type Maker, noteMaking } from './make-files.ts'
import { makeReviewCopy, noteReviewCopy } from './make-review-copy.ts'

/** Work that has begun this often and never came to an end is not begun again by itself. */
const MOST_ATTEMPTS = 3

/** Goes through the work that waits when it is woken; its stages are in the database. */
export type FileMaker = Rounds

interface Job {
  readonly name: string
  readonly attempts: number
  note(values: { attempts?: number; problem?: string; stage?: number }): Promise<void>
  do(signal: AbortSignal): Promise<void>
}

/**
 * Makes the files of issued revisions, and review copies, one after the other, from rows of the tables `makings` and `review_copies`.
 * A row goes away, or gets its content, in the statement that stores the files, so that after a stop the work is found again and done
 * from its beginning; it has no effect before.
 */
export const createFileMaker = ({
  log,
  postman,
  ...maker
}: Maker & { readonly log: Log; readonly postman: Postman }): FileMaker => {
  const { db } = maker
  const closing = new AbortController()

  const attempt = async (job: Job): Promise<void> => {
    if (job.attempts >= MOST_ATTEMPTS) {
      await job.note({ problem: 'Making the files stopped several times before it was done.' })
      return
    }
    await job.note({ attempts: job.attempts + 1, stage: 0 })
    try {
      await job.do(closing.signal)
    } catch (error) {
      if (closing.signal.aborted) {
        // Not the fault of the work: it has all its attempts at the next start.
        await job.note({ attempts: job.attempts })
        return
      }
      log.error(`${job.name}: ${describeError(error)}`)
      await job.note({ problem: 'The files could not be made. Try again; the revision itself is kept.' })
    }
  }

  const waitingFiles = async (): Promise<Job[]> => {
    const rows = await db.select().from(makings).where(isNull(makings.problem)).orderBy(asc(makings.askedAt))
    return rows.map((making) => ({
      name: `files of revision ${making.revisionId}`,
      attempts: making.attempts,
      note: (values) => noteMaking(db, making, values),
      do: async (signal) => {
        await makeFiles(maker, making, signal)
        postman.wake()
      },
    }))
  }
  const waitingCopies = async (): Promise<Job[]> => {
    const rows = await db
      .select()
      .from(reviewCopies)
      .where(and(isNull(reviewCopies.problem), isNull(reviewCopies.sha256)))
      .orderBy(asc(reviewCopies.askedAt))
    return rows.map((copy) => ({
      name: `review copy of revision ${copy.revisionId}`,
      attempts: copy.attempts,
      note: ({ stage: _, ...values }) => noteReviewCopy(db, copy, values),
      do: (signal) => makeReviewCopy(maker, copy, signal),
    }))
  }

  const rounds = createRounds('files', log, async (closed) => {
    for (const job of [...(await waitingFiles()), ...(await waitingCopies())]) {
      if (closed()) return
      await attempt(job)
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

import { and, eq, isNotNull } from 'drizzle-orm'
import type { Deps } from '../deps.ts'
import { makings } from '../db/schema/index.ts'
import { AppError } from '../errors.ts'
import type { RevisionRow } from '../review/project-facts.ts'

/** Begins again with files that could not be made. @throws {AppError} 409 where none of the revision wait for that */
export const retryMaking = async (deps: Deps, revision: RevisionRow): Promise<void> => {
  const [again] = await deps.db
    .update(makings)
    .set({ problem: null, attempts: 0, stage: 0 })
    .where(and(eq(makings.revisionId, revision.id), isNotNull(makings.problem)))
    .returning({ set: makings.set })
  if (!again)
    throw new AppError(
      409,
      'nothing_to_retry',
      'Nothing to try again',
      'The files of this revision are made or under way.',
    )
  deps.fileMaker.wake()
}

import { and, eq, isNull } from 'drizzle-orm'
import { CATALOGUE_LIMIT, type CatalogueProblem } from '@coldfill/contract'
import { readUpload } from '../catalogue/read-upload.ts'
import type { Tx } from '../db/client.ts'
import { catalogues } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import type { Deps } from '../deps.ts'
import { AppError, notFound } from '../errors.ts'
import { sha256 } from '../review/content-hash.ts'
import type { Principal } from '../sign-in/sessions.ts'
import { recordEvent } from './record-event.ts'

const MOST_PROBLEMS = 200

const firstProblems = (problems: readonly CatalogueProblem[]): readonly CatalogueProblem[] => {
  const more = problems.length - MOST_PROBLEMS
  const first = problems.slice(0, MOST_PROBLEMS)
  const last = first.at(-1)
  return more > 0 && last
    ? [...first, { line: last.line, column: '', message: `And ${more} more further down.` }]
    : first
}

/** Ends the catalogue in force. Returns its file name, or null where there is none. */
const endCatalogue = async (tx: Tx, officeId: string, at: Date): Promise<string | null> => {
  const [ended] = await tx
    .update(catalogues)
    .set({ endedAt: at })
    .where(and(eq(catalogues.officeId, officeId), isNull(catalogues.endedAt)))
    .returning({ fileName: catalogues.fileName })
  return ended?.fileName ?? null
}

/**
 * Reads a file and makes its rows the catalogue of the person's office. Lines with a mistake are left out and told; the catalogue
 * before it ends and is kept. The caller has asked whether the person may.
 * @throws {AppError} 413 for a file above the limit; 422 catalogue_unreadable with every problem where no row can be read
 */
export const putCatalogue = async (
  deps: Pick<Deps, 'db' | 'clock'>,
  principal: Pick<Principal, 'name' | 'office'>,
  fileName: string,
  bytes: Uint8Array,
): Promise<void> => {
  if (bytes.length > CATALOGUE_LIMIT)
    throw new AppError(413, 'catalogue_too_large', 'The catalogue is too large', 'A catalogue file may have 2 MB.')
  const reading = await readUpload(bytes)
  const problems = firstProblems(reading.problems)
  if (reading.rows.length === 0)
    throw new AppError(
      422,
      'catalogue_unreadable',
      'No row of the catalogue can be read',
      'Nothing was stored. Correct the file and upload it again.',
      {
        issues:
          problems.length > 0 ? problems : [{ line: 1, message: 'There is no row below the head of the catalogue.' }],
      },
    )
  const rowsJson = JSON.stringify(reading.rows)
  const hash = sha256(rowsJson)
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    const replaced = await endCatalogue(tx, principal.office.id, now)
    await tx.insert(catalogues).values({
      officeId: principal.office.id,
      fileName,
      rowsJson,
      rowCount: reading.rows.length,
      hash,
      problemsJson: JSON.stringify(problems),
      uploadedAt: now,
      uploadedBy: principal.name,
    })
    await recordEvent(tx, principal, now, {
      action: 'catalogue uploaded',
      detail: `${fileName}: ${reading.rows.length} rows, content ${hash.slice(0, 12)}${replaced === null ? '' : `, in place of ${replaced}`}`,
    })
  })
}

/** Takes the catalogue away: from now on no vessel is chosen. Issued revisions keep theirs. @throws {AppError} 404 where there is none */
export const removeCatalogue = async (
  deps: Pick<Deps, 'db' | 'clock'>,
  principal: Pick<Principal, 'name' | 'office'>,
): Promise<void> => {
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    const ended = await endCatalogue(tx, principal.office.id, now)
    if (ended === null) throw notFound()
    await recordEvent(tx, principal, now, { action: 'catalogue taken away', detail: ended })
  })
}

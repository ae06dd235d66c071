import { and, eq } from 'drizzle-orm'
import { finishMaking } from '../commands/finish-making.ts'
import type { Clock } from '../clock.ts'
import type { Database } from '../db/client.ts'
import { makings } from '../db/schema/index.ts'
import type { MakingRow } from '../review/project-facts.ts'
import { gatherDocuments } from './gather-documents.ts'
import { MAKING_STAGES } from './making-stages.ts'
import type { Printer } from './printer.ts'
import { writeDocuments } from './write-documents.ts'

export interface Maker {
  readonly db: Database
  readonly clock: Clock
  readonly printer: Printer
  readonly address: () => string
}

/** Changes what is known of a making. */
export const noteMaking = async (db: Database, making: MakingRow, values: Partial<MakingRow>): Promise<void> => {
  await db
    .update(makings)
    .set(values)
    .where(and(eq(makings.revisionId, making.revisionId), eq(makings.set, making.set)))
}

/** Makes and stores the files of one making. Without its revision there is nothing to do. */
export const makeFiles = async (maker: Maker, making: MakingRow, signal: AbortSignal): Promise<void> => {
  const { db, clock, printer, address } = maker
  const gathered = await gatherDocuments(db, making.revisionId, making.askedAt, () => making)
  if (!gathered) return
  // Stage notes are written one after the other and before the files are stored.
  let noted: Promise<void> = Promise.resolve()
  const written = await writeDocuments(
    {
      write: 'files',
      result: gathered.result,
      options: gathered.options,
      withVerification: making.withVerification,
    },
    printer,
    (stage) => {
      noted = noted.then(() => noteMaking(db, making, { stage }))
    },
    signal,
  )
  await noted
  await noteMaking(db, making, { stage: MAKING_STAGES.length - 1 })
  const units = gathered.options.units
  await finishMaking(db, { making, units, written, address: address(), now: clock() })
}

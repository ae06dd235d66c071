import type { Request, Response } from 'express'
import { recordEvent } from '../../commands/record-event.ts'
import type { Deps } from '../../deps.ts'
import { AppError, notFound } from '../../errors.ts'
import { accessIn } from '../../middleware/require-project.ts'
import { seesHandoverOnly } from '../../policies/project-access.ts'
import { sha256 } from '../../review/content-hash.ts'
import { findRevision } from '../../review/find-revision.ts'
import { projectFacts } from '../../review/project-facts.ts'
import { constructionRevision } from '../../review/standing.ts'
import { storedFile } from './revisions.queries.ts'

const TYPES = {
  schedule: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  submittal: 'application/vnd.openxmlformats-officedocument.wordprocessingml.document',
  pdf: 'application/pdf',
} as const

interface Stored {
  readonly kind: keyof typeof TYPES
  readonly name: string
  readonly sha256: string
  readonly content: Uint8Array
}

/**
 * Sends bytes from the store after checking that they are still the ones that were stored; `record` writes it down before.
 * @throws {AppError} 500 file_damaged
 */
export const sendStored = async (
  res: Response,
  { kind, name, sha256: stored, content }: Stored,
  record: () => Promise<void>,
): Promise<void> => {
  if (sha256(content) !== stored)
    throw new AppError(
      500,
      'file_damaged',
      'The stored file is damaged',
      'Its bytes are no longer the ones that were issued, so it is not handed out. Tell the administrator.',
    )
  await record()
  res
    .set({
      ETag: `"${stored}"`,
      'Cache-Control': 'private, no-cache',
      'Content-Type': TYPES[kind],
      // The name is made of letters, digits, dots and hyphens (file-name.ts of the documents), so it needs no escape.
      'Content-Disposition': `attachment; filename="${name}"`,
    })
    .send(Buffer.from(content))
}

/**
 * Sends a stored file after checking that its bytes are still the ones that were issued.
 * @throws {AppError} 404, also for a contractor who asks for anything but the files of the issue in force; 500 file_damaged
 */
export const sendFile = async (
  deps: Deps,
  req: Request<{ project: string; rev: string; name: string }>,
  res: Response,
): Promise<void> => {
  const access = accessIn(res)
  const facts = await projectFacts(deps.db, access.project)
  const revision = findRevision(facts, req.params.rev)
  const file = await storedFile(deps.db, revision.id, req.params.name)
  if (!file) throw notFound()
  if (seesHandoverOnly(access) && (file.set !== 'construction' || constructionRevision(facts)?.id !== revision.id))
    throw notFound()
  await sendStored(res, file, () =>
    recordEvent(deps.db, access.principal, deps.clock(), {
      action: 'file downloaded',
      project: access.project.number,
      detail: file.name,
    }),
  )
}

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
} as const

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
  if (sha256(file.content) !== file.sha256)
    throw new AppError(
      500,
      'file_damaged',
      'The stored file is damaged',
      'Its bytes are no longer the ones that were issued, so it is not handed out. Tell the administrator.',
    )
  await recordEvent(deps.db, access.principal, deps.clock(), {
    action: 'file downloaded',
    project: access.project.number,
    detail: file.name,
  })
  res
    .set({
      ETag: `"${file.sha256}"`,
      'Cache-Control': 'private, no-cache',
      'Content-Type': TYPES[file.kind],
      // The name is made of letters, digits, dots and hyphens (file-name.ts of the documents), so it needs no escape.
      'Content-Disposition': `attachment; filename="${file.name}"`,
    })
    .send(Buffer.from(file.content))
}

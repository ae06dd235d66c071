import { and, eq, sql } from 'drizzle-orm'
import type { Anchor } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { projects, redlineMessages, redlines } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError, notFound } from '../errors.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { projectPermissions, requirePermission } from '../policies/project-permissions.ts'
import { requireRedline } from '../policies/redlines.ts'
import { nearestKeys, readAnchor } from '../review/anchor-reading.ts'
import { frozenContent } from '../review/frozen.ts'
import type { ProjectFacts } from '../review/project-facts.ts'
import { newestRevision } from '../review/standing.ts'

interface NewRedline {
  readonly anchor: Anchor
  readonly quoted: string
  readonly text: string
  readonly mustAnswer: boolean
  readonly proposedValue: string | null
  readonly officeOnly: boolean
}

/**
 * Writes a redline on the newest revision. It is pending, seen by its author alone, until the review is sent; one for the office only
 * is open at once. Returns its number.
 * @throws {AppError} 403; 422 no_such_place with the keys that are there
 */
export const writeRedline = async (
  deps: Deps,
  access: ProjectAccess,
  facts: ProjectFacts,
  redline: NewRedline,
): Promise<number> => {
  const permissions = projectPermissions(access, facts)
  requirePermission(redline.officeOnly ? permissions.officeRedline : permissions.redline)
  const revision = newestRevision(facts)
  if (!revision) throw notFound()
  const content = await frozenContent(deps.db, revision.id)
  const reading = readAnchor(redline.anchor, content)
  if (!reading) {
    const keys = nearestKeys(redline.anchor, content)
    throw new AppError(
      422,
      'no_such_place',
      'There is no such place',
      `Here there are: ${keys.join(', ') || 'none'}.`,
      {
        issues: [{ pointer: '/anchor', message: 'It names nothing in the newest revision.' }],
        extension: { keys },
      },
    )
  }
  const now = deps.clock()
  return withTx(deps.db, async (tx) => {
    const [project] = await tx
      .update(projects)
      .set({ lastRedline: sql`${projects.lastRedline} + 1` })
      .where(eq(projects.id, access.project.id))
      .returning({ number: projects.lastRedline })
    if (!project) throw notFound()
    const [row] = await tx
      .insert(redlines)
      .values({
        projectId: access.project.id,
        number: project.number,
        revisionId: revision.id,
        anchor: redline.anchor,
        quoted: redline.quoted === '' ? reading.shown : redline.quoted,
        proposedValue: redline.proposedValue === '' ? null : redline.proposedValue,
        // It is for nobody's issue to wait for.
        mustAnswer: redline.mustAnswer && !redline.officeOnly,
        officeOnly: redline.officeOnly,
        authorId: access.principal.userId,
        state: redline.officeOnly ? 'open' : 'pending',
        createdAt: now,
        publishedAt: redline.officeOnly ? now : null,
      })
      .returning({ id: redlines.id })
    if (!row) throw new Error('The redline was not written.')
    await tx.insert(redlineMessages).values({
      redlineId: row.id,
      position: 0,
      authorId: access.principal.userId,
      text: redline.text,
      did: 'wrote',
      writtenAt: now,
    })
    return project.number
  })
}

/** Changes or, with `null`, deletes an own pending redline. @throws {AppError} 403, 404, 409 wrong_state */
export const changePendingRedline = (
  deps: Deps,
  access: ProjectAccess,
  number: number,
  change: {
    text?: string | undefined
    mustAnswer?: boolean | undefined
    proposedValue?: string | null | undefined
  } | null,
): Promise<void> =>
  withTx(deps.db, async (tx) => {
    const [row] = await tx
      .select()
      .from(redlines)
      .where(and(eq(redlines.projectId, access.project.id), eq(redlines.number, number)))
    if (!row) throw notFound()
    requireRedline(access, row, change === null ? 'remove' : 'edit')
    if (change === null) {
      await tx.delete(redlines).where(eq(redlines.id, row.id))
      return
    }
    const { text, mustAnswer, proposedValue } = change
    await tx
      .update(redlines)
      .set({
        mustAnswer: mustAnswer ?? row.mustAnswer,
        proposedValue: proposedValue === undefined ? row.proposedValue : proposedValue === '' ? null : proposedValue,
      })
      .where(eq(redlines.id, row.id))
    if (text !== undefined)
      await tx
        .update(redlineMessages)
        .set({ text })
        .where(and(eq(redlineMessages.redlineId, row.id), eq(redlineMessages.position, 0)))
  })

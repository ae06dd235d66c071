import { and, eq } from 'drizzle-orm'
import type { SaveSpecRequest } from '@coldfill/contract'
import type { ProjectResult } from '@coldfill/sizing'
import type { Deps } from '../deps.ts'
import { projects, specs, users } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError } from '../errors.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { noteAssumptionChanges } from './note-assumption-changes.ts'
import { recordEvent } from './record-event.ts'

export interface SavedSpec {
  readonly text: string
  readonly version: number
  readonly savedAt: Date
  readonly savedBy: { readonly id: string; readonly name: string; readonly initials: string }
}

/** What the text says; null for one that cannot be sized, which is saved all the same. */
export const sizedText = async ({ sizing }: Pick<Deps, 'sizing'>, text: string): Promise<ProjectResult | null> => {
  try {
    const { result } = await sizing.size(text)
    return result.readable ? result : null
  } catch (error) {
    if (error instanceof AppError && error.status === 422) return null
    throw error
  }
}

/** Title and client as the text says them. */
const headerOf = (result: ProjectResult | null): { title?: string; client?: string } => {
  const [title = '', client = ''] = [result?.project.title.trim(), result?.project.client.trim()]
  return {
    ...(title === '' ? {} : { title: title.slice(0, 120) }),
    ...(client === '' ? {} : { client: client.slice(0, 120) }),
  }
}

/**
 * Saves the working copy where nobody else has in the meantime.
 * @throws {AppError} 409 version_conflict with the text that is there; 413 for a text above the limit
 */
export const saveSpec = async (deps: Deps, access: ProjectAccess, request: SaveSpecRequest): Promise<SavedSpec> => {
  const now = deps.clock()
  const sized = await sizedText(deps, request.text)
  const header = headerOf(sized)
  const { principal, project } = access
  const me = { id: principal.userId, name: principal.name, initials: principal.initials }
  return withTx(deps.db, async (tx) => {
    const [saved] = await tx
      .update(specs)
      .set({ text: request.text, version: request.baseVersion + 1, savedAt: now, savedBy: me.id })
      .where(and(eq(specs.projectId, project.id), eq(specs.version, request.baseVersion)))
      .returning()
    if (!saved) {
      const [current] = await tx
        .select({
          text: specs.text,
          version: specs.version,
          savedAt: specs.savedAt,
          savedBy: { id: users.id, name: users.name, initials: users.initials },
        })
        .from(specs)
        .innerJoin(users, eq(users.id, specs.savedBy))
        .where(eq(specs.projectId, project.id))
      throw new AppError(
        409,
        'version_conflict',
        'The spec was saved by somebody else',
        `${current?.savedBy.name ?? 'Somebody'} saved version ${current?.version ?? 0} while you worked from version ${request.baseVersion}. Both texts are kept: compare them and save again.`,
        { extension: { current } },
      )
    }
    if (Object.keys(header).length > 0) await tx.update(projects).set(header).where(eq(projects.id, project.id))
    if (sized) await noteAssumptionChanges(tx, project.id, sized, me.id, now)
    await recordEvent(tx, principal, now, {
      action: 'spec saved',
      project: project.number,
      detail: `Version ${saved.version}`,
    })
    return { text: saved.text, version: saved.version, savedAt: saved.savedAt, savedBy: me }
  })
}

import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { eq } from 'drizzle-orm'
import type { CreateProjectRequest } from '@coldfill/contract'
import { blankSpec } from '../blank-spec.ts'
import type { Deps } from '../deps.ts'
import { members, projects, specs } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { AppError, badBody, notAllowed } from '../errors.ts'
import { projectAccess, requireInside, seesWorkingCopy } from '../policies/project-access.ts'
import type { Principal } from '../sign-in/sessions.ts'
import { noteAssumptionChanges } from './note-assumption-changes.ts'
import { recordEvent } from './record-event.ts'
import { sizedText } from './save-spec.ts'

export const DEFAULT_EXAMPLE = 'fernhollow'

/** The spec of an example building. @throws {AppError} 400 where there is none of that name */
const exampleSpec = async (folder: string, name: string): Promise<string> => {
  const missing = badBody([{ pointer: '/example', message: `There is no example building "${name}".` }])
  if (!/^[a-z][a-z0-9-]*$/.test(name)) throw missing
  try {
    return await readFile(join(folder, name, 'spec.yaml'), 'utf8')
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') throw missing
    throw error
  }
}

const copiedSpec = async (deps: Deps, principal: Principal, number: string): Promise<string> => {
  const access = requireInside(await projectAccess(deps.db, principal, number))
  if (!seesWorkingCopy(access)) throw notAllowed('Only one who sees the working copy of a project copies it.')
  const [spec] = await deps.db.select({ text: specs.text }).from(specs).where(eq(specs.projectId, access.project.id))
  return spec?.text ?? ''
}

/**
 * Opens a project in the person's office, with them as its consultant. The caller has asked whether they may.
 * @throws {AppError} 400 for an unknown example, 403 and 404 for a project to copy that is not theirs, 409 number_taken
 */
export const createProject = async (
  deps: Deps,
  principal: Principal,
  request: Pick<CreateProjectRequest, 'number' | 'title' | 'from'> & { readonly example?: string | undefined },
): Promise<string> => {
  const text =
    request.from === 'blank'
      ? blankSpec(request.number, request.title)
      : request.from === 'example'
        ? await exampleSpec(deps.examplesFolder, request.example ?? DEFAULT_EXAMPLE)
        : await copiedSpec(deps, principal, request.from.copy)
  const sized = await sizedText(deps, text)
  const now = deps.clock()
  return withTx(deps.db, async (tx) => {
    const [project] = await tx
      .insert(projects)
      .values({ officeId: principal.office.id, number: request.number, title: request.title, createdAt: now })
      .onConflictDoNothing()
      .returning()
    if (!project)
      throw new AppError(
        409,
        'number_taken',
        'The number is taken',
        `The office has a project ${request.number} already.`,
      )
    await tx.insert(members).values({ projectId: project.id, userId: principal.userId, roles: ['consultant'] })
    await tx.insert(specs).values({ projectId: project.id, text, savedAt: now, savedBy: principal.userId })
    if (sized) await noteAssumptionChanges(tx, project.id, sized, principal.userId, now)
    await recordEvent(tx, principal, now, { action: 'project opened', project: project.number, detail: project.title })
    return project.number
  })
}

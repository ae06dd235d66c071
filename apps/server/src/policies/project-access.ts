import type { Role } from '@coldfill/contract'
import { and, eq, sql } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { members, projects } from '../db/schema/index.ts'
import { notFound } from '../errors.ts'
import type { ProjectRow } from '../review/project-facts.ts'
import type { Principal } from '../sign-in/sessions.ts'

/** A person before a project that they may know of. */
export interface ProjectAccess {
  readonly principal: Principal
  readonly project: ProjectRow
  readonly roles: readonly Role[]
  readonly administrator: boolean
}

/**
 * The project of that number in the person's own office, where they are a member or the office's administrator.
 * @throws {AppError} 404 otherwise, the same for a project that does not exist
 */
export const projectAccess = async (db: Reader, principal: Principal, number: string): Promise<ProjectAccess> => {
  const [row] = await db
    .select({ project: projects, roles: members.roles })
    .from(projects)
    .leftJoin(members, and(eq(members.projectId, projects.id), eq(members.userId, principal.userId)))
    .where(and(eq(projects.officeId, principal.office.id), sql`lower(${projects.number}) = lower(${number})`))
  const roles = row?.roles ?? []
  if (!row || (roles.length === 0 && !principal.administrator)) throw notFound()
  return { principal, project: row.project, roles, administrator: principal.administrator }
}

export const is = (access: ProjectAccess, role: Role): boolean => access.roles.includes(role)

/** One whose only part in the project is to build: they see what is issued for construction, and nothing before that. */
export const seesHandoverOnly = (access: ProjectAccess): boolean =>
  !access.administrator && !is(access, 'consultant') && !is(access, 'reviewer')

export const seesWorkingCopy = (access: ProjectAccess): boolean => access.administrator || is(access, 'consultant')

/** @throws {AppError} 404 for one who sees the handover only */
export const requireInside = (access: ProjectAccess): ProjectAccess => {
  if (seesHandoverOnly(access)) throw notFound()
  return access
}

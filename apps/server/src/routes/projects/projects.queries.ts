import { and, asc, eq } from 'drizzle-orm'
import type { Role } from '@coldfill/contract'
import type { Reader } from '../../db/client.ts'
import { members, projects } from '../../db/schema/index.ts'
import type { ProjectRow } from '../../review/project-facts.ts'
import type { Principal } from '../../sign-in/sessions.ts'

/** The projects of the person's office that they may know of, with their roles in each. */
export const visibleProjects = async (
  db: Reader,
  principal: Principal,
): Promise<{ project: ProjectRow; roles: readonly Role[] }[]> => {
  const rows = await db
    .select({ project: projects, roles: members.roles })
    .from(projects)
    .leftJoin(members, and(eq(members.projectId, projects.id), eq(members.userId, principal.userId)))
    .where(eq(projects.officeId, principal.office.id))
    .orderBy(asc(projects.createdAt))
  return rows
    .map(({ project, roles }) => ({ project, roles: roles ?? [] }))
    .filter(({ roles }) => roles.length > 0 || principal.administrator)
}

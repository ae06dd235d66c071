import { and, eq } from 'drizzle-orm'
import type { Role } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { members, users } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import { notFound } from '../errors.ts'
import type { ProjectAccess } from '../policies/project-access.ts'
import { recordEvent } from './record-event.ts'

/**
 * Gives a person of the office roles in a project; none ends the membership. The caller has asked whether
 * that is theirs to give. @throws {AppError} 404 for a person of another office
 */
export const setMember = async (
  deps: Deps,
  access: ProjectAccess,
  userId: string,
  member: { readonly roles: readonly Role[]; readonly requiredReviewer: boolean },
): Promise<void> => {
  const now = deps.clock()
  const { principal, project } = access
  await withTx(deps.db, async (tx) => {
    const [user] = await tx
      .select({ name: users.name })
      .from(users)
      .where(and(eq(users.id, userId), eq(users.officeId, principal.office.id)))
    if (!user) throw notFound()
    const roles = [...new Set(member.roles)]
    const required = member.requiredReviewer && roles.includes('reviewer')
    if (roles.length === 0)
      await tx.delete(members).where(and(eq(members.projectId, project.id), eq(members.userId, userId)))
    else
      await tx
        .insert(members)
        .values({ projectId: project.id, userId, roles, requiredReviewer: required })
        .onConflictDoUpdate({ target: [members.projectId, members.userId], set: { roles, requiredReviewer: required } })
    await recordEvent(tx, principal, now, {
      action: 'member set',
      project: project.number,
      detail: `${user.name}: ${roles.join(', ') || 'no longer a member'}${required ? ' (required)' : ''}`,
    })
  })
}

import type { Session } from '@coldfill/contract'
import type { Principal } from '../../sign-in/sessions.ts'

export const presentSession = (principal: Principal): Session => ({
  user: {
    id: principal.userId,
    name: principal.name,
    initials: principal.initials,
    email: principal.email,
    office: principal.office,
    administrator: principal.administrator,
    mayCreateProjects: principal.mayCreateProjects,
  },
  expiresAt: principal.session.expiresAt.toISOString(),
})

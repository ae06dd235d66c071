import type { AuditTrail, Mail, People } from '@coldfill/contract'
import type { officeEvents, officeMails, officeMemberships, officePeople } from './office.queries.ts'

type Rows<Query extends (...args: never[]) => PromiseLike<readonly unknown[]>> = Awaited<ReturnType<Query>>

export const presentMail = ({ mail, project }: Rows<typeof officeMails>[number]): Mail => ({
  id: mail.id,
  event: mail.event,
  to: { name: mail.toName, email: mail.toEmail },
  subject: mail.subject,
  text: mail.text,
  html: mail.html,
  state: mail.state,
  attempts: mail.attempts,
  problem: mail.problem,
  createdAt: mail.createdAt.toISOString(),
  sentAt: mail.sentAt?.toISOString() ?? null,
  project,
})

export const presentPeople = (
  people: Rows<typeof officePeople>,
  memberships: Rows<typeof officeMemberships>,
): People['people'] =>
  people.map((user) => ({
    id: user.id,
    name: user.name,
    initials: user.initials,
    email: user.email,
    administrator: user.administrator,
    mayCreateProjects: user.mayCreateProjects || user.administrator,
    projects: memberships
      .filter(({ userId }) => userId === user.id)
      .map(({ number, roles, requiredReviewer }) => ({ number, roles, requiredReviewer })),
    lastSignIn: user.lastSignInAt?.toISOString() ?? null,
  }))

export const presentEvents = (events: Rows<typeof officeEvents>): AuditTrail['events'] =>
  events.map((event) => ({
    id: String(event.id),
    at: event.at.toISOString(),
    who: event.who,
    action: event.action,
    project: event.project,
    detail: event.detail,
  }))

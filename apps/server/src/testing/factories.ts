import { randomUUID } from 'node:crypto'
import type { Role } from '@coldfill/contract'
import type { Deps } from '../deps.ts'
import { members, offices, projects, specs, users } from '../db/schema/index.ts'
import { loopSpec } from './specs.ts'

/** Password of every person that the factories make. */
export const PASSWORD = 'correct horse battery'

type Office = typeof offices.$inferSelect
type User = typeof users.$inferSelect
type Project = typeof projects.$inferSelect

const only = <T>(rows: readonly T[]): T => {
  const [row] = rows
  if (row === undefined) throw new Error('The factory wrote no row.')
  return row
}

export interface Factories {
  office(name?: string): Promise<Office>
  user(
    office: Office,
    person?: Partial<Pick<User, 'email' | 'name' | 'administrator' | 'mayCreateProjects' | 'active'>>,
  ): Promise<User>
  project(
    office: Office,
    project: {
      readonly number?: string
      readonly text?: string
      readonly members: readonly { readonly user: User; readonly roles: readonly Role[]; readonly required?: boolean }[]
    },
  ): Promise<Project>
}

export const createFactories = ({ db, clock, passwords }: Pick<Deps, 'db' | 'clock' | 'passwords'>): Factories => {
  const passwordHash = passwords.hash(PASSWORD)
  return {
    office: async (name = 'An office') => only(await db.insert(offices).values({ name }).returning()),
    user: async (office, person = {}) => {
      const name = person.name ?? 'A Person'
      const initials = name
        .split(' ')
        .map((word) => word.charAt(0))
        .join('')
      return only(
        await db
          .insert(users)
          .values({
            officeId: office.id,
            email: `${randomUUID()}@test.example`,
            name,
            initials,
            passwordHash: await passwordHash,
            ...person,
          })
          .returning(),
      )
    },
    project: async (office, { number = 'T-1', text, members: people }) => {
      const project = only(
        await db
          .insert(projects)
          .values({ officeId: office.id, number, title: 'Mill Yard', createdAt: clock() })
          .returning(),
      )
      const savedBy = people[0]?.user.id
      if (savedBy === undefined) throw new Error('A project has a first member, who saved its spec.')
      await db
        .insert(specs)
        .values({ projectId: project.id, text: text ?? loopSpec({ number }), savedAt: clock(), savedBy })
      for (const { user, roles, required } of people)
        await db
          .insert(members)
          .values({ projectId: project.id, userId: user.id, roles: [...roles], requiredReviewer: required ?? false })
      return project
    },
  }
}

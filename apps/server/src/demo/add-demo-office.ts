import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { exampleCatalogueFile } from '../catalogue/example-catalogue.ts'
import { noteAssumptionChanges } from '../commands/note-assumption-changes.ts'
import { putCatalogue } from '../commands/put-catalogue.ts'
import { blankSpec } from '../blank-spec.ts'
import type { Clock } from '../clock.ts'
import type { Database } from '../db/client.ts'
import { members, offices, projects, specs, users } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import type { Passwords } from '../sign-in/passwords.ts'
import type { SizingService } from '../sizing-service.ts'
import { DEMO_OFFICES, DEMO_PASSWORD, type DemoProject } from './demo-people.ts'

const specOf = async (examplesFolder: string, project: DemoProject): Promise<string> => {
  if (project.example !== null)
    try {
      return await readFile(join(examplesFolder, project.example, 'spec.yaml'), 'utf8')
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error
    }
  return blankSpec(project.number, project.title)
}

const exampleCatalogue = async (examplesFolder: string): Promise<Uint8Array | null> => {
  try {
    return await readFile(exampleCatalogueFile(examplesFolder))
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error
    return null
  }
}

interface Demo {
  readonly db: Database
  readonly clock: Clock
  readonly passwords: Passwords
  readonly sizing: SizingService
  readonly examplesFolder: string
}

/** Puts the demo offices into a database that has no office yet. Returns whether it did. */
export const addDemoOffice = async ({ db, clock, passwords, sizing, examplesFolder }: Demo): Promise<boolean> => {
  const [any] = await db.select({ id: offices.id }).from(offices).limit(1)
  if (any) return false
  const now = clock()
  // All that is slow comes before the transaction.
  const passwordHash = await passwords.hash(DEMO_PASSWORD)
  const prepared = await Promise.all(
    DEMO_OFFICES.map(async (office) => ({
      ...office,
      projects: await Promise.all(
        office.projects.map(async (project) => {
          const text = await specOf(examplesFolder, project)
          // The header of the spec is welcome, not needed: a start does not fail for it.
          const sized = await sizing.size(text).then(
            ({ result }) => result,
            () => null,
          )
          const title = sized?.project.title || project.title
          return { number: project.number, title, client: sized?.project.client ?? '', text, sized }
        }),
      ),
    })),
  )
  const given: { name: string; office: { id: string; name: string } }[] = []
  await withTx(db, async (tx) => {
    for (const { name, people, catalogue, projects: opened } of prepared) {
      const [office] = await tx.insert(offices).values({ name, createdAt: now }).returning()
      if (!office) throw new Error('The demo office was not written.')
      const added = await tx
        .insert(users)
        .values(
          people.map((person, index) => ({
            officeId: office.id,
            email: person.email,
            name: person.name,
            initials: person.initials,
            passwordHash,
            administrator: person.administrator ?? false,
            mayCreateProjects: person.mayCreateProjects ?? false,
            createdAt: new Date(now.getTime() + index),
          })),
        )
        .returning()
      const administrator = people.find((person) => person.administrator)
      if (catalogue && administrator) given.push({ name: administrator.name, office: { id: office.id, name } })
      const idOf = new Map(added.map((user) => [user.email, user.id]))
      const consultant = people.find(({ roles }) => roles.includes('consultant'))
      for (const [index, { number, title, client, text, sized }] of opened.entries()) {
        const [project] = await tx
          .insert(projects)
          .values({ officeId: office.id, number, title, client, createdAt: new Date(now.getTime() + index) })
          .returning()
        const savedBy = idOf.get(consultant?.email ?? '')
        if (!project || savedBy === undefined) throw new Error('The demo project was not written.')
        await tx.insert(specs).values({ projectId: project.id, text, savedAt: now, savedBy })
        if (sized) await noteAssumptionChanges(tx, project.id, sized, savedBy, now)
        for (const { email, roles } of people) {
          const userId = idOf.get(email)
          if (roles.length > 0 && userId !== undefined)
            await tx.insert(members).values({
              projectId: project.id,
              userId,
              roles: [...roles],
              requiredReviewer: roles.includes('reviewer'),
            })
        }
      }
    }
  })
  const bytes = given.length === 0 ? null : await exampleCatalogue(examplesFolder)
  if (bytes) for (const by of given) await putCatalogue({ db, clock }, by, 'vessels.csv', bytes)
  return true
}

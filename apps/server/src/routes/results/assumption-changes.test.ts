import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { CreateProjectRequest, type Results, type SpecDocument } from '@coldfill/contract'
import { members, users } from '../../db/schema/index.ts'
import { gatherDocuments } from '../../documents/gather-documents.ts'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t, 'T-1')
  // A second author.
  const [otto] = await t.deps.db.select().from(users).where(eq(users.name, 'Otto Vane'))
  await t.deps.db
    .update(members)
    .set({ roles: ['reviewer', 'consultant'] })
    .where(eq(members.userId, otto?.id ?? ''))
})
afterAll(() => t.close())

const withMargin = (value: string, reason: string): string =>
  loopSpec().replace(
    'systems:',
    `assumptions:\n  relief-margin.hydronic: { value: ${value}, reason: ${reason} }\nsystems:`,
  )

const save = async (agent: Team['consultant'], text: string) => {
  const spec = (await agent.get(`${team.at}/spec`).expect(200)).body as SpecDocument
  await agent.put(`${team.at}/spec`).send({ text, baseVersion: spec.version }).expect(200)
}

const changes = async (query = '') =>
  ((await team.consultant.get(`${team.at}/results${query}`).expect(200)).body as Results).assumptionChanges.map(
    ({ assumption, by }) => `${assumption}: ${by}`,
  )

it('names who put a value in the place of a default, and keeps the name while it stands', async () => {
  expect(await changes()).toEqual([])
  await save(team.consultant, withMargin('15 %', 'our standard'))
  await save(team.reviewer, `${withMargin('15 %', 'our standard')}# a remark\n`)
  expect(await changes()).toEqual(['relief-margin.hydronic: Runa Sedge'])
  await save(team.reviewer, withMargin('12 %', 'wish of the client'))
  expect(await changes()).toEqual(['relief-margin.hydronic: Otto Vane'])
})

it('holds in a frozen revision and its documents whatever is saved after it', async () => {
  const first = await team.issue()
  await save(team.consultant, loopSpec())
  expect(await changes()).toEqual([])
  await save(team.consultant, withMargin('12 %', 'wish of the client'))
  expect(await changes()).toEqual(['relief-margin.hydronic: Runa Sedge'])
  expect(await changes('?rev=-')).toEqual(['relief-margin.hydronic: Otto Vane'])
  const gathered = await gatherDocuments(t.deps.db, first.id, new Date(), (_, revision) => ({
    set: 'review',
    askedAt: revision.issuedAt,
    askedBy: revision.issuedBy,
    overrideReason: null,
    units: null,
    withRedlines: false,
    withVerification: false,
    titleBlockId: null,
  }))
  expect(gathered?.options.assumptionChanges).toMatchObject([{ assumption: 'relief-margin.hydronic', by: 'Otto Vane' }])
})

it('takes whoever opens a project from an example for the author of its values', async () => {
  const body = CreateProjectRequest.parse({ number: 'T-77', title: 'Clinic', from: 'example' })
  await team.consultant.post('/api/projects').send(body).expect(201)
  const { assumptionChanges } = (await team.consultant.get('/api/projects/T-77/results').expect(200)).body as Results
  expect(assumptionChanges.map(({ by }) => by)).toEqual(['Runa Sedge'])
})

import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import type { Results } from '@coldfill/contract'
import { revisions } from '../../db/schema/index.ts'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
})
afterAll(() => t.close())

const results = async (agent: Team['consultant'], query = ''): Promise<Results> =>
  (await agent.get(`${team.at}/results${query}`).expect(200)).body as Results

it('gives the consultant the working copy, compared with the newest issue', async () => {
  expect(await results(team.consultant)).toMatchObject({ revision: null, changedSince: null })
  await team.issue()
  expect((await results(team.consultant)).changedSince).toEqual({ revision: '', vessels: [] })
  await team.save(loopSpec({ relief: '40 psi', marks: ['ET-1', 'ET-2'] }))
  const { changedSince } = await results(team.consultant)
  const changed = changedSince?.vessels ?? []
  expect(changed).toEqual(
    expect.arrayContaining([
      expect.objectContaining({ mark: 'ET-1', key: 'maximum-pressure', kind: 'gauge pressure' }),
      expect.objectContaining({ mark: 'ET-2', key: 'status', was: null, now: 'sized' }),
    ]) as unknown,
  )
  // The fill pressure does not depend on the relief valve.
  expect(changed.filter(({ mark, key }) => mark === 'ET-1' && key === 'fill-pressure')).toEqual([])
})

it('gives the reviewer frozen results only, the newest or the one asked for', async () => {
  const frozen = await results(team.reviewer)
  expect(frozen.revision).toBe('')
  expect(frozen).toEqual(await results(team.consultant, '?rev=-'))
  const revA = await team.issue()
  expect(await results(team.reviewer)).toMatchObject({
    revision: 'A',
    contentHash: revA.contentHash,
    changedSince: { revision: '' },
  })
  expect(await results(team.reviewer, '?rev=-')).toEqual(frozen)
  await team.reviewer.get(`${team.at}/results?rev=B`).expect(404)
})

it('answers 401 without a session and 404 across offices', async () => {
  await t.anonymous().get(`${team.at}/results`).expect(401)
  await team.stranger.get(`${team.at}/results`).expect(404)
})

it('shows nothing rather than a frozen content that was altered in the store', async () => {
  const own = await createTeam(t, 'T-40')
  const { id } = await own.issue()
  await t.deps.db.update(revisions).set({ specText: 'altered' }).where(eq(revisions.id, id))
  const res = await own.reviewer.get(`${own.at}/results`).expect(500)
  expect(res.body).toMatchObject({ code: 'internal', retryable: true })
  expect(JSON.stringify(res.body)).not.toContain('altered')
  expect(t.errors.splice(0).join()).toContain('is not the content that was frozen')
})

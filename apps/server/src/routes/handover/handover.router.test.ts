import { afterAll, beforeAll, expect, it } from 'vitest'
import { Handover } from '@coldfill/contract'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
})
afterAll(() => t.close())

const handover = async (query = ''): Promise<Handover> =>
  Handover.parse((await team.contractor.get(`${team.at}/handover${query}`).expect(200)).body)

it('says nothing of a revision that is in review, under whatever name it is asked for', async () => {
  const before = await handover()
  await team.issue()
  expect(await handover()).toEqual(before)
  expect(await handover('?rev=-')).toEqual(before)
  expect(await handover('?rev=A')).toEqual(before)
  expect(JSON.stringify(before)).not.toContain('review')
})

it('gives the files and what is to be set in the field', async () => {
  await team.review(await team.revision('-'), 'accepted')
  await team.consultant.post(`${team.at}/revisions/-/construction`).send({}).expect(202)
  await t.settle()
  const { current, superseded } = await handover('?rev=-')
  expect(superseded).toBe(false)
  expect(current?.files.map(({ kind, set }) => `${kind} ${set}`).toSorted()).toEqual([
    'schedule construction',
    'submittal construction',
  ])
  const [setting] = current?.settings ?? []
  expect(setting).toMatchObject({ mark: 'ET-1', system: 'HWS' })
  // Of a closed loop: the gas is charged to the fill pressure, and the relief valve opens above it.
  expect(setting?.precharge?.value ?? 0).toBeGreaterThan(0)
  expect(setting?.relief?.value ?? 0).toBeGreaterThan(setting?.fill?.value ?? Infinity)
})

it('answers 401 without a session and 404 across offices', async () => {
  await t.anonymous().get(`${team.at}/handover`).expect(401)
  await team.stranger.get(`${team.at}/handover`).expect(404)
})

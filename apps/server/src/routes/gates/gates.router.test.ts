import { afterAll, beforeAll, expect, it } from 'vitest'
import { GateList } from '@coldfill/contract'
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

const gates = async (purpose: string): Promise<Record<string, string>> => {
  const list = GateList.parse((await team.consultant.get(`${team.at}/gates?for=${purpose}`).expect(200)).body)
  return Object.fromEntries(list.gates.map(({ id, state }) => [id, state]))
}

it('lists what stands before an issue for review, and each point says where it is settled', async () => {
  expect(await gates('review')).toEqual({
    vessels: 'pass',
    'spec-findings': 'pass',
    reviewer: 'pass',
    changed: 'pass',
    making: 'pass',
  })
  await team.save(loopSpec({ relief: '30 gal' }))
  expect(await gates('review')).toMatchObject({ 'spec-findings': 'hold' })
  // An infeasible vessel is a matter for review, not a mistake of the text.
  await team.save(loopSpec({ relief: '5 psi' }))
  expect(await gates('review')).toMatchObject({ 'spec-findings': 'pass' })
})

it('lists what stands before construction', async () => {
  expect(await gates('construction')).toEqual({ issued: 'hold' })
  await team.save(loopSpec())
  const first = await team.issue()
  expect(await gates('review')).toMatchObject({ changed: 'hold' })
  expect(await gates('construction')).toEqual({
    issued: 'pass',
    files: 'pass',
    'must-answer': 'pass',
    'disposition-given': 'overridable',
    'disposition-fresh': 'pass',
    'disposition-for': 'pass',
    'error-findings': 'pass',
  })
  await team.review(first, 'accepted')
  expect(Object.values(await gates('construction')).every((state) => state === 'pass')).toBe(true)
})

it('answers 400 for a purpose that is none, 401 without a session and 404 across offices', async () => {
  await team.consultant.get(`${team.at}/gates?for=fun`).expect(400)
  await t.anonymous().get(`${team.at}/gates`).expect(401)
  await team.stranger.get(`${team.at}/gates`).expect(404)
})

import { afterAll, beforeAll, expect, it } from 'vitest'
import type { ProjectResult } from '@coldfill/contract'
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

const size = async (text: string): Promise<ProjectResult> =>
  (await team.consultant.post(`${team.at}/sizing`).send({ text }).expect(200)).body as ProjectResult

it('sizes a text as it is typed and saves nothing', async () => {
  const result = await size(loopSpec({ relief: '75 psi' }))
  expect(result.vessels[0]).toMatchObject({ mark: 'ET-1', status: 'sized' })
  const spec = await team.consultant.get(`${team.at}/spec`).expect(200)
  expect((spec.body as { text: string }).text).not.toContain('75 psi')
})

it.each([
  ['broken YAML', 'coldfill: 1\nproject: [', 'CF-Y'],
  ['an unknown key', loopSpec().replace('static-height', 'statik-height'), 'CF-S'],
  ['a wrong unit', loopSpec({ relief: '30 gal' }), 'CF-S'],
  ['an alias bomb', 'a: &a [x, x, x]\nb: &b [*a, *a, *a]\nc: [*b, *b, *b]\ncoldfill: 1\n', 'CF-Y'],
])('answers %s with a finding at its place', async (_what, text, layer) => {
  const { findings } = await size(text)
  const errors = findings.filter(({ severity }) => severity === 'error')
  expect(errors.length).toBeGreaterThan(0)
  expect(errors[0]?.code.startsWith(layer)).toBe(true)
  expect(errors[0]?.range.start.line).toBeGreaterThanOrEqual(0)
})

it('answers an impossible pressure with an infeasible vessel and a reason', async () => {
  const { vessels } = await size(loopSpec({ relief: '5 psi' }))
  expect(vessels[0]?.status).toBe('infeasible')
  expect(vessels[0]?.reason ?? '').not.toBe('')
})

it('answers 401 without a session, 404 across offices, and lists what is wrong with the body', async () => {
  await t.anonymous().post(`${team.at}/sizing`).send({ text: '' }).expect(401)
  await team.stranger.post(`${team.at}/sizing`).send({ text: '' }).expect(404)
  const res = await team.consultant.post(`${team.at}/sizing`).send({ content: 1 }).expect(400)
  expect((res.body as { errors: object[] }).errors).toHaveLength(2)
})

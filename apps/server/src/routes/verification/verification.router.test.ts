import { afterAll, beforeAll, expect, it } from 'vitest'
import { Verification } from '@coldfill/contract'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
beforeAll(async () => {
  t = await createTestApp()
})
afterAll(() => t.close())

it('gives the verification manual by source, to those who are signed in', async () => {
  await t.anonymous().get('/api/verification').expect(401)
  const agent = await t.signIn((await t.user(await t.office())).email)
  const manual = Verification.parse((await agent.get('/api/verification').expect(200)).body)
  const figures = manual.groups.flatMap((group) => group.figures)
  expect(manual.counts.fails).toBe(0)
  expect(figures).toHaveLength(manual.counts.holds + manual.counts.fails + manual.counts.knownWrong)
  expect(new Set(manual.groups.map(({ part, source }) => `${part} ${source}`)).size).toBe(manual.groups.length)
  for (const { verdict, reason } of figures) expect(reason === undefined).toBe(verdict !== 'known wrong')
  // The handbook prints 578 gal for its closed tank of 3,000 gal, 40 to 220 °F.
  expect(figures.find(({ id }) => id === 'H01')).toMatchObject({ expected: '578 gal', verdict: 'holds' })
})

import { afterAll, beforeAll, expect, it } from 'vitest'
import { Reference } from '@coldfill/contract'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
beforeAll(async () => {
  t = await createTestApp()
})
afterAll(() => t.close())

it('gives what the editor and the help pages need, to those who are signed in', async () => {
  await t.anonymous().get('/api/reference').expect(401)
  const user = await t.user(await t.office())
  const agent = await t.signIn(user.email)
  const reference = Reference.parse((await agent.get('/api/reference').expect(200)).body)
  expect(reference.vocabulary.kinds).toContain('expansion tank')
  expect(Object.keys(reference.findingCodes).some((code) => code.startsWith('CF-E'))).toBe(true)
  // Everything that is cited is there to be read.
  const cited = [
    ...Object.values(reference.assumptions).map(({ source }) => source.source),
    ...Object.values(reference.methods).flatMap(({ steps }) => steps.map(({ source }) => source.source)),
  ]
  expect(cited.filter((id) => !(id in reference.sources))).toEqual([])
})

it('gives the schema of the spec to anybody, from any site', async () => {
  const res = await t.anonymous().get('/schema/coldfill-1.json').expect(200)
  expect(res.headers['access-control-allow-origin']).toBe('*')
  expect(JSON.parse(res.text)).toMatchObject({ $schema: expect.stringContaining('json-schema.org') as unknown })
  await t.anonymous().get('/schema/coldfill-9.json').expect(404)
})

it('gives the schema under a versioned address that is its own id, with a tag, and says when nothing changed', async () => {
  const res = await t.anonymous().get('/schema/coldfill-1.json').expect(200)
  expect(res.headers['content-type']).toMatch(/^application\/schema\+json/u)
  expect(new URL((JSON.parse(res.text) as { readonly $id: string }).$id).pathname).toBe('/schema/coldfill-1.json')
  const tag = res.headers['etag'] ?? ''
  expect(tag).toMatch(/^(?:W\/)?".+"$/u)
  const again = await t.anonymous().get('/schema/coldfill-1.json').set('If-None-Match', tag).expect(304)
  expect(again.text).toBe('')
  // Without it a page elsewhere is refused the second answer, though nothing changed.
  expect(again.headers['access-control-allow-origin']).toBe('*')
  await t.anonymous().get('/schema/coldfill-1.json').set('If-None-Match', '"another"').expect(200)
})

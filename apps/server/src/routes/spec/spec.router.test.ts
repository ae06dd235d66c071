import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { SpecDocument } from '@coldfill/contract'
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

const read = async (): Promise<SpecDocument> =>
  (await team.consultant.get(`${team.at}/spec`).expect(200)).body as SpecDocument

describe('GET spec', () => {
  it('gives the text exactly as typed, open to the consultant', async () => {
    const text = `${loopSpec()}# a remark   with spaces \t\r\n\n\n# “quotes”, 60 °C, 漢\n`
    await team.save(text)
    expect(await read()).toMatchObject({ text, readOnly: null, savedBy: { name: 'Runa Sedge', initials: 'RS' } })
  })

  it('tells the administrator why they may not save', async () => {
    const res = await team.administrator.get(`${team.at}/spec`).expect(200)
    expect(res.body).toMatchObject({ readOnly: { reason: 'Only a consultant of the project edits the spec.' } })
  })

  it('answers 401 without a session and 404 across offices', async () => {
    await t.anonymous().get(`${team.at}/spec`).expect(401)
    await team.stranger.get(`${team.at}/spec`).expect(404)
  })

  it('gives the reviewer the frozen text, also when the working copy has moved on', async () => {
    const own = await createTeam(t, 'T-20')
    await own.reviewer.get(`${own.at}/spec`).expect(404)
    const frozen = loopSpec({ number: 'T-20', relief: '50 psi' })
    await own.save(frozen)
    await own.issue()
    await own.save(loopSpec({ number: 'T-20', relief: '60 psi' }))
    const seen = (await own.reviewer.get(`${own.at}/spec`).expect(200)).body as SpecDocument
    expect(seen).toMatchObject({ text: frozen, readOnly: { reason: 'First issue is frozen as it was issued.' } })
    const consultants = await own.consultant.get(`${own.at}/spec?rev=-`).expect(200)
    expect(consultants.body).toMatchObject({ text: frozen })
    await own.consultant.get(`${own.at}/spec?rev=K`).expect(404)
    await own.consultant.get(`${own.at}/spec?rev=A&rev=B`).expect(400)
  })
})

describe('PUT spec', () => {
  it('refuses a save from an older version, and hands back what is there', async () => {
    const spec = await read()
    const mine = loopSpec({ title: 'Mine' })
    const theirs = loopSpec({ title: 'Theirs' })
    await team.consultant.put(`${team.at}/spec`).send({ text: theirs, baseVersion: spec.version }).expect(200)
    const refused = await team.consultant.put(`${team.at}/spec`).send({ text: mine, baseVersion: spec.version })
    expect(refused.status).toBe(409)
    expect(refused.body).toMatchObject({
      code: 'version_conflict',
      current: { text: theirs, version: spec.version + 1, savedBy: { name: 'Runa Sedge' } },
    })
    expect((await read()).text).toBe(theirs)
  })

  it('lets one of two saves at the same time through', async () => {
    const { version } = await read()
    const saves = await Promise.all(
      ['One', 'Two', 'Three'].map((title) =>
        team.consultant.put(`${team.at}/spec`).send({ text: loopSpec({ title }), baseVersion: version }),
      ),
    )
    expect(saves.map(({ status }) => String(status)).toSorted()).toEqual(['200', '409', '409'])
    expect((await read()).version).toBe(version + 1)
  })

  it('lists everything that is wrong with the body', async () => {
    const res = await team.consultant.put(`${team.at}/spec`).send({ text: 5, baseVersion: -1, force: true }).expect(400)
    const { errors } = res.body as { errors: { pointer: string }[] }
    expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(['', '/baseVersion', '/text'])
  })

  it.each([
    ['broken YAML', 'coldfill: 1\n  project: [\n'],
    ['an empty text', ''],
    ['aliases that would unfold to millions', `a: &a [x, x]\nb: &b [*a, *a]\nc: &c [*b, *b]\nd: [*c, *c]\n`],
  ])('saves %s as it is: a text that cannot be sized is not lost', async (_what, text) => {
    expect(await team.save(text)).toMatchObject({ text })
    expect((await read()).text).toBe(text)
  })

  it('refuses a spec above 256 kB in words, and a body of 5 MB before reading it', async () => {
    const { version, text } = await read()
    const large = await team.consultant
      .put(`${team.at}/spec`)
      .send({ text: '# '.repeat(131_073), baseVersion: version })
      .expect(413)
    expect(large.body).toMatchObject({ code: 'spec_too_large' })
    const huge = await team.consultant
      .put(`${team.at}/spec`)
      .send({ text: 'x'.repeat(5 * 1024 * 1024), baseVersion: version })
      .expect(413)
    expect(huge.body).toMatchObject({ code: 'too_large', type: '/problems/too_large' })
    expect(await read()).toMatchObject({ text, version })
  })

  it('refuses a NUL, which cannot be stored as typed', async () => {
    const { version } = await read()
    const res = await team.consultant.put(`${team.at}/spec`).send({ text: 'a\0b', baseVersion: version }).expect(400)
    expect(res.body).toMatchObject({ errors: [{ pointer: '/text' }] })
  })

  it('takes title and client of the project list from the spec', async () => {
    await team.save(loopSpec({ title: 'Weir House' }))
    const { projects } = (await team.consultant.get('/api/projects').expect(200)).body as { projects: object[] }
    expect(projects).toMatchObject([{ title: 'Weir House', client: 'Mill Yard Trust' }])
  })
})

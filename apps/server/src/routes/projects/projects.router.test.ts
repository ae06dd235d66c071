import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Project, type ProjectList, ProjectList as ProjectListSchema, type SpecDocument } from '@coldfill/contract'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team
let examples: string

beforeAll(async () => {
  examples = mkdtempSync(join(tmpdir(), 'coldfill-examples-'))
  mkdirSync(join(examples, 'mill'))
  writeFileSync(join(examples, 'mill', 'spec.yaml'), loopSpec({ title: 'From the example' }))
  t = await createTestApp({ examplesFolder: examples })
  team = await createTeam(t)
})
afterAll(async () => {
  await t.close()
  rmSync(examples, { recursive: true })
})

describe('GET /api/projects', () => {
  it('lists what a person may know of, in the words of their part', async () => {
    const list = async (agent: Team['consultant']) =>
      ProjectListSchema.parse((await agent.get('/api/projects').expect(200)).body).projects
    expect(await list(team.consultant)).toMatchObject([{ number: 'T-1', state: 'working copy', roles: ['consultant'] }])
    expect(await list(team.reviewer)).toMatchObject([{ number: 'T-1', sheets: ['cover'], waitingOnYou: false }])
    expect(await list(team.contractor)).toMatchObject([{ state: 'not issued', sheets: ['handover'], lastIssue: null }])
    expect(await list(team.administrator)).toMatchObject([{ number: 'T-1', roles: [] }])
    expect(await list(team.stranger)).toEqual([])
  })

  it('says to the reviewer that a review waits on them, and nothing of it to the contractor', async () => {
    const own = await createTeam(t, 'T-30')
    await own.issue()
    const of = async (agent: Team['consultant']) => ((await agent.get('/api/projects')).body as ProjectList).projects[0]
    expect(await of(own.reviewer)).toMatchObject({
      state: 'in review',
      revision: '',
      waitingOnYou: true,
      lastIssue: { revision: '', purpose: 'review' },
    })
    expect(await of(own.consultant)).toMatchObject({ state: 'in review', waitingOnYou: false })
    expect(await of(own.contractor)).toMatchObject({
      state: 'not issued',
      revision: null,
      lastIssue: null,
      openRedlines: 0,
    })
  })
})

describe('GET /api/projects/:project', () => {
  it('holds to the contract', async () => {
    const project = Project.parse((await team.consultant.get(team.at).expect(200)).body)
    expect(project.members.map(({ name, roles, requiredReviewer }) => [name, roles, requiredReviewer])).toEqual([
      ['Mo Tiller', ['contractor'], false],
      ['Otto Vane', ['reviewer'], true],
      ['Runa Sedge', ['consultant'], false],
    ])
    expect(project).toMatchObject({
      workingCopyDiffers: true,
      nextRevision: '',
      nextStep: 'Describe the systems, then issue for review.',
    })
  })

  it('is found however the number is written, and is one and the same', async () => {
    const res = await team.consultant.get('/api/projects/t-1').expect(200)
    expect(res.body).toMatchObject({ number: 'T-1' })
  })

  it('answers an unknown number and a foreign one alike', async () => {
    const unknown = await team.stranger.get('/api/projects/NO-1').expect(404)
    const foreign = await team.stranger.get(team.at).expect(404)
    const plain = (body: object) => ({ ...body, instance: '' })
    expect(plain(foreign.body as object)).toEqual(plain(unknown.body as object))
    expect(foreign.body).toMatchObject({ code: 'not_found', status: 404 })
    await team.consultant.get('/api/projects/%00').expect(404)
  })

  it('says why each thing is not open', async () => {
    const { permissions } = Project.parse((await team.reviewer.get(team.at)).body)
    for (const permission of Object.values(permissions))
      expect(permission.allowed ? permission.why === undefined : (permission.why ?? '').length > 10).toBe(true)
    expect(permissions.redline).toEqual({ allowed: false, why: 'Nothing has been issued for review yet.' })
  })
})

describe('POST /api/projects', () => {
  const post = (body: object) => team.consultant.post('/api/projects').send(body)
  const textOf = async (number: string) =>
    ((await team.consultant.get(`/api/projects/${number}/spec`).expect(200)).body as SpecDocument).text

  it('opens a project from a blank spec that can be read and is sized', async () => {
    const res = await post({ number: 'N-1', title: 'A "quoted" title: with marks', from: 'blank' }).expect(201)
    expect(res.body).toMatchObject({ number: 'N-1', roles: ['consultant'] })
    const results = await team.consultant.get('/api/projects/N-1/results').expect(200)
    const { result } = results.body as {
      result: { findings: { severity: string }[]; vessels: object[]; project: object }
    }
    expect(result.findings.filter(({ severity }) => severity === 'error')).toEqual([])
    expect(result.vessels).toMatchObject([{ mark: 'ET-1', status: 'sized' }])
    expect(result.project).toMatchObject({ number: 'N-1', title: 'A "quoted" title: with marks' })
  })

  it('opens one from an example building, and from a spec of another project', async () => {
    await post({ number: 'N-2', title: 'Two', from: 'example', example: 'mill' }).expect(201)
    expect(await textOf('N-2')).toContain('From the example')
    await post({ number: 'N-3', title: 'Three', from: { copy: 'T-1' } }).expect(201)
    expect(await textOf('N-3')).toBe(await textOf('T-1'))
  })

  it.each(['nowhere', '../mill', 'mill/../mill'])('refuses an example that is none: %s', async (example) => {
    const res = await post({ number: 'N-4', title: 'Four', from: 'example', example }).expect(400)
    expect(res.body).toMatchObject({ errors: [{ pointer: '/example' }] })
  })

  it('refuses a number that the office has, however it is written', async () => {
    const res = await post({ number: 't-1', title: 'Again', from: 'blank' }).expect(409)
    expect(res.body).toMatchObject({ code: 'number_taken' })
  })

  it('copies nothing from a project of another office, or one that is unknown', async () => {
    const other = await createTeam(t, 'T-31')
    await other.consultant.get('/api/projects/T-31').expect(200)
    await post({ number: 'N-5', title: 'Five', from: { copy: 'T-31' } }).expect(404)
  })

  it('lists everything that is wrong with the body', async () => {
    const res = await post({ number: '../x', title: ' ', from: 'nowhere', owner: 'me' }).expect(400)
    const { errors } = res.body as { errors: { pointer: string }[] }
    expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(['', '/from', '/number', '/title'])
  })
})

describe('PUT /api/projects/:project/members/:user', () => {
  it('gives roles and takes them, and the person sees it in the next request', async () => {
    const at = `${team.at}/members/${team.consultantId}`
    const both = await team.administrator
      .put(at)
      .send({ roles: ['consultant', 'reviewer'], requiredReviewer: true })
      .expect(200)
    expect(both.body).toMatchObject({
      members: expect.arrayContaining([
        expect.objectContaining({ name: 'Runa Sedge', requiredReviewer: true }),
      ]) as unknown,
    })
    await team.administrator.put(at).send({ roles: [] }).expect(200)
    await team.consultant.get(team.at).expect(404)
    await team.administrator
      .put(at)
      .send({ roles: ['consultant'] })
      .expect(200)
    await team.consultant.get(team.at).expect(200)
  })

  it('knows nobody of another office, and no id that is none', async () => {
    const other = await createTeam(t, 'T-32')
    await team.administrator
      .put(`${team.at}/members/${other.consultantId}`)
      .send({ roles: ['reviewer'] })
      .expect(404)
    await team.administrator
      .put(`${team.at}/members/me`)
      .send({ roles: ['reviewer'] })
      .expect(404)
    await team.administrator
      .put(`${team.at}/members/${team.consultantId}`)
      .send({ roles: ['owner'] })
      .expect(400)
  })
})

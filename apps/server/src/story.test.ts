import { createHash } from 'node:crypto'
import { strFromU8, unzipSync } from 'fflate'
import type TestAgent from 'supertest/lib/agent.js'
import { afterAll, beforeAll, expect, it } from 'vitest'
import type {
  GateList,
  Handover,
  Outbox,
  Project,
  Redline,
  RedlineList,
  Results,
  Revision,
  SpecDocument,
} from '@coldfill/contract'
import { binaryBody } from './testing/binary-body.ts'
import { loopSpec } from './testing/specs.ts'
import { createTestApp, type TestApp } from './testing/test-app.ts'

/** One project from the first save to the contractor's download, each person in a browser of their own. The steps follow each other. */
let t: TestApp
let consultant: TestAgent
let reviewer: TestAgent
let contractor: TestAgent
let stranger: TestAgent
let admin: TestAgent

const at = '/api/projects/T-1'

const get = async <T>(agent: TestAgent, path: string): Promise<T> => (await agent.get(path).expect(200)).body as T

beforeAll(async () => {
  t = await createTestApp()
  const office = await t.office('Sill & Marrow')
  const other = await t.office('Elsewhere')
  const people = {
    consultant: await t.user(office, { name: 'Runa Sedge' }),
    reviewer: await t.user(office, { name: 'Otto Vane' }),
    contractor: await t.user(office, { name: 'Mo Tiller' }),
    admin: await t.user(office, { name: 'Ada Brook', administrator: true }),
    stranger: await t.user(other, { name: 'Nils Far' }),
  }
  await t.project(office, {
    members: [
      { user: people.consultant, roles: ['consultant'] },
      { user: people.reviewer, roles: ['reviewer'], required: true },
      { user: people.contractor, roles: ['contractor'] },
    ],
  })
  ;[consultant, reviewer, contractor, stranger, admin] = await Promise.all([
    t.signIn(people.consultant.email),
    t.signIn(people.reviewer.email),
    t.signIn(people.contractor.email),
    t.signIn(people.stranger.email),
    t.signIn(people.admin.email),
  ])
})
afterAll(() => t.close())

let firstVolume: number
let first: Revision
let revA: Revision

it('the consultant changes a relief setting and sees the size change', async () => {
  const before = await get<Results>(consultant, `${at}/results`)
  const volume = (results: Results) => results.result.vessels[0]?.results['required-volume']?.value ?? Number.NaN
  const spec = await get<SpecDocument>(consultant, `${at}/spec`)
  const saved = await consultant
    .put(`${at}/spec`)
    .send({ text: loopSpec({ relief: '45 psi' }), baseVersion: spec.version })
    .expect(200)
  expect(saved.body).toMatchObject({ version: spec.version + 1, savedBy: { name: 'Runa Sedge' } })
  const after = await get<Results>(consultant, `${at}/results`)
  firstVolume = volume(after)
  // A higher relief setting lets the vessel take up more water for its size.
  expect(firstVolume).toBeLessThan(volume(before))
})

it('the reviewer and the contractor see nothing of the working copy', async () => {
  await reviewer.get(`${at}/spec`).expect(404)
  await reviewer.get(`${at}/results`).expect(404)
  await contractor.get(at).expect(404)
  expect(await get<Handover>(contractor, `${at}/handover`)).toMatchObject({
    current: null,
    word: 'Nothing has been issued for construction yet.',
  })
})

it('the consultant issues for review: the content is frozen and both files are made', async () => {
  const issued = await consultant
    .post(`${at}/revisions`)
    .send({ purpose: 'review', note: 'Relief at 45 psi' })
    .expect(201)
  expect(issued.body).toMatchObject({ label: '', state: 'in review', files: [], making: { set: 'review', of: 6 } })
  await t.settle()
  first = await get<Revision>(consultant, `${at}/revisions/-`)
  expect(t.errors).toEqual([])
  expect(first.making).toBeNull()
  expect(first.files.map(({ kind, set }) => `${kind} ${set}`).toSorted()).toEqual([
    'schedule review',
    'submittal review',
  ])
  const { mails } = await get<Outbox>(admin, '/api/office/outbox')
  expect(mails).toMatchObject([{ event: 'review asked', to: { name: 'Otto Vane' }, state: 'kept', project: 'T-1' }])
  expect(mails[0]?.text).toContain('http://coldfill.test/p/T-1/schedule?rev=-')
})

it('the reviewer redlines the precharge, which nobody else sees until the review is sent', async () => {
  const redline = await reviewer
    .post(`${at}/redlines`)
    .send({
      anchor: { type: 'cell', mark: 'ET-1', column: 'precharge' },
      text: 'The static height does not reach the penthouse coil.',
      mustAnswer: true,
    })
    .expect(201)
  expect(redline.body).toMatchObject({ number: 1, state: 'pending', anchorState: 'pinned', carriedFrom: null })
  expect((redline.body as Redline).quoted).toMatch(/psig$/)
  expect((await get<RedlineList>(consultant, `${at}/redlines`)).redlines).toEqual([])
  await consultant.get(`${at}/redlines/1`).expect(404)
})

it('the reviewer sets Revise with a reason, and the redline is published with it', async () => {
  const review = { outcome: 'revise', contentHash: first.contentHash }
  const refused = await reviewer.post(`${at}/revisions/-/reviews`).send(review).expect(400)
  expect(refused.body).toMatchObject({ errors: [{ pointer: '/reason' }] })
  const sent = await reviewer
    .post(`${at}/revisions/-/reviews`)
    .send({ ...review, reason: 'The fill pressure is too low for the top of the building.' })
    .expect(201)
  expect(sent.body).toMatchObject({
    state: 'revise',
    dispositions: [{ outcome: 'revise', stale: false, required: true }],
  })
  await t.settle()
  const { redlines } = await get<RedlineList>(consultant, `${at}/redlines`)
  expect(redlines).toMatchObject([{ number: 1, state: 'open', waitingOn: 'consultant', waitingOnYou: true }])
  const { mails } = await get<Outbox>(admin, '/api/office/outbox')
  expect(mails[0]).toMatchObject({ event: 'disposition set', to: { name: 'Runa Sedge' } })
  expect(mails[0]?.text).toContain('too low for the top of the building')
})

it('construction is held, gate by gate', async () => {
  const { gates } = await get<GateList>(consultant, `${at}/gates?for=construction`)
  const states = Object.fromEntries(gates.map(({ id, state }) => [id, state]))
  expect(states).toMatchObject({
    files: 'pass',
    'must-answer': 'overridable',
    'disposition-given': 'pass',
    'disposition-for': 'overridable',
  })
  const refused = await consultant.post(`${at}/revisions/-/construction`).send({}).expect(422)
  expect(refused.body).toMatchObject({ code: 'gates_failed' })
})

it('an issue without a change is refused', async () => {
  const refused = await consultant.post(`${at}/revisions`).send({ purpose: 'review', note: '' }).expect(422)
  expect(refused.body).toMatchObject({ code: 'gates_failed', errors: [{ code: 'changed' }] })
})

it('the consultant answers, mends the spec and issues again as Rev A', async () => {
  const answered = await consultant
    .post(`${at}/redlines/1/replies`)
    .send({ text: 'Right: 32 ft to the coil. Mended.' })
    .expect(201)
  expect(answered.body).toMatchObject({ waitingOn: 'reviewer', waitingOnYou: false })
  const spec = await get<SpecDocument>(consultant, `${at}/spec`)
  await consultant
    .put(`${at}/spec`)
    .send({ text: spec.text.replace('static-height: 20 ft', 'static-height: 32 ft'), baseVersion: spec.version })
    .expect(200)
  await consultant.post(`${at}/revisions`).send({ purpose: 'review', note: 'Static height' }).expect(201)
  await t.settle()
  revA = await get<Revision>(consultant, `${at}/revisions/A`)
  expect(revA.contentHash).not.toBe(first.contentHash)
  // The word of the reviewer on other content is shown, and is stale.
  expect(revA).toMatchObject({
    label: 'A',
    state: 'in review',
    dispositions: [{ outcome: 'revise', stale: true, revision: '' }],
  })
  expect(await get<Revision>(consultant, `${at}/revisions/-`)).toMatchObject({ state: 'superseded' })
})

it('the redline is carried as Moved, with the old value and the new', async () => {
  const { redlines } = await get<RedlineList>(reviewer, `${at}/redlines`)
  expect(redlines).toMatchObject([{ number: 1, anchorState: 'moved', carriedFrom: '', waitingOnYou: true }])
  expect(redlines[0]?.nowValue).not.toBe(redlines[0]?.quoted)
  const frozen = await get<RedlineList>(reviewer, `${at}/redlines?rev=-`)
  expect(frozen.redlines).toMatchObject([{ number: 1, anchorState: 'pinned', carriedFrom: null }])
})

it('a review of the content that was there before is refused as stale', async () => {
  const stale = await reviewer
    .post(`${at}/revisions/-/reviews`)
    .send({ outcome: 'accepted', reason: '', contentHash: first.contentHash })
    .expect(409)
  expect(stale.body).toMatchObject({ code: 'stale_content', current: { revision: 'A', contentHash: revA.contentHash } })
  await reviewer
    .post(`${at}/revisions/A/reviews`)
    .send({ outcome: 'accepted', reason: '', contentHash: first.contentHash })
    .expect(409)
})

it('the reviewer closes the redline and accepts', async () => {
  await reviewer.post(`${at}/redlines/1/close`).send({ comment: 'Seen.' }).expect(200)
  const accepted = await reviewer
    .post(`${at}/revisions/A/reviews`)
    .send({ outcome: 'accepted', contentHash: revA.contentHash })
    .expect(201)
  expect(accepted.body).toMatchObject({ state: 'accepted' })
  expect(await get<Project>(consultant, at)).toMatchObject({
    state: 'accepted',
    nextStep: 'Issue Rev A for construction.',
  })
})

it('the contractor cannot reach the draft, by page or by file', async () => {
  for (const path of ['', '/spec', '/results', '/redlines', '/gates', '/revisions/A', '/revisions/-'])
    await contractor.get(`${at}${path}`).expect(404)
  for (const file of [...revA.files, ...first.files]) await contractor.get(file.href).expect(404)
})

it('the consultant issues for construction: the files are made again with the status, and both sets are kept', async () => {
  await consultant.post(`${at}/revisions/A/construction`).send({}).expect(202)
  await t.settle()
  const issued = await get<Revision>(consultant, `${at}/revisions/A`)
  expect(issued).toMatchObject({
    state: 'issued for construction',
    contentHash: revA.contentHash,
    constructionIssue: { by: { name: 'Runa Sedge' }, override: null },
  })
  expect(issued.files.map(({ set }) => set).toSorted()).toEqual(['construction', 'construction', 'review', 'review'])
  const { mails } = await get<Outbox>(admin, '/api/office/outbox')
  expect(
    mails
      .filter(({ event }) => event === 'issued for construction')
      .map(({ to }) => to.name)
      .toSorted(),
  ).toEqual(['Mo Tiller', 'Otto Vane', 'Runa Sedge'])
})

it('the contractor sees only that, and downloads both files with the sized numbers in them', async () => {
  const handover = await get<Handover>(contractor, `${at}/handover`)
  expect(handover).toMatchObject({
    word: 'Issued for construction',
    superseded: false,
    current: { revision: 'A', settings: [{ mark: 'ET-1', relief: { kind: 'gauge pressure' } }] },
  })
  // 45 psi by the definition of the pound-force per square inch, 6894.757 Pa.
  expect(handover.current?.settings[0]?.relief?.value).toBeCloseTo(45 * 6894.757, 0)
  const frozen = await get<Results>(consultant, `${at}/results?rev=A`)
  const required = frozen.result.vessels[0]?.results['required-volume']?.value ?? Number.NaN
  // One US gallon is 231 cubic inches.
  const gallons = required / (231 * 0.0254 ** 3)
  expect(handover.current?.files).toHaveLength(2)
  for (const file of handover.current?.files ?? []) {
    const res = await contractor.get(file.href).buffer(true).parse(binaryBody).expect(200)
    const bytes = res.body as Buffer
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(file.sha256)
    expect(res.headers['etag']).toBe(`"${file.sha256}"`)
    expect(res.headers['content-disposition']).toBe(`attachment; filename="${file.name}"`)
    const parts = unzipSync(bytes)
    const text = Object.entries(parts)
      .filter(([name]) => name.endsWith('.xml'))
      .map(([, part]) => strFromU8(part))
      .join('\n')
    expect(text).toContain('Issued for construction')
    expect(text).not.toContain('NOT FOR CONSTRUCTION')
    const holdsTheSize =
      file.kind === 'submittal'
        ? text.includes(String(Math.round(gallons)))
        : cachedNumbers(text).some((value) => Math.abs(value / gallons - 1) < 1e-9)
    expect(holdsTheSize).toBe(true)
  }
})

const cachedNumbers = (xml: string): number[] =>
  [...xml.matchAll(/<v>([-\d.eE]+)<\/v>/g)].map(([, text]) => Number(text))

it('the stranger finds nothing at any of these addresses', async () => {
  for (const path of ['', '/spec', '/results', '/handover', '/redlines', '/redlines/1', '/revisions/A', '/gates'])
    await stranger.get(`${at}${path}`).expect(404)
  for (const file of revA.files) await stranger.get(file.href).expect(404)
  expect((await stranger.get('/api/projects').expect(200)).body).toEqual({ projects: [] })
})

it('the next issue for construction supersedes this one', async () => {
  const spec = await get<SpecDocument>(consultant, `${at}/spec`)
  await consultant
    .put(`${at}/spec`)
    .send({ text: spec.text.replace('500 gal', '520 gal'), baseVersion: spec.version })
    .expect(200)
  await consultant.post(`${at}/revisions`).send({ purpose: 'review', note: '' }).expect(201)
  await t.settle()
  // In review only: the contractor still works by Rev A.
  expect(await get<Handover>(contractor, `${at}/handover`)).toMatchObject({ current: { revision: 'A' } })
  const held = await consultant.post(`${at}/revisions/B/construction`).send({}).expect(422)
  expect((held.body as { errors: { code: string }[] }).errors.map(({ code }) => code)).toEqual(['disposition-fresh'])
  await consultant
    .post(`${at}/revisions/B/construction`)
    .send({ override: { reason: 'The reviewer agreed by telephone; the word follows.' } })
    .expect(202)
  await t.settle()
  expect(t.errors).toEqual([])
  expect(await get<Revision>(consultant, `${at}/revisions/A`)).toMatchObject({ state: 'superseded' })
  const revB = await get<Revision>(consultant, `${at}/revisions/B`)
  expect(revB).toMatchObject({
    state: 'issued for construction',
    constructionIssue: { override: { reason: 'The reviewer agreed by telephone; the word follows.' } },
  })
  expect(await get<Handover>(contractor, `${at}/handover?rev=A`)).toMatchObject({
    current: { revision: 'B' },
    superseded: true,
  })
  for (const file of revA.files) await contractor.get(file.href).expect(404)
  const submittal = revB.files.find(({ kind, set }) => kind === 'submittal' && set === 'construction')
  const res = await contractor
    .get(submittal?.href ?? '')
    .buffer(true)
    .parse(binaryBody)
    .expect(200)
  const pages = strFromU8(unzipSync(res.body as Buffer)['word/document.xml'] ?? new Uint8Array())
  expect(pages.replaceAll(/<[^>]+>/g, '')).toContain('The reviewer agreed by telephone; the word follows.')
})

it('a withdrawn issue is no longer there for the contractor', async () => {
  await consultant.post(`${at}/revisions/B/withdraw`).send({ reason: 'Wrong boiler.' }).expect(200)
  const handover = await get<Handover>(contractor, `${at}/handover`)
  expect(handover.current).toBeNull()
  expect(handover.word).toContain('withdrawn')
  await consultant.post(`${at}/revisions/B/withdraw`).send({ reason: 'Again.' }).expect(403)
})

it('the audit trail tells it all, newest first', async () => {
  const { events } = (await admin.get('/api/office/audit').expect(200)).body as { events: { action: string }[] }
  expect(
    events
      .map(({ action }) => action)
      .filter((action) => !action.startsWith('signed in'))
      .toReversed(),
  ).toEqual([
    'spec saved',
    'issued for review',
    'disposition set',
    'redline answered',
    'spec saved',
    'issued for review',
    'redline closed',
    'disposition set',
    'issued for construction',
    'file downloaded',
    'file downloaded',
    'spec saved',
    'issued for review',
    'gates overridden',
    'issued for construction',
    'file downloaded',
    'withdrawn',
  ])
})

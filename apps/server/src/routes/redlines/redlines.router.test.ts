import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Redline, type RedlineList, type Revision } from '@coldfill/contract'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team
let first: Revision
const text = loopSpec({ marks: ['ET-1', 'ET-2'] })

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t, 'T-1', text)
  first = await team.issue()
})
afterAll(() => t.close())

const write = async (anchor: object, more: object = {}, agent = team.reviewer): Promise<Redline> =>
  Redline.parse(
    (
      await agent
        .post(`${team.at}/redlines`)
        .send({ anchor, text: 'Why?', ...more })
        .expect(201)
    ).body,
  )
const list = async (agent: Team['consultant'], query = ''): Promise<Redline[]> =>
  ((await agent.get(`${team.at}/redlines${query}`).expect(200)).body as RedlineList).redlines

describe('a pending redline', () => {
  it('stands on a row, a cell, an assumption or a place of the spec, and quotes what is there', async () => {
    const cell = await write({ type: 'cell', mark: 'ET-1', column: 'precharge' })
    const row = await write({ type: 'row', mark: 'ET-2' })
    const place = await write(
      { type: 'spec', path: 'systems.HWS.pressure.static-height' },
      { mustAnswer: true, proposedValue: '24 ft' },
    )
    const results = await team.reviewer.get(`${team.at}/results`)
    const { assumptions } = (results.body as { result: { assumptions: { id: string; value: string }[] } }).result
    const assumption = await write({ type: 'assumption', assumption: assumptions[0]?.id ?? '' })
    expect(cell.quoted).toMatch(/psig$/)
    expect(row.quoted).toMatch(/gal$/)
    expect(place).toMatchObject({ quoted: '20 ft', nowValue: '20 ft', mustAnswer: true, proposedValue: '24 ft' })
    expect(assumption.quoted).toBe(assumptions[0]?.value)
    expect(new Set([cell, row, place, assumption].map(({ number }) => number)).size).toBe(4)
  })

  it('is changed and deleted by its author, and by nobody else', async () => {
    const { number } = await write({ type: 'row', mark: 'ET-1' })
    const changed = await team.reviewer
      .patch(`${team.at}/redlines/${number}`)
      .send({ text: 'Rather this.', mustAnswer: true })
      .expect(200)
    expect(changed.body).toMatchObject({
      mustAnswer: true,
      messages: [{ text: 'Rather this.' }],
      may: { edit: true, remove: true },
    })
    for (const method of ['get', 'patch', 'delete'] as const)
      await team.consultant[method](`${team.at}/redlines/${number}`).expect(404)
    await team.reviewer.delete(`${team.at}/redlines/${number}`).expect(204)
    await team.reviewer.get(`${team.at}/redlines/${number}`).expect(404)
    const next = await write({ type: 'row', mark: 'ET-1' })
    expect(next.number).toBe(number + 1)
    await team.reviewer.delete(`${team.at}/redlines/${next.number}`).expect(204)
  })

  it('is refused at a place that does not exist, with the places that do', async () => {
    const wrong = async (anchor: object) =>
      (await team.reviewer.post(`${team.at}/redlines`).send({ anchor, text: 'Why?' }).expect(422)).body as {
        code: string
        keys: string[]
      }
    expect(await wrong({ type: 'row', mark: 'ET-9' })).toMatchObject({ code: 'no_such_place', keys: ['ET-1', 'ET-2'] })
    expect((await wrong({ type: 'cell', mark: 'ET-1', column: 'colour' })).keys).toContain('precharge')
    expect((await wrong({ type: 'cell', mark: 'ET-1', column: '__proto__' })).code).toBe('no_such_place')
    expect((await wrong({ type: 'assumption', assumption: 'none' })).keys.length).toBeGreaterThan(0)
    expect((await wrong({ type: 'spec', path: 'systems.XXX' })).code).toBe('no_such_place')
  })

  it('needs words, and lists everything that is wrong with it', async () => {
    const res = await team.reviewer
      .post(`${team.at}/redlines`)
      .send({ anchor: { type: 'cell', mark: '' }, text: ' ' })
      .expect(400)
    const { errors } = res.body as { errors: { pointer: string }[] }
    expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(['/anchor/column', '/anchor/mark', '/text'])
  })

  it('outlives a sign-out, and is seen on another device of its author', async () => {
    const before = await list(team.reviewer)
    expect(before.length).toBeGreaterThan(0)
    const { email } = ((await team.reviewer.get('/api/session')).body as { user: { email: string } }).user
    const elsewhere = await t.signIn(email)
    expect(await list(elsewhere)).toEqual(before)
  })
})

describe('a published redline', () => {
  it('is answered, closed with a comment and reopened; turn and mail follow', async () => {
    await team.review(first, 'information')
    const [redline] = await list(team.consultant)
    const at = `${team.at}/redlines/${redline?.number}`
    expect(redline).toMatchObject({
      state: 'open',
      waitingOn: 'consultant',
      may: { reply: true, close: false, edit: false },
    })

    const answered = await team.consultant.post(`${at}/replies`).send({ text: 'Because of the coil.' }).expect(201)
    expect(answered.body).toMatchObject({ waitingOn: 'reviewer', waitingOnYou: false })
    await team.consultant.post(`${at}/close`).send({}).expect(403)
    await team.reviewer.post(`${at}/replies`).send({ text: ' ' }).expect(400)

    const closed = await team.reviewer.post(`${at}/close`).send({ comment: 'Seen.' }).expect(200)
    expect(closed.body).toMatchObject({ state: 'closed', closedBy: { name: 'Otto Vane' }, waitingOn: null })
    await team.consultant.post(`${at}/replies`).send({ text: 'One more thing.' }).expect(409)
    await team.reviewer.delete(at).expect(409)
    const reopened = await team.reviewer.post(`${at}/reopen`).send({ comment: 'No, wait.' }).expect(200)
    expect(reopened.body).toMatchObject({ state: 'open', closedBy: null })
    expect((reopened.body as Redline).messages.map(({ did }) => did)).toEqual(['wrote', 'wrote', 'closed', 'reopened'])

    await t.settle()
    const { mails } = (await team.administrator.get('/api/office/outbox')).body as {
      mails: { event: string; to: { name: string }; text: string }[]
    }
    const replies = mails.filter(({ event }) => event === 'redline reply').toReversed()
    expect(replies.map(({ to }) => to.name)).toEqual(['Otto Vane', 'Runa Sedge', 'Runa Sedge'])
    expect(replies[0]?.text).toContain(`/p/T-1/redlines?thread=${redline?.number}`)
  })

  it('answers 401 without a session and 404 across offices', async () => {
    await t.anonymous().get(`${team.at}/redlines`).expect(401)
    await team.stranger.get(`${team.at}/redlines`).expect(404)
    await team.stranger.post(`${team.at}/redlines/1/replies`).send({ text: 'Hello.' }).expect(404)
    await team.consultant.get(`${team.at}/redlines/one`).expect(404)
  })
})

describe('in the next revision, a redline', () => {
  it('is Pinned, Moved or Adrift by the frozen results, and none is lost', async () => {
    // ET-2 goes away and the static height changes; the relief valve of ET-1 stays as it is.
    await team.save(loopSpec({ marks: ['ET-1'] }).replace('static-height: 20 ft', 'static-height: 24 ft'))
    await team.issue()
    const carried = await list(team.consultant)
    const state = (anchor: object) =>
      carried.find((redline) =>
        Object.entries(anchor).every(([key, value]) => Reflect.get(redline.anchor, key) === value),
      )
    expect(state({ type: 'cell', mark: 'ET-1', column: 'precharge' })).toMatchObject({
      anchorState: 'moved',
      carriedFrom: '',
    })
    expect(state({ type: 'row', mark: 'ET-2' })).toMatchObject({ anchorState: 'adrift', nowValue: null })
    expect(state({ type: 'row', mark: 'ET-2' })?.quoted).toMatch(/gal$/)
    expect(state({ type: 'spec', path: 'systems.HWS.pressure.static-height' })).toMatchObject({
      anchorState: 'moved',
      quoted: '20 ft',
      nowValue: '24 ft',
    })
    const assumption = carried.find(({ anchor }) => anchor.type === 'assumption')
    expect(assumption).toMatchObject({ anchorState: 'pinned' })
  })

  it('stands on the revision it is closed on and those before, and no longer on later ones', async () => {
    const open = await list(team.reviewer)
    const number = open[0]?.number ?? 0
    await team.reviewer.post(`${team.at}/redlines/${number}/close`).send({}).expect(200)
    const numbers = async (rev?: string) => (await list(team.reviewer, rev)).map((redline) => redline.number)
    expect(await numbers()).toContain(number)
    expect(await numbers('?rev=-')).toContain(number)
    await team.save(loopSpec({ marks: ['ET-1'] }).replace('static-height: 20 ft', 'static-height: 26 ft'))
    await team.issue()
    expect(await numbers()).not.toContain(number)
    expect(await numbers('?rev=A')).toContain(number)
  })
})

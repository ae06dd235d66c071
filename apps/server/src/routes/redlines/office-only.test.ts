import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type GateList, type Outbox, type Project, Redline, type RedlineList } from '@coldfill/contract'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
  await team.consultant.post(`${team.at}/redlines`).send({ officeOnly: true }).expect(403)
  await team.issue()
})
afterAll(() => t.close())

const note = { anchor: { type: 'row', mark: 'ET-1' }, text: 'Fee for this?', mustAnswer: true, officeOnly: true }
const write = (agent: Team['consultant'], body: object = note) => agent.post(`${team.at}/redlines`).send(body)
const numbers = async (agent: Team['consultant']): Promise<number[]> =>
  ((await agent.get(`${team.at}/redlines`).expect(200)).body as RedlineList).redlines.map(({ number }) => number)

describe('a redline for the office only', () => {
  it('is written by a consultant and by nobody else, and is open at once', async () => {
    await write(team.reviewer).expect(403)
    await write(team.administrator).expect(403)
    await write(team.contractor).expect(404)
    await write(team.consultant, { ...note, officeOnly: false }).expect(403)
    const written = Redline.parse((await write(team.consultant).expect(201)).body)
    expect(written).toMatchObject({
      number: 1,
      state: 'open',
      officeOnly: true,
      // An issue does not wait for it.
      mustAnswer: false,
      waitingOn: null,
      may: { edit: false, remove: false, reply: true, close: true },
    })
  })

  it('is there for consultants and the administrator; for a reviewer it does not exist', async () => {
    expect(await numbers(team.consultant)).toEqual([1])
    expect(await numbers(team.administrator)).toEqual([1])
    expect(await numbers(team.reviewer)).toEqual([])
    await team.reviewer.get(`${team.at}/redlines/1`).expect(404)
    await team.reviewer.post(`${team.at}/redlines/1/replies`).send({ text: 'I see you.' }).expect(404)
    for (const act of ['close', 'reopen']) await team.reviewer.post(`${team.at}/redlines/1/${act}`).send({}).expect(404)
    await team.reviewer.delete(`${team.at}/redlines/1`).expect(404)
    await team.administrator.post(`${team.at}/redlines/1/replies`).send({ text: 'A word.' }).expect(403)
  })

  it('is counted nowhere, holds no gate and tells no reviewer by mail', async () => {
    await team.consultant.post(`${team.at}/redlines/1/replies`).send({ text: 'Settled.' }).expect(201)
    await t.settle()
    for (const agent of [team.consultant, team.reviewer])
      expect(((await agent.get(team.at).expect(200)).body as Project).openRedlines).toBe(0)
    const { gates } = (await team.consultant.get(`${team.at}/gates?for=construction`).expect(200)).body as GateList
    expect(gates.find(({ id }) => id === 'must-answer')?.state).toBe('pass')
    const { mails } = (await team.administrator.get('/api/office/outbox').expect(200)).body as Outbox
    expect(mails.filter(({ to }) => to.name === 'Otto Vane').map(({ event }) => event)).toEqual(['review asked'])
  })

  it('is closed and opened again by a consultant', async () => {
    await team.consultant.post(`${team.at}/redlines/1/close`).send({}).expect(200)
    await team.consultant.post(`${team.at}/redlines/1/reopen`).send({}).expect(200)
  })
})

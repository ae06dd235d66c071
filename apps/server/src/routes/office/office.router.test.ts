import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AuditTrail, Outbox, People } from '@coldfill/contract'
import type { Carrier } from '../../mail/postman.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team
const carried: Parameters<Carrier>[0][] = []
let broken = true

beforeAll(async () => {
  t = await createTestApp({
    carrier: (mail) => {
      if (broken) return Promise.reject(new Error('connection refused'))
      carried.push(mail)
      return Promise.resolve()
    },
  })
  team = await createTeam(t)
  await team.issue()
})
afterAll(() => t.close())

const outbox = async () => Outbox.parse((await team.administrator.get('/api/office/outbox').expect(200)).body).mails

describe('the outbox', () => {
  it('keeps a mail that could not be sent, with the reason, and sends it when asked', async () => {
    const [mail] = await outbox()
    expect(mail).toMatchObject({
      state: 'queued',
      attempts: 1,
      problem: 'connection refused',
      to: { name: 'Otto Vane' },
    })
    broken = false
    const res = await team.administrator.post(`/api/office/outbox/${mail?.id}/resend`).send({}).expect(200)
    expect(res.body).toMatchObject({ state: 'sent', problem: null })
    expect(carried).toMatchObject([{ toName: 'Otto Vane', subject: 'T-1 First issue – your review is asked for' }])
  })

  it('shows and sends nothing of another office', async () => {
    const [mail] = await outbox()
    expect((await team.stranger.get('/api/office/outbox').expect(200)).body).toEqual({ mails: [] })
    await team.stranger.post(`/api/office/outbox/${mail?.id}/resend`).send({}).expect(404)
    await team.administrator.post('/api/office/outbox/none/resend').send({}).expect(404)
  })

  it('says in text and in HTML what is to be done, with a link', async () => {
    const [mail] = await outbox()
    expect(mail?.text.startsWith('Please review First issue of Mill Yard')).toBe(true)
    expect(mail?.text).toContain('http://coldfill.test/p/T-1/schedule?rev=-')
    expect(mail?.html).toContain('<a href="http://coldfill.test/p/T-1/schedule?rev=-">')
  })
})

describe('people and audit trail', () => {
  it('are the office’s own', async () => {
    const { people } = People.parse((await team.administrator.get('/api/office/people').expect(200)).body)
    expect(people.map(({ name }) => name)).toEqual(['Runa Sedge', 'Otto Vane', 'Mo Tiller', 'Ada Brook'])
    expect(people[1]).toMatchObject({ projects: [{ number: 'T-1', roles: ['reviewer'], requiredReviewer: true }] })
    const { events } = AuditTrail.parse((await team.administrator.get('/api/office/audit').expect(200)).body)
    expect(events.map(({ who, action }) => `${who}: ${action}`)).toContain('Runa Sedge: issued for review')
    const foreign = AuditTrail.parse((await team.stranger.get('/api/office/audit').expect(200)).body)
    expect(foreign.events.map(({ who }) => who)).toEqual(['Nils Far'])
  })

  it('hold no password, and answer 404 to all but the administrator', async () => {
    expect(JSON.stringify((await team.administrator.get('/api/office/people')).body)).not.toMatch(/argon2|password/i)
    for (const path of ['outbox', 'people', 'audit']) {
      await team.consultant.get(`/api/office/${path}`).expect(404)
      await t.anonymous().get(`/api/office/${path}`).expect(401)
    }
  })
})

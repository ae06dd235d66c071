import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { eq } from 'drizzle-orm'
import { sessions, users } from '../../db/schema/index.ts'
import { ABSOLUTE_MS, IDLE_MS } from '../../sign-in/sessions.ts'
import { PASSWORD } from '../../testing/factories.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let office: Awaited<ReturnType<TestApp['office']>>

beforeAll(async () => {
  t = await createTestApp()
  office = await t.office('Sill & Marrow')
})
afterAll(() => t.close())

describe('POST /api/session', () => {
  it('signs a person in and says who they are', async () => {
    const user = await t.user(office, { name: 'Runa Sedge' })
    const res = await t.anonymous().post('/api/session').send({ email: user.email.toUpperCase(), password: PASSWORD })
    expect(res.status).toBe(200)
    expect(res.body).toMatchObject({
      user: { name: 'Runa Sedge', initials: 'RS', office: { name: 'Sill & Marrow' }, administrator: false },
    })
    const cookie = String(res.headers['set-cookie'])
    expect(cookie).toMatch(/HttpOnly/)
    expect(cookie).toMatch(/SameSite=Lax/)
    expect(cookie).not.toMatch(/Secure/)
  })

  it('gives the cookie to https alone where the request came by https', async () => {
    const behindProxy = await createTestApp({ trustProxy: 1 })
    try {
      const user = await behindProxy.user(await behindProxy.office())
      const res = await behindProxy
        .anonymous()
        .post('/api/session')
        .set('X-Forwarded-Proto', 'https')
        .send({ email: user.email, password: PASSWORD })
      expect(String(res.headers['set-cookie'])).toMatch(/Secure/)
    } finally {
      await behindProxy.close()
    }
  })

  it('answers the same for a wrong password, an unknown person and one who is switched off', async () => {
    const user = await t.user(office)
    const off = await t.user(office, { active: false })
    const bodies = []
    for (const [email, password] of [
      [user.email, 'wrong'],
      ['nobody@test.example', PASSWORD],
      [off.email, PASSWORD],
    ]) {
      const res = await t.anonymous().post('/api/session').send({ email, password })
      expect(res.status).toBe(401)
      expect(res.headers['content-type']).toMatch('application/problem+json')
      bodies.push({ ...(res.body as object), instance: '' })
    }
    expect(bodies[1]).toEqual(bodies[0])
    expect(bodies[2]).toEqual(bodies[0])
    expect(bodies[0]).toMatchObject({ code: 'wrong_credentials', type: '/problems/wrong_credentials' })
  })

  it('lists everything that is wrong with the body', async () => {
    const res = await t.anonymous().post('/api/session').send({ email: 'no address', password: '', remember: true })
    expect(res.status).toBe(400)
    const { errors } = res.body as { errors: { pointer: string }[] }
    expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(['', '/email', '/password'])
  })

  it('shuts an account after ten failures, from whatever browser, and opens no other', async () => {
    const user = await t.user(office)
    const other = await t.user(office)
    for (let attempt = 0; attempt < 10; attempt++)
      await t.anonymous().post('/api/session').send({ email: user.email, password: 'guess' }).expect(401)
    const res = await t.anonymous().post('/api/session').send({ email: user.email, password: PASSWORD })
    expect(res.status).toBe(429)
    expect(res.body).toMatchObject({ code: 'too_many_attempts', retryable: true })
    await t.anonymous().post('/api/session').send({ email: other.email, password: PASSWORD }).expect(200)
  })
})

describe('GET /api/session', () => {
  it('answers 401 without a session and with a forged one', async () => {
    await t.anonymous().get('/api/session').expect(401)
    const forged = 'eyJhbGciOiJub25lIn0.eyJqdGkiOiJ4In0.'
    await t.anonymous().get('/api/session').set('Cookie', `coldfill_session=${forged}`).expect(401)
  })

  it('ends a session that has been idle for an hour, but not one in use', async () => {
    const user = await t.user(office)
    const agent = await t.signIn(user.email)
    t.pass(IDLE_MS / 2)
    await agent.get('/api/session').expect(200)
    t.pass(IDLE_MS / 2 + 1000)
    await agent.get('/api/session').expect(200)
    t.pass(IDLE_MS + 1000)
    await agent.get('/api/session').expect(401)
  })

  it('ends a session a day after sign-in, in use or not', async () => {
    const user = await t.user(office)
    const agent = await t.signIn(user.email)
    for (let passed = 0; passed < ABSOLUTE_MS - IDLE_MS; passed += IDLE_MS / 2) {
      t.pass(IDLE_MS / 2)
      await agent.get('/api/session').expect(200)
    }
    t.pass(IDLE_MS - 60_000)
    await agent.get('/api/session')
    t.pass(2 * 60_000)
    await agent.get('/api/session').expect(401)
  })

  it('is over for one who is switched off, from the next request on', async () => {
    const user = await t.user(office)
    const agent = await t.signIn(user.email)
    await agent.get('/api/session').expect(200)
    await t.deps.db.update(users).set({ active: false }).where(eq(users.id, user.id))
    await agent.get('/api/session').expect(401)
  })
})

describe('DELETE /api/session', () => {
  it('ends the session on the server: a cookie kept aside opens nothing', async () => {
    const user = await t.user(office)
    const res = await t.anonymous().post('/api/session').send({ email: user.email, password: PASSWORD })
    const cookie = String(res.headers['set-cookie']).split(';')[0] ?? ''
    const withCookie = () => t.anonymous().get('/api/session').set('Cookie', cookie)
    await withCookie().expect(200)
    await t.anonymous().delete('/api/session').set('Cookie', cookie).expect(204)
    await withCookie().expect(401)
  })

  it('leaves the other sessions of the person alone', async () => {
    const user = await t.user(office)
    const [one, two] = [await t.signIn(user.email), await t.signIn(user.email)]
    await one.delete('/api/session').expect(204)
    await two.get('/api/session').expect(200)
  })

  it('answers 401 without a session', async () => {
    await t.anonymous().delete('/api/session').expect(401)
  })
})

describe('the sessions table', () => {
  it('holds no token by which a session could be opened', async () => {
    const user = await t.user(office)
    const res = await t.anonymous().post('/api/session').send({ email: user.email, password: PASSWORD })
    const token = /coldfill_session=([^;]+)/.exec(String(res.headers['set-cookie']))?.[1] ?? ''
    const [, payload = ''] = token.split('.')
    const { jti } = JSON.parse(Buffer.from(payload, 'base64url').toString()) as { jti: string }
    const rows = await t.deps.db.select().from(sessions).where(eq(sessions.userId, user.id))
    expect(rows).toHaveLength(1)
    expect(JSON.stringify(rows)).not.toContain(jti)
  })
})

import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Problem } from '@coldfill/contract'
import { PASSWORD } from './testing/factories.ts'
import { createTestApp, type TestApp } from './testing/test-app.ts'

let t: TestApp
let web: string
let email: string

beforeAll(async () => {
  web = mkdtempSync(join(tmpdir(), 'coldfill-web-'))
  mkdirSync(join(web, 'assets'))
  writeFileSync(join(web, 'index.html'), '<!doctype html><meta name="csp-nonce" content="__CSP_NONCE__">')
  writeFileSync(join(web, 'assets', 'main-1.js'), 'void 0')
  t = await createTestApp({ webFolder: web })
  ;({ email } = await t.user(await t.office()))
})
afterAll(async () => {
  await t.close()
  rmSync(web, { recursive: true })
})

describe('a write', () => {
  const signIn = () => request(t.app).post('/api/session')
  const credentials = () => ({ email, password: PASSWORD })

  it('is refused without the header that another site cannot send', async () => {
    const res = await signIn().send(credentials()).expect(403)
    expect(res.body).toMatchObject({ code: 'cross_site_request' })
  })

  it('is refused from another origin or another site', async () => {
    const from = (headers: Record<string, string>) =>
      signIn()
        .set({ 'X-Requested-With': 'coldfill', ...headers })
        .send(credentials())
    await from({ Origin: 'https://evil.example' }).expect(403)
    await from({ Origin: 'null' }).expect(403)
    await from({ 'Sec-Fetch-Site': 'cross-site' }).expect(403)
    await from({ Host: 'coldfill.test', Origin: 'http://coldfill.test', 'Sec-Fetch-Site': 'same-origin' }).expect(200)
  })

  it('is refused as a form', async () => {
    const res = await signIn().set('X-Requested-With', 'coldfill').type('form').send(credentials()).expect(415)
    expect(res.body).toMatchObject({ code: 'unsupported_type' })
  })
})

describe('every error', () => {
  const problemOf = (res: request.Response): Problem => {
    expect(res.headers['content-type']).toBe('application/problem+json; charset=utf-8')
    const problem = Problem.parse(res.body)
    expect(problem).toMatchObject({ status: res.status, instance: `urn:uuid:${res.headers['x-request-id'] as string}` })
    expect(JSON.stringify(problem)).not.toMatch(/node_modules|\.ts:|select |at Object/i)
    return problem
  }

  it('is a problem that names its request', async () => {
    const anonymous = t.anonymous()
    const agent = await t.signIn(email)
    expect(problemOf(await anonymous.get('/api/projects').expect(401)).code).toBe('not_signed_in')
    expect(problemOf(await agent.get('/api/nothing').expect(404)).code).toBe('not_found')
    expect(problemOf(await agent.delete('/api/projects').expect(404)).code).toBe('not_found')
    expect(problemOf(await agent.get('/api/projects/%E0%A4%A').expect(400)).code).toBe('bad_request')
    const bad = agent.post('/api/projects').type('json')
    expect(problemOf(await bad.send('{"number": ').expect(400)).code).toBe('bad_request')
    expect(problemOf(await agent.post('/api/projects').type('json').send('null').expect(400)).code).toBe('bad_request')
    const large = agent.post('/api/projects').type('json')
    expect(problemOf(await large.send(`"${'x'.repeat(2_000_000)}"`).expect(413)).code).toBe('too_large')
    expect(
      problemOf(
        await anonymous
          .post('/api/session')
          .type('json')
          .send(`{"a":"${'x'.repeat(9000)}"}`)
          .expect(413),
      ).code,
    ).toBe('too_large')
  })
})

describe('the web app', () => {
  it('is answered at each of its addresses, with the nonce of that answer', async () => {
    const nonces = new Set<string>()
    for (const path of ['/', '/p/FC-241/schedule?rev=A', '/d/FC-241', '/in']) {
      const res = await request(t.app).get(path).set('Accept', 'text/html').expect(200)
      const nonce = /content="([^"]+)"/.exec(res.text)?.[1] ?? ''
      expect(res.headers['content-security-policy']).toContain(`'nonce-${nonce}'`)
      expect(res.headers['cache-control']).toBe('no-store')
      nonces.add(nonce)
    }
    expect(nonces.size).toBe(4)
    expect(nonces).not.toContain('__CSP_NONCE__')
  })

  it('has its assets kept for ever and a missing one is missing', async () => {
    const res = await request(t.app).get('/assets/main-1.js').expect(200)
    expect(res.headers['cache-control']).toContain('immutable')
    await request(t.app).get('/assets/gone.js').set('Accept', '*/*').expect(404)
    await request(t.app)
      .get('/index.html')
      .set('Accept', 'text/html')
      .expect(200)
      .expect(/content="[^_]/)
  })

  it('allows nothing from elsewhere', async () => {
    const { headers } = await request(t.app).get('/')
    const policy = String(headers['content-security-policy'])
    for (const part of ["default-src 'self'", "object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'"])
      expect(policy).toContain(part)
    expect(policy).not.toMatch(/unsafe|upgrade-insecure|https:/)
    expect(headers['x-content-type-options']).toBe('nosniff')
    expect(headers['x-powered-by']).toBeUndefined()
  })
})

it('says that it is well', async () => {
  const res = await request(t.app).get('/api/health').expect(200)
  expect(res.body).toMatchObject({ ok: true })
})

import { readdirSync, readFileSync } from 'node:fs'
import type TestAgent from 'supertest/lib/agent.js'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Revision } from '@coldfill/contract'
import { createTestApp, type TestApp } from '../testing/test-app.ts'

type Who = 'anonymous' | 'stranger' | 'contractor' | 'reviewer' | 'consultant' | 'administrator' | 'bystander'
/** Status for those who may not; `in` for those who may: anything that is not 401, 403 or 404. */
type Expected = 'in' | 401 | 403 | 404

interface Row {
  /** File and route as written there. A route without a row fails the last test. */
  readonly route: string
  readonly path: string
  /** Left out: nobody's body can be right, so that one who may is told what is wrong with it. */
  readonly contractor: Expected
  readonly reviewer: Expected
  readonly consultant: Expected
  readonly administrator: Expected
  /** A person of the office who is no member. */
  readonly bystander?: Expected
}

const row = (route: string, path: string, ...[contractor, reviewer, consultant, administrator]: Expected[]): Row => ({
  route,
  path,
  contractor: contractor ?? 404,
  reviewer: reviewer ?? 404,
  consultant: consultant ?? 404,
  administrator: administrator ?? 404,
})

const everybody = (route: string, path: string): Row => ({
  ...row(route, path, 'in', 'in', 'in', 'in'),
  bystander: 'in',
})

/** The table of product permissions, route by route, for a project whose first issue is in review. */
const MATRIX: readonly Row[] = [
  everybody('session get /', '/session'),
  everybody('reference get /', '/reference'),
  everybody('verification get /', '/verification'),
  everybody('projects get /', '/projects'),
  { ...row('projects post /', '/projects', 403, 403, 'in', 'in'), bystander: 403 },
  row('projects get /:project', '/projects/T-1', 404, 'in', 'in', 'in'),
  row('projects put /:project/members/:user', '/projects/T-1/members/BYSTANDER', 404, 403, 403, 'in'),
  row('spec get /', '/projects/T-1/spec', 404, 'in', 'in', 'in'),
  row('spec put /', '/projects/T-1/spec', 404, 403, 'in', 403),
  row('sizing post /', '/projects/T-1/sizing', 404, 403, 'in', 403),
  row('results get /', '/projects/T-1/results', 404, 'in', 'in', 'in'),
  row('gates get /', '/projects/T-1/gates?for=construction', 404, 'in', 'in', 'in'),
  row('gates get /', '/projects/T-1/gates?for=review', 404, 403, 'in', 'in'),
  row('redlines get /', '/projects/T-1/redlines', 404, 'in', 'in', 'in'),
  // A consultant writes for the office only; that a redline for all is not theirs to write: redlines.router.test.ts.
  row('redlines post /', '/projects/T-1/redlines', 404, 'in', 'in', 403),
  row('redlines get /:number', '/projects/T-1/redlines/1', 404, 'in', 'in', 'in'),
  // Redline 1 is published: nobody may change or delete it, and its author is told why.
  row('redlines patch /:number', '/projects/T-1/redlines/1', 404, 'in', 403, 403),
  row('redlines delete /:number', '/projects/T-1/redlines/1', 404, 'in', 403, 403),
  row('redlines post /:number/replies', '/projects/T-1/redlines/1/replies', 404, 'in', 'in', 403),
  row('redlines post /:number/close', '/projects/T-1/redlines/1/close', 404, 'in', 403, 403),
  row('redlines post /:number/reopen', '/projects/T-1/redlines/1/reopen', 404, 'in', 403, 403),
  row('revisions post /', '/projects/T-1/revisions', 404, 403, 'in', 403),
  row('revisions get /:rev', '/projects/T-1/revisions/-', 404, 'in', 'in', 'in'),
  row('revisions post /:rev/files', '/projects/T-1/revisions/-/files', 404, 403, 'in', 403),
  row('revisions post /:rev/reviews', '/projects/T-1/revisions/-/reviews', 404, 'in', 403, 403),
  row('revisions post /:rev/construction', '/projects/T-1/revisions/-/construction', 404, 403, 'in', 403),
  row('revisions post /:rev/withdraw', '/projects/T-1/revisions/-/withdraw', 404, 403, 'in', 'in'),
  row('revisions get /:rev/files/:name', '/projects/T-1/revisions/-/files/FILE', 404, 'in', 'in', 'in'),
  // Before the row that asks for another, which takes its place.
  row('review-copy get /:rev/review-copy/file', '/projects/T-1/revisions/-/review-copy/file', 404, 'in', 'in', 'in'),
  row('review-copy get /:rev/review-copy', '/projects/T-1/revisions/-/review-copy', 404, 'in', 'in', 'in'),
  row('review-copy post /:rev/review-copy', '/projects/T-1/revisions/-/review-copy', 404, 'in', 'in', 'in'),
  row('handover get /', '/projects/T-1/handover', 'in', 'in', 'in', 'in'),
  row('office get /outbox', '/office/outbox', 404, 404, 404, 'in'),
  row('office post /outbox/:id/resend', '/office/outbox/MAIL/resend', 404, 404, 404, 'in'),
  row('office get /people', '/office/people', 404, 404, 404, 'in'),
  row('office get /audit', '/office/audit', 404, 404, 404, 'in'),
  row('catalogue get /', '/office/catalogue', 404, 404, 404, 'in'),
  row('catalogue get /example', '/office/catalogue/example', 404, 404, 404, 'in'),
  row('title-block get /', '/office/title-block', 404, 404, 404, 'in'),
  row('title-block put /', '/office/title-block', 404, 404, 404, 'in'),
  row('title-block put /logo', '/office/title-block/logo', 404, 404, 404, 'in'),
  row('catalogue put /', '/office/catalogue', 404, 404, 404, 'in'),
]
/** Open to all, or tested by itself because it ends the session of whoever asks, or because there is nothing to take away here. */
const ELSEWHERE = new Set([
  'catalogue delete /',
  // There is no logo here to look at or to take away: title-block.router.test.ts.
  'title-block get /logo',
  'title-block delete /logo',
  'health get /',
  'session post /',
  'session delete /',
  'reference get /coldfill-1.json',
])

/** Bodies that are right in form, for routes that would otherwise answer 400 before a rule of the single redline is reached. */
const BODIES: Readonly<Record<string, object>> = {
  'redlines patch /:number': { text: 'Another.' },
  'redlines post /:number/replies': { text: 'A word.' },
  'redlines post /:number/close': {},
  'redlines post /:number/reopen': {},
  'projects put /:project/members/:user': { roles: [] },
}

let t: TestApp
let agents: Record<Who, TestAgent>
let file = ''
let mail = ''
let bystander = ''

beforeAll(async () => {
  t = await createTestApp()
  const office = await t.office()
  const elsewhere = await t.office()
  const users = {
    contractor: await t.user(office),
    reviewer: await t.user(office),
    consultant: await t.user(office, { mayCreateProjects: true }),
    administrator: await t.user(office, { administrator: true }),
    bystander: await t.user(office),
    stranger: await t.user(elsewhere, { administrator: true }),
  }
  await t.project(office, {
    members: [
      { user: users.consultant, roles: ['consultant'] },
      { user: users.reviewer, roles: ['reviewer'], required: true },
      { user: users.contractor, roles: ['contractor'] },
    ],
  })
  // A project of the same number in another office: its people must not land here.
  await t.project(elsewhere, { members: [{ user: users.stranger, roles: ['consultant'] }], number: 'T-2' })
  bystander = users.bystander.id
  const entries = await Promise.all(
    Object.entries(users).map(async ([who, { email }]) => [who, await t.signIn(email)] as const),
  )
  agents = { ...Object.fromEntries(entries), anonymous: t.anonymous() } as Record<Who, TestAgent>
  await agents.consultant.post('/api/projects/T-1/revisions').send({ purpose: 'review' }).expect(201)
  await t.settle()
  const revision = (await agents.reviewer.get('/api/projects/T-1/revisions/-').expect(200)).body as Revision
  file = revision.files[0]?.name ?? ''
  await agents.reviewer
    .post('/api/projects/T-1/redlines')
    .send({ anchor: { type: 'row', mark: 'ET-1' }, text: 'Why this one?' })
    .expect(201)
  await agents.reviewer
    .post('/api/projects/T-1/revisions/-/reviews')
    .send({ outcome: 'information', contentHash: revision.contentHash })
    .expect(201)
  await t.settle()
  await agents.reviewer.post('/api/projects/T-1/revisions/-/review-copy').expect(202)
  await t.settle()
  const outbox = await agents.administrator.get('/api/office/outbox').expect(200)
  mail = (outbox.body as { mails: { id: string }[] }).mails[0]?.id ?? ''
})
afterAll(() => t.close())

const ask = async ({ route, path }: Row, who: Who): Promise<number> => {
  const method = route.split(' ')[1] as 'get' | 'post' | 'put' | 'patch' | 'delete'
  const address = `/api${path.replace('FILE', file).replace('MAIL', mail).replace('BYSTANDER', bystander)}`
  const asked = agents[who][method](address)
  return (method === 'get' ? await asked : await asked.send(BODIES[route] ?? { unknown: true })).status
}

const NOT_IN = new Set([401, 403, 404])

describe.each(MATRIX)('$route at $path', (line) => {
  const expected: Record<Who, Expected> = {
    anonymous: 401,
    stranger: line.bystander === 'in' || line.path === '/projects' ? 'in' : 404,
    bystander: line.bystander ?? 404,
    contractor: line.contractor,
    reviewer: line.reviewer,
    consultant: line.consultant,
    administrator: line.administrator,
  }
  // The other office's administrator has an office of their own.
  if (line.path.startsWith('/office/') && !line.path.includes('MAIL')) expected.stranger = 'in'
  it.each(Object.entries(expected))('%s: %s', async (who, status) => {
    const got = await ask(line, who as Who)
    // Being let in shows in any answer but these; a fault of the server is never one.
    expect(NOT_IN.has(got) || got >= 500 ? got : 'in').toBe(status)
  })
})

it('has a row for every route', () => {
  const written = new Set<string>()
  const here = new URL('.', import.meta.url)
  for (const resource of readdirSync(here, { withFileTypes: true })) {
    if (!resource.isDirectory()) continue
    for (const name of readdirSync(new URL(`${resource.name}/`, here))) {
      if (!name.endsWith('.router.ts')) continue
      const source = readFileSync(new URL(`${resource.name}/${name}`, here), 'utf8')
      const routes = source.matchAll(/\.(get|post|put|patch|delete)(?:<[^(]*>)?\(\s*'([^']+)'/g)
      for (const [, method, path] of routes) written.add(`${name.replace('.router.ts', '')} ${method} ${path}`)
    }
  }
  const known = new Set([...MATRIX.map(({ route }) => route), ...ELSEWHERE])
  expect([...written].filter((route) => !known.has(route))).toEqual([])
  expect([...known].filter((route) => !written.has(route))).toEqual([])
})

import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import request from 'supertest'
import { afterAll, afterEach, beforeAll, expect, it, vi } from 'vitest'
import type { Revision } from '@coldfill/contract'
import { DEMO_PASSWORD } from './demo/demo-people.ts'

// Each start loads the whole program and opens a database, which a machine under load takes its time for.
vi.setConfig({ testTimeout: 240_000 })

/** The program itself, started as its users start it. The steps follow each other on one data folder. */
let folder: string
const running: ChildProcess[] = []

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-start-'))
})
afterEach(async () => {
  for (const child of running.splice(0))
    if (child.exitCode === null && child.signalCode === null) {
      child.kill('SIGKILL')
      await once(child, 'exit')
    }
})
afterAll(() => rmSync(folder, { recursive: true, force: true }))

const start = (port = '0'): ChildProcess => {
  const child = spawn(process.execPath, ['--import', 'tsx', fileURLToPath(new URL('./main.ts', import.meta.url))], {
    env: { ...process.env, PORT: port, COLDFILL_DATA: folder, SMTP_URL: '' },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  running.push(child)
  return child
}

/** Waits for a line and gives all that was said until then. */
const said = async (child: ChildProcess, what: RegExp): Promise<string> => {
  let text = ''
  for (const stream of [child.stdout, child.stderr])
    stream?.on('data', (chunk: Buffer) => {
      text += String(chunk)
    })
  while (!what.test(text)) {
    if (child.exitCode !== null) throw new Error(`It ended with ${child.exitCode}: ${text}`)
    await new Promise((resolve) => setTimeout(resolve, 50))
  }
  return text
}

const addressIn = (text: string): string => /http:\/\/localhost:\d+/.exec(text)?.[0] ?? ''

const signedIn = async (address: string) => {
  const agent = request.agent(address).set('X-Requested-With', 'coldfill')
  await agent.post('/api/session').send({ email: 'consultant@demo.example', password: DEMO_PASSWORD }).expect(200)
  return agent
}

it('puts the demo offices in on the first start, and finishes after a kill what it had begun', async () => {
  const first = start()
  const text = await said(first, /Ctrl\+C/)
  expect(text).toContain(`password of all: ${DEMO_PASSWORD}`)
  const consultant = await signedIn(addressIn(text))
  const { projects } = (await consultant.get('/api/projects').expect(200)).body as { projects: { number: string }[] }
  expect(projects.map(({ number }) => number)).toEqual(['FC-241', 'AC-118'])
  await consultant.post('/api/projects/FC-241/revisions').send({ purpose: 'review' }).expect(201)
  first.kill('SIGKILL')
  await once(first, 'exit')

  const second = start()
  const again = await signedIn(addressIn(await said(second, /Ctrl\+C/)))
  let revision: Revision
  do {
    await new Promise((resolve) => setTimeout(resolve, 200))
    revision = (await again.get('/api/projects/FC-241/revisions/-').expect(200)).body as Revision
  } while (revision.making && revision.making.problem === null)
  expect(revision.files.map(({ kind }) => kind)).toEqual(['schedule', 'submittal'])
})

it('refuses a second process on the folder, which stays open to the first', async () => {
  const first = start()
  const address = addressIn(await said(first, /Ctrl\+C/))
  const second = start()
  const refusal = said(second, /COLDFILL_DATA/)
  expect((await once(second, 'exit'))[0]).toBe(75)
  expect(await refusal.catch((error: unknown) => String(error))).toContain('in use by another Coldfill')
  await request(address).get('/api/health').expect(200)

  // As a terminal and npm send it: twice.
  const ended = once(first, 'exit')
  first.kill('SIGINT')
  first.kill('SIGINT')
  expect((await ended)[0]).toBe(0)
  expect(existsSync(join(folder, 'lock.json'))).toBe(false)
})

it('says that the port is taken, and lets the folder go', async () => {
  const first = start()
  const address = addressIn(await said(first, /Ctrl\+C/))
  const elsewhere = mkdtempSync(join(tmpdir(), 'coldfill-start-'))
  const second = spawn(process.execPath, ['--import', 'tsx', fileURLToPath(new URL('./main.ts', import.meta.url))], {
    env: { ...process.env, PORT: new URL(address).port, COLDFILL_DATA: elsewhere },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  running.push(second)
  let text = ''
  second.stderr.on('data', (chunk: Buffer) => {
    text += String(chunk)
  })
  expect((await once(second, 'exit'))[0]).toBe(69)
  expect(text).toContain('Choose another port')
  expect(existsSync(join(elsewhere, 'lock.json'))).toBe(false)
  rmSync(elsewhere, { recursive: true })
})

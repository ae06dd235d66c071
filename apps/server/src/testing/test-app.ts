import type { Express } from 'express'
import request from 'supertest'
import type TestAgent from 'supertest/lib/agent.js'
import { createApp } from '../app.ts'
import { closeDeps, createDeps, type Settings } from '../create-deps.ts'
import { databaseOver } from '../db/client.ts'
import type { Deps } from '../deps.ts'
import { createPasswords } from '../sign-in/passwords.ts'
import { createFactories, type Factories, PASSWORD } from './factories.ts'
import { migratedDatabase } from './migrated-template.ts'

export interface TestApp extends Factories {
  readonly app: Express
  readonly deps: Deps
  /** What was logged as an error. */
  readonly errors: string[]
  /** Moves the clock on. */
  pass(milliseconds: number): void
  /** A browser without a session, which sends what the web app sends. */
  anonymous(): TestAgent
  /** A browser that is signed in. */
  signIn(email: string, password?: string): Promise<TestAgent>
  /** Waits for files that are being made and for mail. */
  settle(): Promise<void>
  close(): Promise<void>
}

/** Hashing that takes no time. The cost of the real one is looked at in its own test. */
const quickPasswords = () => createPasswords({ memoryCost: 8, timeCost: 1, parallelism: 1 })

/** The whole application on a database in memory, with a clock of its own. */
export const createTestApp = async (
  settings: Partial<
    Pick<Settings, 'sizing' | 'carrier' | 'webFolder' | 'examplesFolder' | 'passwords' | 'trustProxy' | 'office'>
  > = {},
): Promise<TestApp> => {
  const client = await migratedDatabase()
  let now = new Date('2026-03-02T09:00:00Z').getTime()
  const errors: string[] = []
  const deps = createDeps({
    db: databaseOver(client),
    // Each reading is a millisecond later, so that what happens after something is dated after it.
    clock: () => new Date(now++),
    log: { info: () => undefined, error: (text) => errors.push(text) },
    sessionSecret: 'the secret of a test, which is long enough',
    carrier: null,
    // Tests that look at pages put in the one of this machine.
    office: 'none',
    address: () => 'http://coldfill.test',
    passwords: quickPasswords(),
    ...settings,
  })
  const app = createApp(deps)
  const anonymous = (): TestAgent => request.agent(app).set('X-Requested-With', 'coldfill')
  return {
    app,
    deps,
    errors,
    anonymous,
    ...createFactories(deps),
    pass: (milliseconds) => {
      now += milliseconds
    },
    signIn: async (email, password = PASSWORD) => {
      const agent = anonymous()
      await agent.post('/api/session').send({ email, password }).expect(200)
      return agent
    },
    settle: async () => {
      await deps.fileMaker.idle()
      await deps.postman.idle()
    },
    close: async () => {
      await closeDeps(deps)
      await client.close()
    },
  }
}

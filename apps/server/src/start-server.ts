import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { join, resolve } from 'node:path'
import { createApp } from './app.ts'
import { systemClock } from './clock.ts'
import { closeDeps, createDeps } from './create-deps.ts'
import { lockDataFolder } from './data-folder-lock.ts'
import { openDatabase } from './db/client.ts'
import { migrate } from './db/migrate.ts'
import { addDemoOffice } from './demo/add-demo-office.ts'
import type { Env } from './env.ts'
import type { Log } from './log.ts'
import { smtpCarrier } from './mail/postman.ts'
import { sessionSecret } from './sign-in/session-secret.ts'

export interface RunningServer {
  /** `http://localhost:4173` */
  readonly address: string
  /** Whether the demo office was put in by this start. */
  readonly firstRun: boolean
  /** Answers what is under way, closes the database and lets the folder go. */
  close(): Promise<void>
}

const listen = (server: Server, port: number, host: string): Promise<number> =>
  new Promise((done, failed) => {
    server.once('error', failed)
    server.listen(port, host, () => {
      server.off('error', failed)
      done((server.address() as AddressInfo).port)
    })
  })

const GRACE_MS = 3_000

const stopListening = (server: Server): Promise<void> =>
  new Promise((done) => {
    const force = setTimeout(() => server.closeAllConnections(), GRACE_MS).unref()
    server.close(() => {
      clearTimeout(force)
      done()
    })
    server.closeIdleConnections()
  })

const isLocal = (host: string): boolean => host === '127.0.0.1' || host === '0.0.0.0' || host === '::'

/**
 * Opens the data folder, brings the database up to date and serves the application.
 * @throws {FolderInUse} {MigrationMismatch}, and EADDRINUSE where the port is taken; the folder is let go again
 */
export const startServer = async (env: Env, log: Log): Promise<RunningServer> => {
  const folder = resolve(env.COLDFILL_DATA)
  const undo: (() => Promise<void>)[] = []
  const close = async (): Promise<void> => {
    for (const step of undo.splice(0).toReversed()) await step()
  }
  try {
    const lock = await lockDataFolder(folder)
    undo.push(() => lock.release())
    const { client, db } = await openDatabase(join(folder, 'database'))
    undo.push(() => client.close())
    await migrate(db)
    let address = env.PUBLIC_URL ?? ''
    const deps = createDeps({
      db,
      log,
      clock: systemClock,
      sessionSecret: sessionSecret(env.SESSION_SECRET, folder),
      carrier: env.SMTP_URL === undefined ? null : smtpCarrier(env.SMTP_URL, env.MAIL_FROM),
      address: () => address,
      trustProxy: env.TRUST_PROXY,
      office: env.COLDFILL_OFFICE,
    })
    undo.push(() => closeDeps(deps))
    const firstRun = await addDemoOffice(deps)
    const server = createServer({ requestTimeout: 30_000, headersTimeout: 10_000 }, createApp(deps))
    const port = await listen(server, env.PORT, env.HOST)
    undo.push(() => stopListening(server))
    if (address === '') address = `http://${isLocal(env.HOST) ? 'localhost' : env.HOST}:${port}`
    // Work that an earlier process left behind.
    deps.fileMaker.wake()
    deps.postman.wake()
    return { address, firstRun, close }
  } catch (error) {
    await close()
    throw error
  }
}

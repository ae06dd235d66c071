import { type ChildProcess, spawn } from 'node:child_process'
import { existsSync } from 'node:fs'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))

export interface Served {
  /** `http://localhost:40123` */
  readonly address: string
  readonly folder: string
  readonly process: ChildProcess
  /** What the server has said so far. */
  said(): string
  /** Ends the server as Ctrl+C does, deletes its folder and gives its exit status. */
  stop(): Promise<number | null>
}

const exited = (child: ChildProcess): Promise<number | null> =>
  child.exitCode !== null || child.signalCode !== null
    ? Promise.resolve(child.exitCode)
    : new Promise((done) => child.once('exit', (status) => done(status)))

/**
 * Starts the real server on a free port and a new data folder, with the demo offices, and waits until it answers. `settings` stand
 * before those of the tests, by which it works without LibreOffice.
 */
export const serve = async (settings: Readonly<Record<string, string>> = {}): Promise<Served> => {
  if (!existsSync(join(root, 'apps/web/dist/index.html'))) throw new Error('The client is not built: npm run build.')
  const folder = await mkdtemp(join(tmpdir(), 'coldfill-e2e-'))
  const child = spawn(process.execPath, ['--import', 'tsx', 'apps/server/src/main.ts'], {
    cwd: root,
    env: {
      ...process.env,
      PORT: '0',
      COLDFILL_DATA: folder,
      SMTP_URL: '',
      PUBLIC_URL: '',
      SESSION_SECRET: '',
      ...settings,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let said = ''
  child.stdout.on('data', (bytes: Buffer) => (said += bytes.toString('utf8')))
  child.stderr.on('data', (bytes: Buffer) => (said += bytes.toString('utf8')))
  const stop = async (): Promise<number | null> => {
    child.kill('SIGINT')
    const status = await exited(child)
    await rm(folder, { recursive: true, force: true })
    return status
  }
  for (let tries = 0; tries < 900; tries++) {
    const address = /http:\/\/localhost:\d+/u.exec(said)?.[0]
    if (address !== undefined) {
      const health = await fetch(`${address}/api/health`).catch(() => undefined)
      if (health?.ok) return { address, folder, process: child, said: () => said, stop }
    }
    if (child.exitCode !== null) break
    await new Promise((wait) => setTimeout(wait, 100))
  }
  await stop()
  throw new Error(`The server did not start.\n${said}`)
}

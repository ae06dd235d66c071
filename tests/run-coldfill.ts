import { spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('..', import.meta.url))

export interface Run {
  readonly status: number | null
  readonly out: string
  readonly err: string
}

/** The real command, without npm around it, which costs half a second a run. */
export const coldfill = (...args: readonly string[]): Promise<Run> =>
  new Promise((done, fail) => {
    const environment = { ...process.env }
    delete environment['INIT_CWD']
    const child = spawn(process.execPath, ['--import', 'tsx', 'apps/cli/src/main.ts', ...args], {
      cwd: root,
      env: environment,
    })
    const out: Buffer[] = []
    const err: Buffer[] = []
    child.stdout.on('data', (bytes: Buffer) => out.push(bytes))
    child.stderr.on('data', (bytes: Buffer) => err.push(bytes))
    child.on('error', fail)
    child.on('close', (status) => {
      done({ status, out: Buffer.concat(out).toString('utf8'), err: Buffer.concat(err).toString('utf8') })
    })
  })

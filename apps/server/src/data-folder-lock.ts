import { createHash } from 'node:crypto'
import { mkdirSync, readFileSync, realpathSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs'
import { createServer, type Server } from 'node:net'
import { hostname } from 'node:os'
import { join } from 'node:path'
import { z } from 'zod'

/** Exit status of a process that finds the data folder in use. */
export const EXIT_FOLDER_IN_USE = 75

/** Another process works in the data folder. */
export class FolderInUse extends Error {}

export interface FolderLock {
  release(): Promise<void>
}

const Holder = z.object({ pid: z.number().int(), host: z.string(), started: z.string() })
type Holder = z.infer<typeof Holder>

const HEARTBEAT_MS = 5_000
/** How long a lock from another host (a container that shares the folder) is believed after its last sign of life. */
const FOREIGN_LIFE_MS = 30_000

const refusal = (folder: string, holder: Holder | null): FolderInUse =>
  new FolderInUse(
    `The data folder ${folder} is in use by another Coldfill${holder ? ` (process ${holder.pid} on ${holder.host})` : ''}. ` +
      'Two processes on one folder would lose data. Stop the other one, or give this one a folder of its own with COLDFILL_DATA.',
  )

/** Start time of a process in ticks since boot, so that a pid that was given out again is not taken for its former owner. */
const startOf = (pid: number): string => {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8')
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? ''
  } catch {
    return ''
  }
}

const isAlive = (pid: number): boolean => {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return (error as NodeJS.ErrnoException).code === 'EPERM'
  }
}

const readHolder = (file: string): { holder: Holder; seen: number } | null => {
  try {
    const holder = Holder.safeParse(JSON.parse(readFileSync(file, 'utf8')))
    return holder.success ? { holder: holder.data, seen: statSync(file).mtimeMs } : null
  } catch {
    return null
  }
}

const holds = ({ holder, seen }: { holder: Holder; seen: number }): boolean => {
  if (holder.host !== hostname()) return Date.now() - seen < FOREIGN_LIFE_MS
  if (holder.pid === process.pid) return holder.started === startOf(process.pid)
  return isAlive(holder.pid) && (holder.started === '' || holder.started === startOf(holder.pid))
}

/** A name that the kernel frees with the process: an abstract socket on Linux, a named pipe on Windows. Null elsewhere. */
const kernelName = (folder: string): string | null => {
  const sha = createHash('sha256').update(folder).digest('hex')
  if (process.platform === 'linux') return `\0coldfill-${sha}`
  return process.platform === 'win32' ? `\\\\.\\pipe\\coldfill-${sha}` : null
}

const bind = (name: string): Promise<Server | 'in use'> =>
  new Promise((resolve, reject) => {
    const server = createServer((socket) => socket.destroy())
    server.once('error', (error: NodeJS.ErrnoException) =>
      error.code === 'EADDRINUSE' ? resolve('in use') : reject(error),
    )
    server.listen(name, () => resolve(server.unref()))
  })

/**
 * Takes the data folder for this process. Two things are held: a name in the kernel, which dies with the process however it ends, and
 * a file with the process id for places that do not share that name (another network namespace, another platform). A file left by a
 * killed process holds nothing: its process is looked for.
 * @throws {FolderInUse}
 */
export const lockDataFolder = async (path: string): Promise<FolderLock> => {
  mkdirSync(path, { recursive: true })
  const folder = realpathSync(path)
  const file = join(folder, 'lock.json')
  const name = kernelName(folder)
  const server = name === null ? null : await bind(name)
  if (server === 'in use') throw refusal(folder, readHolder(file)?.holder ?? null)
  const giveUp = async (): Promise<void> => {
    if (server) await new Promise<void>((resolve) => server.close(() => resolve()))
  }
  const found = readHolder(file)
  if (found && holds(found)) {
    await giveUp()
    throw refusal(folder, found.holder)
  }
  rmSync(file, { force: true })
  const mine: Holder = { pid: process.pid, host: hostname(), started: startOf(process.pid) }
  try {
    writeFileSync(file, JSON.stringify(mine), { flag: 'wx' })
  } catch (error) {
    await giveUp()
    if ((error as NodeJS.ErrnoException).code === 'EEXIST') throw refusal(folder, readHolder(file)?.holder ?? null)
    throw error
  }
  const heartbeat = setInterval(() => {
    const now = new Date()
    try {
      utimesSync(file, now, now)
    } catch {
      // The file is only the second of two locks; the name in the kernel still holds.
    }
  }, HEARTBEAT_MS).unref()
  return {
    release: async () => {
      clearInterval(heartbeat)
      rmSync(file, { force: true })
      await giveUp()
    },
  }
}

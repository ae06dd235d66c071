import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { existsSync, mkdtempSync, readFileSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { hostname, tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { FolderInUse, lockDataFolder } from './data-folder-lock.ts'

let folder: string
const children: ChildProcess[] = []

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-lock-'))
})
afterEach(() => {
  for (const child of children.splice(0)) child.kill('SIGKILL')
  rmSync(folder, { recursive: true, force: true })
})

/** Another process that locks the folder and says how it went. */
const holder = async (): Promise<{ child: ChildProcess; said: string }> => {
  const child = spawn(
    process.execPath,
    ['--import', 'tsx', fileURLToPath(new URL('./testing/hold-lock.ts', import.meta.url)), folder],
    {
      stdio: ['ignore', 'pipe', 'inherit'],
    },
  )
  children.push(child)
  const [said] = (await once(child.stdout, 'data')) as [Buffer]
  return { child, said: String(said).trim() }
}

describe('a data folder', () => {
  it('is held by one process, and the second is told which', async () => {
    const first = await holder()
    expect(first.said).toBe('held')
    const second = await holder()
    expect(second.said).toContain(`in use by another Coldfill (process ${first.child.pid}`)
    await expect(lockDataFolder(folder)).rejects.toBeInstanceOf(FolderInUse)
  })

  it('is free at once after its process was killed', async () => {
    const { child } = await holder()
    child.kill('SIGKILL')
    await once(child, 'exit')
    expect(existsSync(join(folder, 'lock.json'))).toBe(true)
    const lock = await lockDataFolder(folder)
    await lock.release()
    expect(existsSync(join(folder, 'lock.json'))).toBe(false)
  })

  it('is found by another way of writing its path', async () => {
    const lock = await lockDataFolder(folder)
    await expect(lockDataFolder(join(folder, '..', folder.split('/').at(-1) ?? ''))).rejects.toBeInstanceOf(FolderInUse)
    await lock.release()
  })
})

/** The file alone, as where the name in the kernel is not shared. */
describe('the file in a data folder', () => {
  const leave = (holder: object): void => writeFileSync(join(folder, 'lock.json'), JSON.stringify(holder))

  it('refuses while the process that wrote it lives', async () => {
    const { child } = await holder()
    const text = readFileSync(join(folder, 'lock.json'), 'utf8')
    // The child holds the name of its own folder; the file is put into another, as a second namespace would see it.
    const other = mkdtempSync(join(tmpdir(), 'coldfill-lock-'))
    writeFileSync(join(other, 'lock.json'), text)
    await expect(lockDataFolder(other)).rejects.toThrow(`process ${child.pid}`)
    child.kill('SIGKILL')
    await once(child, 'exit')
    const lock = await lockDataFolder(other)
    await lock.release()
    rmSync(other, { recursive: true })
  })

  it('does not take another process for the one whose number it was given', async () => {
    leave({ pid: process.ppid, host: hostname(), started: '1' })
    const lock = await lockDataFolder(folder)
    expect(JSON.parse(readFileSync(join(folder, 'lock.json'), 'utf8'))).toMatchObject({ pid: process.pid })
    await lock.release()
  })

  it('is believed for another host while it shows signs of life, and not after', async () => {
    leave({ pid: 1, host: 'another-container', started: '1' })
    await expect(lockDataFolder(folder)).rejects.toThrow('another-container')
    const minuteAgo = new Date(Date.now() - 60_000)
    utimesSync(join(folder, 'lock.json'), minuteAgo, minuteAgo)
    const lock = await lockDataFolder(folder)
    await lock.release()
  })

  it('holds nothing where it cannot be read', async () => {
    writeFileSync(join(folder, 'lock.json'), 'half a fi')
    const lock = await lockDataFolder(folder)
    expect(JSON.parse(readFileSync(join(folder, 'lock.json'), 'utf8'))).toMatchObject({ pid: process.pid })
    await lock.release()
  })
})

import { chmodSync, mkdirSync, readFileSync, realpathSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { dirname, resolve } from 'node:path'
import { maxSpecBytes } from '@coldfill/spec'
import { exitStatus, Stop } from './exit-status.ts'

/** Paths are meant from where the command was typed, which `npm run` keeps in INIT_CWD. */
export const fromHere = (path: string): string => resolve(process.env['INIT_CWD'] ?? process.cwd(), path)

const isMissing = (error: unknown): boolean =>
  error instanceof Error &&
  'code' in error &&
  (error.code === 'ENOENT' || error.code === 'EISDIR' || error.code === 'EACCES')

/** Text of a file; a byte-order mark is taken off. */
export const readText = (path: string): string => {
  try {
    const bytes = readFileSync(fromHere(path))
    if (bytes.length > maxSpecBytes)
      throw new Stop(exitStatus.unreadable, `${path} has ${bytes.length} bytes; a spec may have ${maxSpecBytes}.`)
    return bytes.toString('utf8').replace(/^\uFEFF/, '')
  } catch (error) {
    if (isMissing(error)) throw new Stop(exitStatus.noInput, `${path}: no such file, or it cannot be read.`)
    throw error
  }
}

/** The file behind a link, so that the link stays one. */
const linkedTo = (path: string): string => {
  try {
    return realpathSync(path)
  } catch {
    return path
  }
}

const modeOf = (path: string): number | undefined => statSync(path, { throwIfNoEntry: false })?.mode

/** Writes beside the target and renames, so that a failed write leaves the old file whole. */
export const writeBytes = (path: string, bytes: Uint8Array): void => {
  const target = linkedTo(fromHere(path))
  const beside = `${target}.${process.pid}.part`
  try {
    mkdirSync(dirname(target), { recursive: true })
    writeFileSync(beside, bytes)
    const mode = modeOf(target)
    if (mode !== undefined) chmodSync(beside, mode)
    renameSync(beside, target)
  } catch (error) {
    rmSync(beside, { force: true })
    throw new Stop(
      exitStatus.cannotWrite,
      `${path} cannot be written: ${error instanceof Error ? error.message : String(error)}`,
    )
  }
}

/** Writes a text as `writeBytes` writes bytes. */
export const writeText = (path: string, text: string): void => writeBytes(path, new TextEncoder().encode(text))

/** Writes to standard output and waits until it is taken, also by a slow pipe. */
export const print = (text: string): Promise<void> =>
  new Promise((done, fail) => {
    process.stdout.write(text.endsWith('\n') ? text : `${text}\n`, (error) => (error ? fail(error) : done()))
  })

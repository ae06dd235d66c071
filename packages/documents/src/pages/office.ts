import { spawn, spawnSync } from 'node:child_process'
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'

/** LibreOffice of this machine. */
export interface Office {
  /**
   * Prints a .docx file as a PDF, with its bookmarks as named places.
   * @throws {OfficeFailure} with words for the reader of the file; the reason of `signal` where that ended it
   */
  print(docx: Uint8Array, signal?: AbortSignal): Promise<Uint8Array>
}

/** Why a file was not printed, as a sentence. */
export class OfficeFailure extends Error {}

const TO_PDF = `pdf:writer_pdf_Export:${JSON.stringify({
  ExportBookmarksToPDFDestination: { type: 'boolean', value: 'true' },
  UseTaggedPDF: { type: 'boolean', value: 'true' },
})}`

const PROBE_MS = 30_000

/** Its command is a script around the program that works, so that a process is ended with all that it started. */
const startGroup = (command: string, args: readonly string[]) => {
  const grouped = process.platform !== 'win32'
  const child = spawn(command, args, {
    detached: grouped,
    stdio: 'ignore',
    windowsHide: true,
    // Times in the file are those of the zone; the same everywhere.
    env: { ...process.env, TZ: 'UTC' },
  })
  const end = (): void => {
    if (child.pid === undefined) return
    try {
      if (grouped) process.kill(-child.pid, 'SIGKILL')
      else spawnSync('taskkill', ['/pid', String(child.pid), '/t', '/f'], { windowsHide: true })
    } catch {
      // It has ended by itself.
    }
  }
  // A process that ends in the middle takes it along.
  process.once('exit', end)
  const ended = new Promise<number | null>((resolve, reject) => {
    child.once('error', reject)
    child.once('exit', resolve)
  }).finally(() => process.off('exit', end))
  return { ended, end }
}

const installed = async (command: string): Promise<boolean> => {
  const { ended, end } = startGroup(command, ['--version'])
  const timer = setTimeout(end, PROBE_MS)
  try {
    return (await ended) === 0
  } catch {
    return false
  } finally {
    clearTimeout(timer)
  }
}

const print = async (
  command: string,
  timeout: number,
  docx: Uint8Array,
  signal: AbortSignal | undefined,
): Promise<Uint8Array> => {
  signal?.throwIfAborted()
  const folder = await mkdtemp(join(tmpdir(), 'coldfill-pages-'))
  try {
    const source = join(folder, 'submittal.docx')
    await writeFile(source, docx)
    // A profile of its own: two that share one get in each other's way.
    const profile = pathToFileURL(join(folder, 'profile')).href
    const { ended, end } = startGroup(command, [
      `-env:UserInstallation=${profile}`,
      '--headless',
      '--convert-to',
      TO_PDF,
      '--outdir',
      folder,
      source,
    ])
    let late = false
    const timer = setTimeout(() => {
      late = true
      end()
    }, timeout)
    signal?.addEventListener('abort', end)
    try {
      await ended
    } catch {
      throw new OfficeFailure('LibreOffice could not be started.')
    } finally {
      clearTimeout(timer)
      signal?.removeEventListener('abort', end)
    }
    signal?.throwIfAborted()
    if (late) throw new OfficeFailure(`LibreOffice took longer than ${timeout / 1000} s.`)
    try {
      // Its exit code says nothing; the file is what counts.
      return await readFile(join(folder, 'submittal.pdf'))
    } catch {
      throw new OfficeFailure('LibreOffice made no PDF of the file.')
    }
  } finally {
    await rm(folder, { recursive: true, force: true, maxRetries: 3 })
  }
}

/** The LibreOffice that `command` starts; null where there is none. `timeout` in ms bounds one printing. */
export const openOffice = async (command = 'soffice', timeout = 90_000): Promise<Office | null> =>
  (await installed(command)) ? { print: (docx, signal) => print(command, timeout, docx, signal) } : null

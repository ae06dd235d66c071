import { spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { basename, extname, join } from 'node:path'

/** Checks of this folder need LibreOffice; where it is absent they are left out and say so. */
export const hasOffice = spawnSync('soffice', ['--version'], { timeout: 60_000 }).status === 0

export const leftOut = hasOffice ? '' : ' (left out: LibreOffice is not installed)'

/**
 * Converts a file with LibreOffice, in a profile of its own. Its exit code says nothing, so the output file is what
 * counts; without one this throws.
 */
export const convert = (name: string, bytes: Uint8Array, to: 'pdf' | 'xlsx' | 'odt'): Uint8Array => {
  const folder = mkdtempSync(join(tmpdir(), 'coldfill-office-'))
  try {
    const source = join(folder, name)
    writeFileSync(source, bytes)
    const output = join(folder, 'out')
    const run = spawnSync(
      'soffice',
      [
        `-env:UserInstallation=file://${join(folder, 'profile')}`,
        '--headless',
        '--convert-to',
        to,
        '--outdir',
        output,
        source,
      ],
      { timeout: 150_000, encoding: 'utf8' },
    )
    const made = join(output, `${basename(name, extname(name))}.${to}`)
    if (!existsSync(made)) throw new Error(`LibreOffice made no ${to} of ${name}: ${run.stdout}${run.stderr}`)
    return readFileSync(made)
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

import { execFile } from 'node:child_process'
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { promisify } from 'node:util'
import type { PageFinder } from './page-tokens.ts'
import { pdfDestinations } from './pdf-destinations.ts'

const run = promisify(execFile)

const TO_PDF = 'pdf:writer_pdf_Export:{"ExportBookmarksToPDFDestination":{"type":"boolean","value":"true"}}'

/** Lays the file out with LibreOffice, in a profile of its own, since two that share one get in each other's way. */
const layOut =
  (command: string, timeout: number): PageFinder =>
  async (docx) => {
    const folder = await mkdtemp(join(tmpdir(), 'coldfill-pages-'))
    try {
      const source = join(folder, 'submittal.docx')
      await writeFile(source, docx)
      const profile = pathToFileURL(join(folder, 'profile')).href
      await run(
        command,
        [`-env:UserInstallation=${profile}`, '--headless', '--convert-to', TO_PDF, '--outdir', folder, source],
        { timeout },
      )
      // Its exit code says nothing; the file is what counts.
      return pdfDestinations(await readFile(join(folder, 'submittal.pdf')))
    } finally {
      await rm(folder, { recursive: true, force: true })
    }
  }

/**
 * Finds page numbers with the LibreOffice of this machine; null where `command` is not installed. `timeout` in ms bounds
 * one laying out; when it passes, the promise rejects.
 */
export const officePages = async (command = 'soffice', timeout = 90_000): Promise<PageFinder | null> => {
  try {
    await run(command, ['--version'], { timeout: 30_000 })
    return layOut(command, timeout)
  } catch {
    return null
  }
}

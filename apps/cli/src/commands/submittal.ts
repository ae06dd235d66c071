import {
  type DocumentOptions,
  type Office,
  openOffice,
  pagesBy,
  type PrintedSubmittal,
  printSubmittal,
  writeSubmittal,
} from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import { exitStatus, Stop } from '../exit-status.ts'
import { writeBytes } from '../io.ts'
import { statusOf } from '../report.ts'
import { findingsText } from '../reporters/findings-text.ts'
import { sizeFile } from '../size-file.ts'
import { documentOptions, readDocumentOptions, requireEnding } from './document-options.ts'

/** The LibreOffice to print with, or why there is none. */
const findOffice = async (): Promise<Office | string> => {
  const command = process.env['COLDFILL_OFFICE'] || 'soffice'
  if (command === 'none') return 'LibreOffice is not used (COLDFILL_OFFICE=none).'
  return (await openOffice(command)) ?? 'LibreOffice is not installed.'
}

const write = async (result: ProjectResult, options: DocumentOptions, withPdf: boolean): Promise<PrintedSubmittal> => {
  const office = await findOffice()
  if (typeof office === 'string')
    return { docx: await writeSubmittal(result, options), pdf: null, noPages: office, noPdf: office }
  if (withPdf) return printSubmittal(result, options, (docx) => office.print(docx))
  let noPages: string | null = null
  const docx = await writeSubmittal(result, options, {
    findPages: pagesBy(office),
    onNoPages: (why) => {
      noPages = why
    },
  })
  return { docx, pdf: null, noPages, noPdf: null }
}

/** `submittal FILE --out FILE.docx`: the Word submittal; with `--pdf FILE.pdf` a print of it too. */
export const submittal = async (args: readonly string[]): Promise<number> => {
  const options = readDocumentOptions('submittal', '.docx', args, ['pdf'])
  if (options.pdf !== undefined) requireEnding('submittal --pdf', options.pdf, '.pdf')
  const { file, result, read } = await sizeFile(options.files[0] ?? '', options.catalogue)
  if (result.findings.length > 0) process.stderr.write(`${findingsText(file, result.findings)}\n`)
  // Where the text could not be read at all there is nothing to write.
  if (read) {
    // An interrupt must not leave a print going on behind: ending through `exit` takes it along.
    const interrupted = (): void => process.exit(130)
    process.once('SIGINT', interrupted)
    const written = await write(result, documentOptions(result, options), options.pdf !== undefined)
    process.off('SIGINT', interrupted)
    writeBytes(options.out, written.docx)
    if (written.noPages !== null)
      process.stderr.write(`The contents list of ${options.out} has no page numbers. ${written.noPages}\n`)
    if (options.pdf !== undefined) {
      if (!written.pdf)
        throw new Stop(exitStatus.cannotWrite, `${options.pdf} cannot be written. ${written.noPdf ?? ''}`)
      writeBytes(options.pdf, written.pdf)
    }
  }
  return statusOf(result.findings, options.failOn, read)
}

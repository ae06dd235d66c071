import { writeSchedule } from '@coldfill/documents'
import { writeBytes } from '../io.ts'
import { statusOf } from '../report.ts'
import { findingsText } from '../reporters/findings-text.ts'
import { sizeFile } from '../size-file.ts'
import { documentOptions, readDocumentOptions } from './document-options.ts'

/** `schedule FILE --out FILE.xlsx`: the equipment schedule. */
export const schedule = async (args: readonly string[]): Promise<number> => {
  const options = readDocumentOptions('schedule', '.xlsx', args)
  const { file, result, read } = await sizeFile(options.files[0] ?? '', options.catalogue)
  if (result.findings.length > 0) process.stderr.write(`${findingsText(file, result.findings)}\n`)
  // Where the text could not be read at all there is nothing to write.
  if (read) writeBytes(options.out, await writeSchedule(result, documentOptions(result, options)))
  return statusOf(result.findings, options.failOn, read)
}

import { type DocumentOptions, writeSchedule, writeSubmittal } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import { exitStatus, Stop } from '../exit-status.ts'
import { writeBytes } from '../io.ts'
import { type Options, readOptions } from '../options.ts'
import { statusOf } from '../report.ts'
import { findingsText } from '../reporters/findings-text.ts'
import { sizeFile } from '../size-file.ts'

/** A document of the command is always a working copy: only the server issues revisions. */
const documentOptions = (result: ProjectResult, options: Options): DocumentOptions => ({
  units: options.units ?? result.project.units,
  titleBlock: {
    office: '',
    date: (process.env['SOURCE_DATE_EPOCH'] ? new Date(Number(process.env['SOURCE_DATE_EPOCH']) * 1000) : new Date())
      .toISOString()
      .slice(0, 10),
    revision: '',
    status: 'Working copy',
  },
  revisions: [],
})

const document =
  (verb: string, extension: string, write: (result: ProjectResult, options: DocumentOptions) => Promise<Uint8Array>) =>
  async (args: readonly string[]): Promise<number> => {
    const options = readOptions(verb, args, ['out', 'catalogue', 'units', 'fail-on', 'format'], 1)
    if (options.out === undefined) throw new Stop(exitStatus.usage, `${verb} needs --out FILE${extension}.`)
    if (!options.out.toLowerCase().endsWith(extension))
      throw new Stop(exitStatus.usage, `${verb} writes ${extension} files; "${options.out}" does not end so.`)
    const { file, result, read } = await sizeFile(options.files[0] ?? '', options.catalogue)
    if (result.findings.length > 0) process.stderr.write(`${findingsText(file, result.findings)}\n`)
    // Where the text could not be read at all there is nothing to write.
    if (read) writeBytes(options.out, await write(result, documentOptions(result, options)))
    return statusOf(result.findings, options.failOn, read)
  }

/** `schedule FILE --out FILE.xlsx`: the equipment schedule. */
export const schedule = document('schedule', '.xlsx', writeSchedule)

/** `submittal FILE --out FILE.docx`: the Word submittal. */
export const submittal = document('submittal', '.docx', writeSubmittal)

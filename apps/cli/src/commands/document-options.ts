import type { DocumentOptions } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import { exitStatus, Stop } from '../exit-status.ts'
import { type OptionName, type Options, readOptions } from '../options.ts'

/** A document of the command is always a working copy: only the server issues revisions. */
export const documentOptions = (result: ProjectResult, options: Options): DocumentOptions => ({
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

/** Stops where a file to write does not end as its kind does. */
export const requireEnding = (verb: string, path: string, extension: string): void => {
  if (!path.toLowerCase().endsWith(extension))
    throw new Stop(exitStatus.usage, `${verb} writes ${extension} files; "${path}" does not end so.`)
}

/** Options of a verb that writes one document to `--out`. */
export const readDocumentOptions = (
  verb: string,
  extension: string,
  args: readonly string[],
  more: readonly OptionName[] = [],
): Options & { readonly out: string } => {
  const options = readOptions(verb, args, ['out', 'catalogue', 'units', 'fail-on', 'format', ...more], 1)
  if (options.out === undefined) throw new Stop(exitStatus.usage, `${verb} needs --out FILE${extension}.`)
  requireEnding(verb, options.out, extension)
  return { ...options, out: options.out }
}

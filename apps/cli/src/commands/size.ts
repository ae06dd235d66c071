import { resultJson } from '@coldfill/sizing'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'
import { findingsAs, statusOf } from '../report.ts'
import { resultText } from '../reporters/result-text.ts'
import { findingsText } from '../reporters/findings-text.ts'
import { sizeFile } from '../size-file.ts'

/** `size FILE`: sizes every vessel. */
export const size = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('size', args, ['format', 'fail-on', 'units', 'catalogue'], 1)
  const { file, result, read } = await sizeFile(options.files[0] ?? '', options.catalogue)
  if (options.format === 'json') await print(JSON.stringify(resultJson(result), null, 2))
  else if (options.format === 'text') {
    if (read) await print(resultText(result, options.units ?? result.project.units))
    if (result.findings.length > 0) process.stderr.write(`${findingsText(file, result.findings)}\n`)
  } else {
    const text = findingsAs(options.format, file, result.findings)
    if (text) await print(text)
  }
  return statusOf(result.findings, options.failOn, read)
}

import { fixErrors } from '../fix-errors.ts'
import { print, readText, writeText } from '../io.ts'
import { readOptions } from '../options.ts'
import { findingsAs, statusOf } from '../report.ts'
import { findingsCount } from '../reporters/findings-text.ts'
import { sizeText } from '../size-file.ts'

/** `check FILE`: the findings only. With `--fix` errors are mended first where a fix leaves nothing to choose. */
export const check = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('check', args, ['format', 'fail-on', 'catalogue', 'fix'], 1)
  const [file = ''] = options.files
  const written = readText(file)
  const text = options.fix ? fixErrors(file, written) : written
  if (text !== written) writeText(file, text)
  const { result, read } = await sizeText(file, text, options.catalogue)
  if (options.format === 'json')
    await print(JSON.stringify({ engine: result.engine, spec: result.spec, findings: result.findings }, null, 2))
  else {
    const text = findingsAs(options.format, file, result.findings)
    if (text) await print(text)
    if (options.format === 'text') process.stderr.write(`${file}: ${findingsCount(result.findings)}\n`)
  }
  return statusOf(result.findings, options.failOn, read)
}

import { print } from '../io.ts'
import { readOptions } from '../options.ts'
import { findingsAs, statusOf } from '../report.ts'
import { findingsCount } from '../reporters/findings-text.ts'
import { sizeFile } from '../size-file.ts'

/** `check FILE`: the findings only. */
export const check = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('check', args, ['format', 'fail-on', 'catalogue'], 1)
  const { file, result, read } = await sizeFile(options.files[0] ?? '', options.catalogue)
  if (options.format === 'json')
    await print(JSON.stringify({ engine: result.engine, spec: result.spec, findings: result.findings }, null, 2))
  else {
    const text = findingsAs(options.format, file, result.findings)
    if (text) await print(text)
    if (options.format === 'text') process.stderr.write(`${file}: ${findingsCount(result.findings)}\n`)
  }
  return statusOf(result.findings, options.failOn, read)
}

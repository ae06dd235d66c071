import { specChanges } from '@coldfill/spec'
import { compareResults } from '../compare-results.ts'
import { exitStatus, Stop } from '../exit-status.ts'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'
import { statusOf } from '../report.ts'
import { comparisonJson, comparisonText } from '../reporters/comparison.ts'
import { findingsText } from '../reporters/findings-text.ts'
import { type SizedFile, sizeFile } from '../size-file.ts'

const unreadable = ({ file, result }: SizedFile): void => {
  process.stderr.write(`${findingsText(file, result.findings)}\n`)
}

/**
 * `compare OLD NEW`: what differs in the two specs by path, and what that does to the vessels. The status is that of the findings
 * of NEW: a difference alone is no failure.
 */
export const compare = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('compare', args, ['format', 'fail-on', 'catalogue', 'units'], 2)
  if (options.format !== 'text' && options.format !== 'json')
    throw new Stop(exitStatus.usage, `compare takes --format text or json; not "${options.format}".`)
  const [oldPath = '', newPath = ''] = options.files
  const was = await sizeFile(oldPath, options.catalogue)
  const now = await sizeFile(newPath, options.catalogue)
  const spec = specChanges(was.text, now.text)
  if (!was.read || !now.read || spec === null) {
    for (const side of [was, now]) if (!side.read) unreadable(side)
    return exitStatus.unreadable
  }
  const changes = compareResults(was.result, now.result)
  if (options.format === 'json') await print(JSON.stringify(comparisonJson(now.result.engine, spec, changes), null, 2))
  else await print(comparisonText(spec, changes, options.units ?? now.result.project.units))
  return statusOf(now.result.findings, options.failOn, true)
}

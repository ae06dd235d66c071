import { vocabulary } from '@coldfill/sizing'
import { formatSpec, readSpec } from '@coldfill/spec'
import { exitStatus } from '../exit-status.ts'
import { print, readText, writeText } from '../io.ts'
import { readOptions } from '../options.ts'
import { findingsText } from '../reporters/findings-text.ts'

/** `format FILE`: indentation and spacing. A text that cannot be read stays as it is. */
export const format = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('format', args, ['write'], 1)
  const [file = ''] = options.files
  const text = readText(file)
  const { tree, findings } = readSpec(text, vocabulary)
  if (!tree) {
    process.stderr.write(`${findingsText(file, findings)}\n`)
    return exitStatus.unreadable
  }
  const tidy = formatSpec(text)
  if (!options.write) {
    await print(tidy)
    return exitStatus.ok
  }
  if (tidy !== text) writeText(file, tidy)
  process.stderr.write(`${file}: ${tidy === text ? 'no change needed' : 'formatted'}\n`)
  return exitStatus.ok
}

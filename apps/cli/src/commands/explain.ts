import { findingCodes } from '@coldfill/spec'
import { engineeringCodes } from '@coldfill/sizing'
import { exitStatus, Stop } from '../exit-status.ts'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'

interface Help {
  readonly title: string
  readonly severity: string
  readonly what: string
  readonly why: string
  readonly fix: string
  readonly source?: string
}

const all: Readonly<Record<string, Help>> = { ...findingCodes, ...engineeringCodes }

/** `explain CODE`: what a finding means and how to mend it. */
export const explain = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('explain', args, ['format'], 1)
  const code = (options.files[0] ?? '').toUpperCase()
  const help = all[code]
  if (!help)
    throw new Stop(exitStatus.usage, `There is no finding ${code}. Codes: ${Object.keys(all).sort().join(', ')}`)
  if (options.format === 'json') await print(JSON.stringify({ code, ...help }, null, 2))
  else
    await print(
      [
        `${code} (${help.severity}): ${help.title}`,
        '',
        help.what,
        `Why: ${help.why}`,
        `What to do: ${help.fix}`,
        ...(help.source === undefined ? [] : [`Source: ${help.source}`]),
      ].join('\n'),
    )
  return exitStatus.ok
}

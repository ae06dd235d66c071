import { exitStatus, Stop } from './exit-status.ts'
import { check } from './commands/check.ts'
import { explain } from './commands/explain.ts'
import { fluid } from './commands/fluid.ts'
import { schema } from './commands/schema.ts'
import { size } from './commands/size.ts'
import { schedule, submittal } from './commands/write-document.ts'

const verbs: Readonly<Record<string, (args: readonly string[]) => Promise<number>>> = {
  check,
  size,
  schedule,
  submittal,
  fluid,
  schema,
  explain,
}

const usage = `coldfill VERB …

  check FILE                     findings only
  size FILE                      sizes every vessel
  schedule FILE --out FILE.xlsx  writes the equipment schedule
  submittal FILE --out FILE.docx writes the Word submittal
  fluid --fluid "propylene glycol 40 % mass" --temperature "20 °C" [--pressure "3 bar abs"]
  schema                         the JSON Schema of the spec
  explain CODE                   what a finding means and how to mend it

  --format text|json|github|sarif   --fail-on error|warning|note   --units US|SI

Exit status: 0 no error finding, 1 findings at or above --fail-on, 64 usage, 65 unreadable YAML or unknown spec version,
66 no such file, 70 internal, 73 cannot write.
`

/** Runs the command and returns its exit status. Standard output has data only. */
export const main = async (argv: readonly string[]): Promise<number> => {
  const [verb, ...args] = argv
  if (verb === '--help' || verb === '-h' || verb === 'help') {
    process.stdout.write(usage)
    return exitStatus.ok
  }
  try {
    const run = verb === undefined ? undefined : verbs[verb]
    if (!run) throw new Stop(exitStatus.usage, verb === undefined ? usage : `There is no verb "${verb}".\n\n${usage}`)
    return await run(args)
  } catch (error) {
    if (error instanceof Stop) {
      process.stderr.write(`${error.message}\n`)
      return error.status
    }
    process.stderr.write(`Internal error: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`)
    return exitStatus.internal
  }
}

process.exitCode = await main(process.argv.slice(2))

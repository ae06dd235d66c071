import { exitStatus, Stop } from './exit-status.ts'

type Verb = (args: readonly string[]) => Promise<number>

// Loaded when asked for: `size` does not wait for the libraries that write documents.
const verbs: Readonly<Record<string, () => Promise<Verb>>> = {
  check: async () => (await import('./commands/check.ts')).check,
  format: async () => (await import('./commands/format.ts')).format,
  compare: async () => (await import('./commands/compare.ts')).compare,
  size: async () => (await import('./commands/size.ts')).size,
  schedule: async () => (await import('./commands/schedule.ts')).schedule,
  submittal: async () => (await import('./commands/submittal.ts')).submittal,
  fluid: async () => (await import('./commands/fluid.ts')).fluid,
  schema: async () => (await import('./commands/schema.ts')).schema,
  explain: async () => (await import('./commands/explain.ts')).explain,
  verify: async () => (await import('./commands/verify.ts')).verify,
}

const usage = `coldfill VERB …

  check FILE [--fix]             findings only; --fix mends errors whose mending leaves nothing to choose
  size FILE                      sizes every vessel
  compare OLD NEW                what differs in the specs and in the sized vessels
  format FILE [--write]          tidies indentation and spacing; prints, or writes the file
  schedule FILE --out FILE.xlsx  writes the equipment schedule
  submittal FILE --out FILE.docx [--pdf FILE.pdf]
                                 writes the Word submittal, and a print of it
  fluid --fluid "propylene glycol 40 % mass" --temperature "20 °C" [--pressure "3 bar abs"]
  schema                         the JSON Schema of the spec
  explain CODE                   what a finding means and how to mend it
  verify                         every published case: expected, computed, deviation

  --format text|json|github|sarif   --fail-on error|warning|note   --units US|SI
  --catalogue FILE.csv|FILE.xlsx    chooses vessels from it: check, size, compare, schedule and submittal
  --help                            this page, after any verb

Exit status: 0 no error finding, 1 findings at or above --fail-on, 64 usage, 65 unreadable YAML or unknown spec version,
66 no such file, 70 internal, 73 cannot write.

Page numbers and the PDF of a submittal come from LibreOffice: COLDFILL_OFFICE names its command (soffice), or is none.
`

/** Runs the command and returns its exit status. Standard output has data only. */
export const main = async (argv: readonly string[]): Promise<number> => {
  const [verb, ...args] = argv
  const asksHelp = (arg: string | undefined): boolean => arg === '--help' || arg === '-h'
  if (verb === 'help' || asksHelp(verb) || args.some(asksHelp)) {
    process.stdout.write(usage)
    return exitStatus.ok
  }
  try {
    const load = verb !== undefined && Object.hasOwn(verbs, verb) ? verbs[verb] : undefined
    if (!load) throw new Stop(exitStatus.usage, verb === undefined ? usage : `There is no verb "${verb}".\n\n${usage}`)
    return await (
      await load()
    )(args)
  } catch (error) {
    if (error instanceof Stop) {
      process.stderr.write(`${error.message}\n`)
      return error.status
    }
    process.stderr.write(`Internal error: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`)
    return exitStatus.internal
  }
}

// A reader that has seen enough, as `| head`, closes the pipe; that is no failure of the command.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  process.exit(error.code === 'EPIPE' ? exitStatus.ok : exitStatus.cannotWrite)
})

process.exitCode = await main(process.argv.slice(2))

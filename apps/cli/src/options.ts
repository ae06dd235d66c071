import { parseArgs } from 'node:util'
import type { Severity } from '@coldfill/spec'
import type { UnitSystem } from '@coldfill/units'
import { exitStatus, Stop } from './exit-status.ts'

export type ReportFormat = 'text' | 'json' | 'github' | 'sarif'

export interface Options {
  readonly files: readonly string[]
  readonly format: ReportFormat
  readonly failOn: Severity
  readonly out?: string
  readonly pdf?: string
  readonly catalogue?: string
  readonly units?: UnitSystem
  readonly fluid?: string
  readonly temperature?: string
  readonly pressure?: string
  readonly write: boolean
  readonly fix: boolean
}

const known = {
  format: { type: 'string', default: 'text' },
  'fail-on': { type: 'string', default: 'error' },
  out: { type: 'string', short: 'o' },
  pdf: { type: 'string' },
  catalogue: { type: 'string' },
  units: { type: 'string' },
  fluid: { type: 'string' },
  temperature: { type: 'string' },
  pressure: { type: 'string' },
  write: { type: 'boolean', default: false },
  fix: { type: 'boolean', default: false },
} as const

export type OptionName = keyof typeof known

const oneOf = <T extends string>(name: string, value: string, choices: readonly T[]): T => {
  const found = choices.find((choice) => choice === value)
  if (!found) throw new Stop(exitStatus.usage, `--${name} takes ${choices.join(', ')}; not "${value}".`)
  return found
}

/** Joins a value that begins with a minus sign to its option: `--temperature "-10 °C"` is one thing to its author. */
const negativeValues = (args: readonly string[]): string[] => {
  const joined: string[] = []
  for (const arg of args) {
    const before = joined.at(-1)
    if (before !== undefined && /^--(?:temperature|pressure)$/u.test(before) && /^-\d/u.test(arg))
      joined[joined.length - 1] = `${before}=${arg}`
    else joined.push(arg)
  }
  return joined
}

/** Reads the arguments after the verb. `allowed` are the options the verb has; anything else is a usage error. */
export const readOptions = (
  verb: string,
  args: readonly string[],
  allowed: readonly OptionName[],
  files: number,
): Options => {
  let parsed
  try {
    parsed = parseArgs({ args: negativeValues(args), options: known, allowPositionals: true, strict: true })
  } catch (error) {
    throw new Stop(exitStatus.usage, `${verb}: ${error instanceof Error ? error.message : String(error)}`)
  }
  const { values, positionals } = parsed
  for (const name of Object.keys(values) as OptionName[]) {
    const isDefault =
      (name === 'format' && values.format === 'text') ||
      (name === 'fail-on' && values['fail-on'] === 'error') ||
      values[name] === false
    if (!isDefault && !allowed.includes(name)) throw new Stop(exitStatus.usage, `${verb} has no option --${name}.`)
  }
  if (positionals.length !== files)
    throw new Stop(
      exitStatus.usage,
      `${verb} takes ${files === 0 ? 'no file' : files === 1 ? 'one FILE' : `${files} files`}; ${positionals.length} given.`,
    )
  return {
    files: positionals,
    format: oneOf('format', values.format, ['text', 'json', 'github', 'sarif']),
    write: values.write,
    fix: values.fix,
    failOn: oneOf('fail-on', values['fail-on'], ['error', 'warning', 'note']),
    ...(values.out === undefined ? {} : { out: values.out }),
    ...(values.pdf === undefined ? {} : { pdf: values.pdf }),
    ...(values.catalogue === undefined ? {} : { catalogue: values.catalogue }),
    ...(values.units === undefined ? {} : { units: oneOf('units', values.units.toUpperCase(), ['US', 'SI']) }),
    ...(values.fluid === undefined ? {} : { fluid: values.fluid }),
    ...(values.temperature === undefined ? {} : { temperature: values.temperature }),
    ...(values.pressure === undefined ? {} : { pressure: values.pressure }),
  }
}

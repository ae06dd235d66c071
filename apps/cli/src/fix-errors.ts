import { vocabulary } from '@coldfill/sizing'
import { type ChangedLines, type MendedFinding, mend, readSpec } from '@coldfill/spec'

const shown = ({ was, now }: ChangedLines): string[] => [
  ...was.map((line) => `  - ${line}`),
  ...now.map((line) => `  + ${line}`),
]

/** One edit for a terminal: where, which finding, which fix, and the lines before and after. Lines count from 1. */
const editText = (file: string, { finding, fix, changes }: MendedFinding): string =>
  [
    `${file}:${(changes[0]?.line ?? finding.range.start.line) + 1}: ${finding.code}: ${fix.title}`,
    ...changes.flatMap(shown),
  ].join('\n')

const times = (count: number, what: string): string => `${count} ${what}${count === 1 ? '' : 's'}`

/** The text with every error mended whose first sure fix puts in nothing that was not said. Each edit goes to standard error. */
export const fixErrors = (file: string, text: string): string => {
  const {
    text: after,
    mended,
    left,
  } = mend(
    text,
    (each) => readSpec(each, vocabulary).findings,
    ({ severity }) => severity === 'error',
  )
  for (const each of mended) process.stderr.write(`${editText(file, each)}\n`)
  const rest = left.length > 0 ? `; ${times(left.length, 'error')} left for you to decide` : ''
  process.stderr.write(
    `${file}: ${mended.length > 0 ? `${times(mended.length, 'edit')} made` : 'nothing to mend'}${rest}\n`,
  )
  return after
}

import { casesNotRun, verificationRows } from '@coldfill/engine'
import { displayUnit, fromSi, type Kind, KINDS } from '@coldfill/units'
import { exitStatus } from '../exit-status.ts'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'
import { verificationText } from '../reporters/verification-text.ts'

const quantity = (kind: Kind, value: number | null) =>
  value === null ? null : { value: fromSi(value, displayUnit(kind, 'SI')), unit: KINDS[kind].metric }

/** `verify`: runs the verification manual. Exit status 1 where a figure does not hold. */
export const verify = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('verify', args, ['format'], 0)
  const rows = verificationRows()
  if (options.format === 'json') {
    const cases = rows.map(({ expected, computed, kind, ...rest }) => ({
      ...rest,
      expected: quantity(kind, expected),
      computed: quantity(kind, computed),
    }))
    await print(JSON.stringify({ cases, 'not-run': casesNotRun }, null, 2))
  } else {
    await print(verificationText(rows, casesNotRun))
  }
  return rows.some(({ verdict }) => verdict === 'fails') ? exitStatus.findings : exitStatus.ok
}

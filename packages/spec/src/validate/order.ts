import type { Quantity } from '@coldfill/units'
import type { Located } from '../model/field.ts'
import type { SystemModel } from '../model/spec-model.ts'
import type { FindingCode } from '../diagnostics.ts'
import { type Block, type Context, entryOf, valueAt } from '../read/context.ts'
import type { At } from '../report.ts'

type Read = Readonly<Record<string, Located<Quantity> | undefined>>

interface Order {
  readonly code: FindingCode
  readonly block: 'temperatures' | 'pressure'
  readonly lower: string
  readonly upper: string
  readonly message: (lower: string, upper: string) => string
}

const orders: readonly Order[] = [
  {
    code: 'CF-S100',
    block: 'temperatures',
    lower: 'low',
    upper: 'high',
    message: (low, high) => `The water gets as cold as \`${low}\`, which is not below \`high\`, ${high}.`,
  },
  {
    code: 'CF-S101',
    block: 'temperatures',
    lower: 'cold',
    upper: 'storage',
    message: (cold, storage) => `The water comes in at \`${cold}\`, which is not below \`storage\`, ${storage}.`,
  },
  {
    code: 'CF-S102',
    block: 'pressure',
    lower: 'cut-in',
    upper: 'cut-out',
    message: (cutIn, cutOut) => `The pump starts at \`${cutIn}\`, which is not below \`cut-out\`, ${cutOut}.`,
  },
]

/** Two readings of a system that must stand in order and do not. */
export const checkOrder = (
  context: Context,
  system: Block,
  read: Pick<SystemModel, 'temperatures' | 'pressure'>,
): void => {
  for (const { code, block, lower, upper, message } of orders) {
    const values = read[block] as Read
    const [least, most] = [values[lower], values[upper]]
    if (!least || !most || least.value.kind !== most.value.kind || least.value.value < most.value.value) continue
    const at = placeIn(system, block, lower)
    const other = placeIn(system, block, upper)
    if (!at || !other) continue
    context.report.add(code, at, {
      message: message(least.value.authored ?? '', most.value.authored ?? ''),
      hint: `Swap them, or mend the one that is wrong.`,
      related: [{ message: `\`${upper}\` is set here.`, ...other }],
    })
  }
}

const placeIn = (system: Block, block: string, key: string): At | undefined => {
  const outer = entryOf(system, block)
  if (outer?.value?.node !== 'map') return undefined
  const entry = entryOf({ map: outer.value, path: outer.path, span: outer.keySpan }, key)
  return entry && valueAt(entry)
}

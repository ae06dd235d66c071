import { isKind, type Kind, parseQuantity } from '@coldfill/units'
import { overrideFields } from '../model/block.ts'
import type { Located } from '../model/field.ts'
import type { AssumptionOverride, Vocabulary } from '../model/spec-model.ts'
import { wrongChoice } from './choice.ts'
import { type Block, type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './context.ts'
import { readFields, reportQuantity } from './field.ts'
import { expectBlock } from './shape.ts'

const EXAMPLE = "{ value: 10 %, reason: Owner's standard, section 5.2 }"

const valueFits = (
  context: Context,
  block: Block,
  value: Located<string>,
  assumption: Vocabulary['assumptions'][string],
): boolean => {
  const entry = entryOf(block, 'value')
  if (!entry) return false
  if (assumption.choices) {
    if (assumption.choices.includes(value.value)) return true
    wrongChoice(
      context,
      'CF-S051',
      valueAt(entry),
      value.value,
      assumption.choices,
      `\`${value.value}\` is not a choice for ${assumption.name}.`,
    )
    return false
  }
  const kinds = assumption.kinds.filter((kind): kind is Kind => isKind(kind))
  const reading = parseQuantity(value.value, kinds)
  if (reading.ok) return true
  reportQuantity(context, valueAt(entry), reading.problem, assumption.value)
  return false
}

const readOverride = (context: Context, entry: Entry): AssumptionOverride | undefined => {
  const { assumptions } = context.vocabulary
  const known = Object.hasOwn(assumptions, entry.key) ? assumptions[entry.key] : undefined
  if (!known) {
    const ids = Object.keys(assumptions)
    wrongChoice(context, 'CF-S050', keyAt(entry), entry.key, ids, `There is no assumption \`${entry.key}\`.`)
    return undefined
  }
  const block = expectBlock(context, entry, `${entry.key}: ${EXAMPLE}`)
  if (!block) return undefined
  const { value, reason } = readFields(context, block, overrideFields, { owner: 'An assumption' })
  if (!value || !valueFits(context, block, value, known) || !reason) return undefined
  return { id: entry.key, path: entry.path, range: context.report.lineIndex.range(entry.keySpan), value, reason }
}

/** `assumptions:`, the overrides that were understood. */
export const readAssumptions = (context: Context, entry: Entry | undefined): readonly AssumptionOverride[] => {
  const block = entry && expectBlock(context, entry, `assumptions: { relief-margin.hydronic: ${EXAMPLE} }`)
  return block ? entriesOf(block).flatMap((each) => readOverride(context, each) ?? []) : []
}

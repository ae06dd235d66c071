import { parseStrength } from '@coldfill/units'
import { type Fluids, linkFluid } from '../link/fluid.ts'
import { blockDocs } from '../model/block.ts'
import { fluidFields } from '../model/fluid.ts'
import type { FluidModel } from '../model/spec-model.ts'
import { type Block, type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './context.ts'
import { readField, readFields, reportQuantity } from './field.ts'
import { missingKey } from './keys.ts'
import { readMark } from './mark.ts'
import { expectBlock } from './shape.ts'

const EXAMPLE = '{ base: propylene glycol, strength: 30 % vol }'

/** A fluid written as a block. Null where it was not understood; a finding says why. */
const readFluid = (context: Context, block: Block, id: string | undefined): FluidModel | null => {
  const fields = readFields(context, block, fluidFields, { owner: 'A fluid' })
  const base = fields.base?.value
  if (base === undefined) return null
  const where = { path: block.path, range: context.report.lineIndex.range(block.span), ...(id !== undefined && { id }) }
  const entry = entryOf(block, 'strength')
  if (base === 'water') {
    if (entry === undefined) return { base, ...where }
    context.report.add('CF-S032', keyAt(entry), {
      message: 'Water has no strength.',
      hint: 'Take `strength` out, or say which glycol it is.',
    })
    return null
  }
  if (entry === undefined) {
    missingKey(context, block, {
      keys: ['strength'],
      message: `The ${base} needs \`strength\`.`,
      example: fluidFields.strength.example,
    })
    return null
  }
  if (fields.strength === undefined) return null
  const reading = parseStrength(fields.strength.value)
  if (!reading.ok) {
    reportQuantity(context, valueAt(entry), reading.problem, fluidFields.strength.example)
    return null
  }
  const { strength } = reading
  if (strength.value <= 0 || strength.value >= 1) {
    context.report.add('CF-S033', valueAt(entry), {
      message: `A strength of \`${strength.authored}\` is not between 0 and 100 %.`,
      hint: `Write it as in \`${fluidFields.strength.example}\`.`,
    })
    return null
  }
  return { base, strength, ...where }
}

/** `fluids:` by id. */
export const readFluids = (context: Context, entry: Entry | undefined): Fluids => {
  const fluids = new Map<string, FluidModel | null>()
  const block = entry && expectBlock(context, entry, `fluids: { glycol-30: ${EXAMPLE} }`)
  if (!block) return fluids
  for (const each of entriesOf(block)) {
    readMark(context, each, 'id of a fluid')
    const inner = expectBlock(context, each, EXAMPLE)
    fluids.set(each.key, inner ? readFluid(context, inner, each.key) : null)
  }
  return fluids
}

/** `fluid:` of a system: a name or a block. Undefined where the text is silent. */
export const readSystemFluid = (
  context: Context,
  entry: Entry | undefined,
  fluids: Fluids,
): FluidModel | null | undefined => {
  if (!entry) return undefined
  if (entry.value?.node === 'map')
    return readFluid(context, { map: entry.value, path: entry.path, span: entry.keySpan }, undefined)
  const name = readField(context, { field: 'text', doc: blockDocs.fluid, example: 'water' }, entry)
  return name ? linkFluid(context, fluids, valueAt(entry), name.value) : null
}

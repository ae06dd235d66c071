import type { FluidModel, VesselModel } from '../model/spec-model.ts'
import { placeholder } from '../model/block.ts'
import { pressureFields, temperatureFields } from '../model/system.ts'
import { type Need, type VesselKindDefinition, vesselKinds } from '../model/vessel.ts'
import { below } from '../parse/source-tree.ts'
import type { Fields } from '../model/field.ts'
import { type Block, type Context, entryOf } from './context.ts'
import { missingKey } from './keys.ts'
import { allOf } from './nearest.ts'

/** A vessel with the block in which it was written. */
export interface WrittenVessel {
  readonly model: VesselModel
  readonly block: Block
}

const OF_VESSEL = 'vessel.'

const valueOf = (vessel: WrittenVessel, key: string): string => {
  const entry = entryOf(vessel.block, key)
  return entry?.value?.node === 'text' ? entry.value.text.trim() : ''
}

const applies = (vessel: WrittenVessel, glycol: boolean, need: Need): boolean => {
  const { only, unless, liftedBy = [], askedBy = [] } = need
  return (
    (!only || only.is.includes(valueOf(vessel, only.key))) &&
    (!unless || !unless.is.includes(valueOf(vessel, unless.key))) &&
    liftedBy.every((key) => entryOf(vessel.block, key) === undefined) &&
    askedBy.every((key) => entryOf(vessel.block, key) !== undefined) &&
    (!need.glycol || glycol)
  )
}

/**
 * Where a key is due. Null where it is written, or where a part of its path was not understood and has its own finding.
 * Otherwise the innermost block that is there and the key that it lacks.
 */
const lacking = (context: Context, block: Block, key: string): { block: Block; key: string } | null => {
  const [head = '', ...rest] = key.split('.')
  const entry = entryOf(block, head)
  if (context.meant.has(below(block.path, head))) return null
  if (!entry) return { block, key }
  if (rest.length === 0 || entry.value?.node !== 'map') return null
  return lacking(context, { map: entry.value, path: entry.path, span: entry.keySpan }, rest.join('.'))
}

const EXAMPLES: Readonly<Record<string, string>> = {
  contents: '[{ volume: 120 gal }]',
  fixtures: '{ lavatory: 60 }',
  building: 'apartment house',
  people: '120',
  apartments: '60',
}

const tables: Readonly<Record<string, Fields>> = { temperatures: temperatureFields, pressure: pressureFields }

const PUT: Readonly<Record<string, string>> = {
  contents: `[{ volume: ${placeholder} }]`,
  fixtures: `{ lavatory: ${placeholder} }`,
}

/** Example and placeholder for a missing key, wrapped in its block where the block is missing too. */
const valueFor = (need: string, lackingKey: string, fields: Fields): { key: string; example: string; put: string } => {
  const [head = '', ...rest] = need.split('.')
  const last = rest.at(-1) ?? head
  const example = (rest.length > 0 ? tables[head] : fields)?.[last]?.example ?? EXAMPLES[last] ?? placeholder
  const put = PUT[last] ?? placeholder
  const [outer = '', ...inner] = lackingKey.split('.')
  const within = (value: string): string => (inner.length === 0 ? value : `{ ${inner.join('.')}: ${value} }`)
  return { key: outer, example: within(example), put: within(put) }
}

interface Gap {
  readonly block: Block
  readonly key: string
  readonly example: string
  readonly put: string
  readonly alternatives: readonly string[]
  readonly to: string
  readonly marks: string[]
  readonly paths: string[]
}

/** Says once for each input that is missing which vessels cannot be sized without it. */
export const checkNeeds = (
  context: Context,
  system: Block,
  vessels: readonly WrittenVessel[],
  fluid: FluidModel | null | undefined,
): void => {
  const glycol = fluid != null && fluid.base !== 'water'
  const gaps = new Map<string, Gap>()
  for (const vessel of vessels) {
    const { needs, fields }: VesselKindDefinition = vesselKinds[vessel.model.kind]
    for (const need of needs) {
      if (!applies(vessel, glycol, need)) continue
      if (need.sparedBy?.every((key) => lacking(context, system, key) === null)) continue
      const found = need.keys.map((key) =>
        key.startsWith(OF_VESSEL)
          ? lacking(context, vessel.block, key.slice(OF_VESSEL.length))
          : lacking(context, system, key),
      )
      const [first] = found
      if (!first || found.includes(null)) continue
      const name = (key: string): string => (key.startsWith(OF_VESSEL) ? key.slice(OF_VESSEL.length) : key)
      const wanted = name(need.keys[0])
      const id = `${first.block.path} ${wanted}`
      const { key, example, put } = valueFor(wanted, first.key, fields)
      const gap = gaps.get(id) ?? {
        block: first.block,
        key,
        example,
        put,
        alternatives: need.keys.map(name),
        to: need.to,
        marks: [],
        paths: [],
      }
      gaps.set(id, gap)
      if (gap.paths.includes(vessel.model.path)) continue
      gap.marks.push(vessel.model.mark)
      gap.paths.push(vessel.model.path)
    }
  }
  for (const { block, key, example, put, alternatives, to, marks, paths } of gaps.values()) {
    const [first = '', ...others] = alternatives
    missingKey(context, block, {
      keys: [key, ...others],
      message: `${allOf(marks)} ${marks.length === 1 ? 'needs' : 'need'} \`${first}\` ${to}.`,
      example,
      put,
      blocks: paths,
    })
  }
}

import { linkMethod } from '../link/method.ts'
import { selectedRowFields, selectionField } from '../model/block.ts'
import type { Fields, Located, ReadFields } from '../model/field.ts'
import type { SelectionModel, VesselModel } from '../model/spec-model.ts'
import { pressureFields, type Service, temperatureFields } from '../model/system.ts'
import {
  isVesselKind,
  type VesselFieldsOf,
  type VesselKind,
  type VesselKindDefinition,
  vesselKindNames,
  vesselKinds,
} from '../model/vessel.ts'
import { wrongChoice } from './choice.ts'
import { type Block, type Context, type Entry, entryOf, valueAt } from './context.ts'
import { readField, readFields } from './field.ts'
import { missingKey } from './keys.ts'
import { readMark } from './mark.ts'
import { allOf, oneOf } from './nearest.ts'
import type { WrittenVessel } from './needs.ts'
import { expectBlock, expectText } from './shape.ts'

const article = (noun: string): string => `${/^[aeiou]/u.test(noun) ? 'An' : 'A'} ${noun}`

const sizedKinds = (context: Context): readonly string[] =>
  vesselKindNames.filter((kind) => context.vocabulary.kinds.includes(kind))

/** `kind:` comes first: it decides which other keys the vessel has. */
const readKind = (context: Context, block: Block, mark: string): { kind: VesselKind; entry: Entry } | undefined => {
  const entry = entryOf(block, 'kind')
  if (!entry) {
    missingKey(context, block, {
      keys: ['kind'],
      message: `\`${mark}\` does not say what kind of vessel it is.`,
      example: 'expansion tank',
    })
    return undefined
  }
  const source = expectText(context, entry, 'a kind of vessel', 'expansion tank')
  const kind = source?.text.trim()
  if (kind === undefined) return undefined
  if (isVesselKind(kind)) return { kind, entry }
  wrongChoice(context, 'CF-S020', valueAt(entry), kind, vesselKindNames, `\`${kind}\` is not a kind of vessel.`)
  return undefined
}

const readSelection = (context: Context, entry: Entry | undefined): SelectionModel => {
  if (entry?.value?.node === 'map') {
    const block = { map: entry.value, path: entry.path, span: entry.keySpan }
    const { maker, model } = readFields(context, block, selectedRowFields, { owner: '`selection`' })
    if (!maker || !model) return { choose: 'none' }
    return {
      choose: 'row',
      maker: maker.value,
      model: model.value,
      path: entry.path,
      range: context.report.lineIndex.range(entry.keySpan),
    }
  }
  const word = entry && readField(context, selectionField, entry)
  return { choose: word?.value ?? 'auto' }
}

/** Where a key belongs that a person writes into a vessel by mistake. */
const elsewhere = (key: string): string | undefined => {
  const block = Object.hasOwn(pressureFields, key)
    ? 'pressure'
    : Object.hasOwn(temperatureFields, key)
      ? 'temperatures'
      : undefined
  if (block !== undefined) return `It belongs to the system: write it below \`${block}\`.`
  const kinds = vesselKindNames.filter((kind) => Object.hasOwn(vesselKinds[kind].fields, key))
  return kinds.length === 0 ? undefined : `It is a key of ${oneOf(kinds.slice(0, 3))}. Check \`kind\`.`
}

const readVesselFields = <K extends VesselKind>(
  context: Context,
  block: Block,
  kind: K,
): ReadFields<VesselFieldsOf<K>> => {
  const { method, ...fields }: Fields = vesselKinds[kind].fields
  const read: Record<string, Located<unknown> | undefined> = {
    ...readFields(context, block, fields, {
      owner: article(kind),
      others: ['kind', 'selection', ...(method ? ['method'] : [])],
      elsewhere,
    }),
  }
  const entry = method && entryOf(block, 'method')
  if (method?.required && !entry)
    missingKey(context, block, {
      keys: ['method'],
      message: `${article(kind)} needs \`method\`.`,
      example: method.example,
    })
  // Which methods there are is said by the vocabulary, not by the choices of the field.
  const named = entry && readField(context, { field: 'text', doc: '', example: method.example }, entry)
  if (named && entry && linkMethod(context, valueAt(entry), kind, named.value)) read['method'] = named
  return read as ReadFields<VesselFieldsOf<K>>
}

const misplaced = (context: Context, entry: Entry, kind: VesselKind, service: Service): void => {
  const { services }: VesselKindDefinition = vesselKinds[kind]
  if (services.includes(service)) return
  const others = vesselKindNames.filter(
    (other) =>
      (vesselKinds[other] as VesselKindDefinition).services.includes(service) &&
      context.vocabulary.kinds.includes(other),
  )
  context.report.add('CF-S023', valueAt(entry), {
    message: `${article(kind)} has no place in a system with the service \`${service}\`.`,
    hint:
      others.length === 0
        ? 'Check `kind` and `service`.'
        : `Vessels of such a system are ${allOf(others)}. Check \`kind\` and \`service\`.`,
  })
}

/** Reads a vessel. Undefined where it cannot be sized by any version of the text: it has a finding and is left out of sizing. */
export const readVessel = (context: Context, entry: Entry, service: Service | undefined): WrittenVessel | undefined => {
  readMark(context, entry, 'mark of a vessel')
  const block = expectBlock(context, entry, `${entry.key}: { kind: expansion tank, construction: bladder }`)
  if (!block) return undefined
  const named = readKind(context, block, entry.key)
  if (!named) return undefined
  const { kind } = named
  const sized = context.vocabulary.kinds.includes(kind)
  if (service) misplaced(context, named.entry, kind, service)
  if (!sized)
    context.report.add('CF-S021', valueAt(named.entry), {
      message: `This version does not size ${kind}s yet; \`${entry.key}\` is left out of the schedule.`,
      hint: `It sizes ${allOf(sizedKinds(context))}. Keep the vessel in the spec or take it out.`,
    })
  const place = valueAt(named.entry)
  const read = {
    mark: entry.key,
    path: block.path,
    range: context.report.lineIndex.range(entry.keySpan),
    kind,
    kindRange: context.report.lineIndex.range(place.span),
    fields: sized ? readVesselFields(context, block, kind) : readUnsized(context, block, kind),
    selection: readSelection(context, entryOf(block, 'selection')),
    sound: true,
  }
  return sized ? { model: read as VesselModel, block } : undefined
}

/** The keys of a kind that is not sized are read for their mistakes; its method is a choice like any other. */
const readUnsized = (context: Context, block: Block, kind: VesselKind): Readonly<Record<string, unknown>> =>
  readFields(context, block, vesselKinds[kind].fields as Fields, {
    owner: article(kind),
    others: ['kind', 'selection'],
    elsewhere,
  })

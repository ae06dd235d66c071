import type { Fluids } from '../link/fluid.ts'
import type { Fields, ReadFields } from '../model/field.ts'
import type { SystemModel } from '../model/spec-model.ts'
import { pressureFields, type Service, serviceKeys, systemFields, temperatureFields } from '../model/system.ts'
import { checkOrder } from '../validate/order.ts'
import { type Block, type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './context.ts'
import { readContents } from './contents.ts'
import { readDemand } from './demand.ts'
import { readField, readFields } from './field.ts'
import { readSystemFluid } from './fluid.ts'
import { missingKey, unknownKey } from './keys.ts'
import { readMark } from './mark.ts'
import { checkNeeds, type WrittenVessel } from './needs.ts'
import { allOf } from './nearest.ts'
import { expectBlock } from './shape.ts'
import { readVessel } from './vessel.ts'

const OTHER_KEYS = ['fluid', 'temperatures', 'pressure', 'contents', 'demand', 'vessels']

const EXAMPLE = 'HWS: { service: heating water, vessels: { … } }'

const unused = (context: Context, entry: Entry, service: Service, keys: readonly string[]): void =>
  context.report.add('CF-S024', keyAt(entry), {
    message: `\`${entry.key}\` means nothing in a system with the service \`${service}\`; it is not used.`,
    hint:
      keys.length === 0
        ? 'Take it out, or check `service`.'
        : `Such a system uses ${allOf(keys)}. Take it out, or check \`service\`.`,
  })

/** Reads `temperatures:` or `pressure:`. A key that the service does not use is said and left out. */
const readReadings = <T extends Fields>(
  context: Context,
  entry: Entry | undefined,
  fields: T,
  service: Service | undefined,
  used: readonly string[],
): ReadFields<T> => {
  const block =
    entry &&
    expectBlock(
      context,
      entry,
      entry.key === 'pressure' ? 'pressure: { relief-valve: 30 psi }' : 'temperatures: { low: 50 °F, high: 180 °F }',
    )
  if (!block) return {}
  const read = readFields(context, block, service ? pick(fields, used) : fields, {
    owner: `\`${block.path.split('.').at(-1)}\``,
    others: service ? Object.keys(fields).filter((key) => !used.includes(key)) : [],
    ...(service && { listed: used }),
    elsewhere: entry.key === 'pressure' ? inTemperatures : inPressure,
  })
  if (service)
    for (const each of entriesOf(block))
      if (Object.hasOwn(fields, each.key) && !used.includes(each.key)) unused(context, each, service, used)
  return read as ReadFields<T>
}

const inTemperatures = (key: string): string | undefined =>
  Object.hasOwn(temperatureFields, key) && !Object.hasOwn(pressureFields, key)
    ? 'It belongs to `temperatures`.'
    : undefined

const inPressure = (key: string): string | undefined =>
  Object.hasOwn(pressureFields, key) && !Object.hasOwn(temperatureFields, key) ? 'It belongs to `pressure`.' : undefined

const pick = (fields: Fields, keys: readonly string[]): Fields =>
  Object.fromEntries(Object.entries(fields).filter(([key]) => keys.includes(key)))

const readService = (context: Context, block: Block): SystemModel['service'] => {
  const entry = entryOf(block, 'service')
  if (entry) return readField(context, systemFields.service, entry)
  missingKey(context, block, {
    keys: ['service'],
    message: 'The system does not say what it carries.',
    example: systemFields.service.example,
  })
  return undefined
}

const DOMESTIC: readonly (Service | undefined)[] = ['domestic hot water', 'domestic cold water']

const checkFluid = (
  context: Context,
  block: Block,
  fluid: SystemModel['fluid'],
  service: Service | undefined,
): void => {
  const entry = entryOf(block, 'fluid')
  if (!entry || !fluid || fluid.base === 'water' || !DOMESTIC.includes(service)) return
  context.report.add('CF-S034', valueAt(entry), {
    message: `A system with the service \`${service}\` holds drinking water; glycol has no place in it.`,
    hint: 'Take `fluid` out, or check `service`.',
  })
}

/** Key of another block that a person writes directly into a system. */
const elsewhere = (key: string): string | undefined => {
  const block = Object.hasOwn(pressureFields, key)
    ? 'pressure'
    : Object.hasOwn(temperatureFields, key)
      ? 'temperatures'
      : undefined
  return block === undefined ? undefined : `Write it below \`${block}\`.`
}

const readVessels = (
  context: Context,
  entry: Entry | undefined,
  service: Service | undefined,
): readonly WrittenVessel[] => {
  const block = entry && expectBlock(context, entry, 'vessels: { ET-1: { kind: expansion tank } }')
  return block ? entriesOf(block).flatMap((each) => readVessel(context, each, service) ?? []) : []
}

/** Reads a system. Undefined where it is no block; a finding says so. */
export const readSystem = (context: Context, entry: Entry, fluids: Fluids): SystemModel | undefined => {
  readMark(context, entry, 'id of a system')
  const block = expectBlock(context, entry, EXAMPLE)
  if (!block) return undefined
  const known = [...Object.keys(systemFields), ...OTHER_KEYS]
  for (const each of entriesOf(block))
    if (!known.includes(each.key)) unknownKey(context, each, { owner: 'A system', known, elsewhere })
  const service = readService(context, block)
  const titleEntry = entryOf(block, 'title')
  const title = titleEntry && readField(context, systemFields.title, titleEntry)
  const fluid = readSystemFluid(context, entryOf(block, 'fluid'), fluids)
  checkFluid(context, block, fluid, service?.value)
  const used = service ? serviceKeys[service.value] : undefined
  const temperatures = readReadings(
    context,
    entryOf(block, 'temperatures'),
    temperatureFields,
    service?.value,
    used?.temperatures ?? [],
  )
  const pressure = readReadings(
    context,
    entryOf(block, 'pressure'),
    pressureFields,
    service?.value,
    used?.pressure ?? [],
  )
  checkOrder(context, block, { temperatures, pressure })
  const demandEntry = entryOf(block, 'demand')
  const demand = readDemand(context, demandEntry)
  if (demandEntry && service && !DOMESTIC.includes(service.value)) unused(context, demandEntry, service.value, [])
  const contents = readContents(context, entryOf(block, 'contents'))
  const vessels = readVessels(context, entryOf(block, 'vessels'), service?.value)
  checkNeeds(context, block, vessels, fluid)
  return {
    id: entry.key,
    path: block.path,
    range: context.report.lineIndex.range(block.span),
    ...(title && { title }),
    ...(service && { service }),
    ...(fluid !== undefined && { fluid }),
    temperatures,
    pressure,
    contents,
    ...(demand && { demand }),
    vessels: vessels.map(({ model }) => model),
    sound: true,
  }
}

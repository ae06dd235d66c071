import { specVersion } from '../model/block.ts'
import { demandFields } from '../model/demand.ts'
import type { Field, Fields } from '../model/field.ts'
import { pressureFields, type Service, temperatureFields } from '../model/system.ts'
import { type Need, type VesselKind, type VesselKindDefinition, vesselKinds } from '../model/vessel.ts'

/** Values that belong together in a domestic system, where the example of the key comes from a heating loop. */
const DOMESTIC: Readonly<Record<string, string>> = { 'pressure.relief-valve': '150 psi' }

const CONTENTS: Readonly<Record<'hydronic' | 'domestic', string>> = {
  hydronic: '{ equipment: Boilers B-1 and B-2, volume: 24 gal, count: 2, material: steel }',
  domestic: '{ equipment: Heater WH-1, volume: 119 gal, material: steel }',
}

const tables: Readonly<Record<string, Fields>> = {
  temperatures: temperatureFields,
  pressure: pressureFields,
  demand: demandFields,
}

/** What every closed loop says of itself. */
const LOOP = ['temperatures.low', 'temperatures.high']

const isDomestic = (service: Service): boolean => service.startsWith('domestic')

/** Value of a key of the vessel in its example; empty where it is not written. */
const valueIn = (example: string, key: string): string =>
  new RegExp(`(?:^|[{,]\\s*)${key}: ([^,}]+?)\\s*(?:,|\\})`, 'u').exec(example)?.[1] ?? ''

/** The examples are filled with water. */
const applies = (example: string, { only, unless, liftedBy = [], askedBy = [], glycol }: Need): boolean =>
  !glycol &&
  askedBy.every((key) => valueIn(example, key) !== '') &&
  (!only || only.is.includes(valueIn(example, only.key))) &&
  (!unless || !unless.is.includes(valueIn(example, unless.key))) &&
  liftedBy.every((key) => valueIn(example, key) === '')

const needed = (kind: VesselKind): string[] => {
  const { needs, example }: VesselKindDefinition = vesselKinds[kind]
  return needs.filter((need) => applies(example, need)).map(({ keys }) => keys[0])
}

const exampleOf = (key: string, service: Service): string => {
  const [table = '', name = ''] = key.split('.')
  const field: Field | undefined = tables[table]?.[name]
  if (key === 'demand.fixtures') return '{ lavatory: 60, shower: 30 }'
  return (isDomestic(service) ? DOMESTIC[key] : undefined) ?? field?.example ?? ''
}

const block = (name: string, keys: readonly string[], service: Service): string[] => {
  const own = keys.filter((key) => key.startsWith(`${name}.`))
  return own.length === 0
    ? []
    : [`    ${name}:`, ...own.map((key) => `      ${key.slice(name.length + 1)}: ${exampleOf(key, service)}`)]
}

/** A whole spec with one vessel of the kind and nothing that it does not need: it reads without a finding. */
export const exampleSpec = (kind: VesselKind): string => {
  const { services, example }: VesselKindDefinition = vesselKinds[kind]
  const [service] = services
  if (!service) throw new Error(`a ${kind} fits no service`)
  const keys = [...new Set([...(isDomestic(service) || service === 'steam' ? [] : LOOP), ...needed(kind)])]
  return [
    `coldfill: ${specVersion}`,
    'systems:',
    '  A:',
    `    service: ${service}`,
    ...block('temperatures', keys, service),
    ...block('pressure', keys, service),
    ...(keys.includes('contents')
      ? ['    contents:', `      - ${CONTENTS[isDomestic(service) ? 'domestic' : 'hydronic']}`]
      : []),
    ...block('demand', keys, service),
    '    vessels:',
    `      V-1: ${example}`,
    '',
  ].join('\n')
}

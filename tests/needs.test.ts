import { sizeSpec } from '@coldfill/sizing'
import {
  demandFields,
  type Field,
  type Fields,
  hydronicServices,
  type Need,
  pressureFields,
  type Service,
  temperatureFields,
  type VesselKind,
  type VesselKindDefinition,
  vesselKindNames,
  vesselKinds,
} from '@coldfill/spec'
import { describe, expect, it } from 'vitest'

/**
 * The spec asks for every key without which a vessel has no size: at once, with a fix. Whatever sizing alone would miss (CF-E001) is
 * a need that the model forgot. Each kind is written with nothing but what its needs ask for, by each method, construction
 * and service that it has, and with each of the keys that may stand for one another.
 */
type Written = ReadonlyMap<string, string>

const tables: Readonly<Record<string, Fields>> = {
  temperatures: temperatureFields,
  pressure: pressureFields,
  demand: demandFields,
}

/** Values that a domestic system has and that do not contradict each other. */
const DOMESTIC: Written = new Map([
  ['pressure.relief-valve', '150 psi'],
  ['pressure.maximum', '135 psi'],
])
const BLOCKS: Written = new Map([
  ['contents', '[{ volume: 120 gal }]'],
  ['demand.fixtures', '{ lavatory: 60 }'],
])

const WATER = 'water'
const GLYCOL = '{ base: propylene glycol, strength: 30 % vol }'

const applies = (vessel: Written, fluid: string, need: Need): boolean => {
  const { only, unless, liftedBy = [], askedBy = [] } = need
  return (
    (!only || only.is.includes(vessel.get(only.key) ?? '')) &&
    (!unless || !unless.is.includes(vessel.get(unless.key) ?? '')) &&
    liftedBy.every((key) => !vessel.has(key)) &&
    askedBy.every((key) => vessel.has(key)) &&
    (!need.glycol || fluid !== WATER)
  )
}

const OF_VESSEL = 'vessel.'

/** The spec with what the needs of this vessel ask for; of keys that stand for one another the one at `alternative`. */
const leastSpec = (kind: VesselKind, service: Service, fluid: string, chosen: Written, alternative: number): string => {
  const { needs, fields }: VesselKindDefinition = vesselKinds[kind]
  const vessel = new Map([['kind', kind], ...chosen])
  for (const [key, field] of Object.entries<Field>(fields))
    if ('required' in field && field.required && !vessel.has(key)) vessel.set(key, field.example)
  const system = new Map<string, string>()
  for (const { keys } of needs.filter((need) => applies(vessel, fluid, need))) {
    const key = keys[Math.min(alternative, keys.length - 1)] ?? keys[0]
    if (key.startsWith(OF_VESSEL)) {
      const name = key.slice(OF_VESSEL.length)
      vessel.set(name, fields[name]?.example ?? '')
    } else {
      const [table = '', name = ''] = key.split('.')
      const own = service.startsWith('domestic') ? DOMESTIC.get(key) : undefined
      system.set(key, BLOCKS.get(key) ?? own ?? tables[table]?.[name]?.example ?? '')
    }
  }
  const block = (name: string): string[] => {
    const lines = [...system].filter(([key]) => key.startsWith(`${name}.`))
    return lines.length === 0
      ? []
      : [`    ${name}:`, ...lines.map(([key, value]) => `      ${key.slice(name.length + 1)}: ${value}`)]
  }
  return [
    'coldfill: 1',
    'systems:',
    '  A:',
    `    service: ${service}`,
    ...(fluid === WATER ? [] : [`    fluid: ${fluid}`]),
    ...['temperatures', 'pressure', 'demand'].flatMap(block),
    ...(system.has('contents') ? [`    contents: ${system.get('contents') ?? ''}`] : []),
    '    vessels:',
    '      V-1:',
    ...[...vessel].map(([key, value]) => `        ${key}: ${value}`),
    '',
  ].join('\n')
}

const choicesOf = (kind: VesselKind, key: string): readonly string[] => {
  const { fields }: VesselKindDefinition = vesselKinds[kind]
  const field = fields[key]
  return field?.field === 'choice' ? Object.keys(field.choices) : []
}

/** Services whose systems may hold glycol. */
const fillable: readonly Service[] = hydronicServices

/** Keys by one of which alone a method is asked for, where none is named. */
const askingKeys = (kind: VesselKind): readonly string[] => {
  const { needs }: VesselKindDefinition = vesselKinds[kind]
  return [...new Set(needs.flatMap(({ askedBy = [] }) => askedBy))]
}

interface Case {
  readonly name: string
  readonly text: string
}

const casesOf = (kind: VesselKind): Case[] => {
  const { services, needs, fields }: VesselKindDefinition = vesselKinds[kind]
  const alternatives = Math.max(1, ...needs.map(({ keys }) => keys.length))
  const methods = [undefined, ...choicesOf(kind, 'method')]
  const constructions = [undefined, ...choicesOf(kind, 'construction')]
  const chosen = methods.flatMap((method) =>
    constructions.flatMap((construction) =>
      [undefined, ...(method === undefined ? askingKeys(kind) : [])].map(
        (asking) =>
          new Map([
            ...(method === undefined ? [] : [['method', method] as const]),
            ...(construction === undefined ? [] : [['construction', construction] as const]),
            ...(asking === undefined ? [] : [[asking, fields[asking]?.example ?? ''] as const]),
          ]),
      ),
    ),
  )
  return services.flatMap((service) =>
    (fillable.includes(service) ? [WATER, GLYCOL] : [WATER]).flatMap((fluid) =>
      chosen.flatMap((vessel) =>
        Array.from({ length: alternatives }, (_, alternative) => ({
          name: [service, fluid, ...vessel.values(), alternative].join(', '),
          text: leastSpec(kind, service, fluid, vessel, alternative),
        })),
      ),
    ),
  )
}

describe.each(vesselKindNames)('a %s with nothing but what it needs', (kind) => {
  const cases = casesOf(kind)

  it('lacks no input when it is sized', () => {
    const lacking = cases.flatMap(({ name, text }) =>
      sizeSpec(text)
        .findings.filter(({ code }) => code === 'CF-E001')
        .map(({ message }) => `${name}: ${message}`),
    )
    expect(lacking).toEqual([])
  })

  it('is read without an error, and asked for nothing else', () => {
    const asked = cases.flatMap(({ name, text }) =>
      sizeSpec(text)
        .findings.filter(({ code, severity }) => severity === 'error' && !code.startsWith('CF-E'))
        .map(({ message }) => `${name}: ${message}`),
    )
    expect(asked).toEqual([])
  })
})

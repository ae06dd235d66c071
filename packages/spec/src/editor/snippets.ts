import { placeholder } from '../model/block.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { isService, type Service, serviceField, serviceKeys } from '../model/system.ts'
import { isVesselKind, type VesselKind, type VesselKindDefinition, vesselKinds } from '../model/vessel.ts'

const MARKS: Readonly<Record<VesselKind, string>> = {
  'expansion tank': 'ET-1',
  'thermal expansion tank': 'TET-1',
  'storage tank': 'ST-1',
  'buffer tank': 'BT-1',
  'pressure tank': 'PT-1',
  'solar expansion tank': 'SET-1',
  'glycol feeder': 'GF-1',
  'air and dirt separator': 'AS-1',
  'hydraulic separator': 'HS-1',
  'drain-back tank': 'DBT-1',
  'flash tank': 'FT-1',
  'blowdown separator': 'BS-1',
  'condensate receiver': 'CR-1',
  'break tank': 'BKT-1',
}

const IDS: Readonly<Record<Service, string>> = {
  'heating water': 'HWS',
  'chilled water': 'CHW',
  'dual temperature water': 'DTW',
  'condenser water': 'CDW',
  'ground loop': 'GL',
  'snow melting': 'SM',
  'solar thermal': 'SOL',
  'domestic hot water': 'DHW',
  'domestic cold water': 'DCW',
  steam: 'STM',
}

/** Readings that a system of the service needs for its first vessel. */
const readings = (service: Service): { temperatures: readonly string[]; pressure: readonly string[] } => {
  if (service === 'domestic hot water')
    return { temperatures: ['cold', 'storage'], pressure: ['supply', 'relief-valve'] }
  if (service === 'domestic cold water') return { temperatures: [], pressure: ['cut-in', 'cut-out'] }
  if (service === 'steam') return { temperatures: [], pressure: [] }
  return { temperatures: ['low', 'high'], pressure: ['static-height', 'relief-valve'] }
}

const FIRST_VESSEL: Partial<Record<Service, VesselKind>> = {
  'domestic hot water': 'thermal expansion tank',
  'domestic cold water': 'pressure tank',
  steam: 'condensate receiver',
  'solar thermal': 'solar expansion tank',
}

/** A name that is not taken yet, after the example: `ET-1`, `ET-2`; `HWS`, `HWS-2`. */
export const freshName = (example: string, taken: ReadonlySet<string>): string => {
  if (!taken.has(example)) return example
  const stem = example.replace(/-?\d+$/u, '')
  for (let number = 2; ; number++) if (!taken.has(`${stem}-${number}`)) return `${stem}-${number}`
}

/** The example of a kind with a placeholder for every number: what an installation has is never made up. */
export const vesselBody = (kind: VesselKind): string => {
  const { example, fields }: VesselKindDefinition = vesselKinds[kind]
  return example.replace(/([a-z-]+): ([^,{}]+?)(?=,| \})/gu, (whole: string, key: string) => {
    const field = Object.hasOwn(fields, key) ? fields[key]?.field : undefined
    return field === 'quantity' || field === 'integer' || field === 'number' ? `${key}: ${placeholder}` : whole
  })
}

export interface Snippet {
  readonly label: string
  /** With placeholders; lines after the first begin in their column. */
  readonly text: string
  readonly doc: string
}

/** Kinds that are sized and fit the service; all that are sized where it is not known. */
export const fittingKinds = (vocabulary: Vocabulary, service: string | undefined): VesselKind[] =>
  vocabulary.kinds.filter(isVesselKind).filter((kind) => {
    const { services }: VesselKindDefinition = vesselKinds[kind]
    return service === undefined || !isService(service) || services.includes(service)
  })

/** A whole vessel of each kind that fits the service of the system. */
export const vesselSnippets = (
  vocabulary: Vocabulary,
  service: string | undefined,
  taken: ReadonlySet<string>,
): Snippet[] =>
  fittingKinds(vocabulary, service).map((kind) => {
    const mark = freshName(MARKS[kind], taken)
    return { label: `${mark}: ${kind}`, text: `${mark}: ${vesselBody(kind)}`, doc: vesselKinds[kind].doc }
  })

const firstVessel = (vocabulary: Vocabulary, service: Service): VesselKind | undefined => {
  const kinds = fittingKinds(vocabulary, service)
  const usual = FIRST_VESSEL[service] ?? 'expansion tank'
  return kinds.includes(usual) ? usual : kinds[0]
}

const lines = (id: string, service: Service, kind: VesselKind, mark: string): string[] => {
  const { temperatures, pressure } = readings(service)
  const used = (keys: readonly string[], known: readonly string[]): string[] =>
    keys.filter((key) => known.includes(key))
  const warm = used(temperatures, serviceKeys[service].temperatures)
  const pressed = used(pressure, serviceKeys[service].pressure)
  const holdsWater = service !== 'steam' && service !== 'domestic cold water'
  return [
    `${id}:`,
    `  service: ${service}`,
    ...(warm.length > 0 ? [`  temperatures: { ${warm.map((key) => `${key}: ${placeholder}`).join(', ')} }`] : []),
    ...(pressed.length > 0 ? ['  pressure:', ...pressed.map((key) => `    ${key}: ${placeholder}`)] : []),
    ...(holdsWater ? ['  contents:', `    - volume: ${placeholder}`] : []),
    '  vessels:',
    `    ${mark}: ${vesselBody(kind)}`,
  ]
}

/** A whole system of each service, with a vessel that such a system mostly has. `indent` is the column of its id. */
export const systemSnippets = (
  vocabulary: Vocabulary,
  taken: { readonly ids: ReadonlySet<string>; readonly marks: ReadonlySet<string> },
  indent: string,
): Snippet[] =>
  (Object.keys(serviceField.choices) as Service[]).flatMap((service) => {
    const kind = firstVessel(vocabulary, service)
    if (!kind) return []
    const id = freshName(IDS[service], taken.ids)
    const text = lines(id, service, kind, freshName(MARKS[kind], taken.marks))
    return [{ label: `${id}: ${service}`, text: text.join(`\n${indent}`), doc: serviceField.choices[service] }]
  })

import { kindsInWords, usualUnits } from '@coldfill/units'
import { specVersion } from '../model/block.ts'
import type { Field } from '../model/field.ts'
import { type BlockShape, docOf, exampleOf, type FieldShape, type MapShape, type Shape } from '../model/shape.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import { type Service, serviceKeys } from '../model/system.ts'
import { type VesselKind, type VesselKindDefinition, vesselKindNames, vesselKinds } from '../model/vessel.ts'
import { exampleSpec } from './example-spec.ts'

/** A key with everything that is known of it. */
export interface ReferenceKey {
  readonly key: string
  readonly doc: string
  /** What stands behind it: "a length", "one of the words below", "a block". */
  readonly takes: string
  /** Units that are mostly written; empty where it has none. */
  readonly units: readonly string[]
  /** Words that may stand behind it, each with a line. */
  readonly choices: readonly { readonly name: string; readonly doc: string }[]
  /** What holds where the key is left out. */
  readonly fallback?: string
  readonly required: boolean
  readonly example: string
  /** Services whose systems use the key; absent where all do. */
  readonly services?: readonly string[]
  /** Id of the section that describes what stands behind it. */
  readonly section?: string
}

export interface ReferenceSection {
  /** For addresses: `systems-pressure`, `systems-vessels-buffer-tank`. */
  readonly id: string
  /** Keys from the outside in; `…` stands for an id or a mark: `systems`, `…`, `pressure`. */
  readonly path: readonly string[]
  readonly title: string
  readonly doc: string
  readonly example: string
  /** Where the keys are given by the author: a key as a person would write it. */
  readonly named?: string
  readonly keys: readonly ReferenceKey[]
}

/** A kind of vessel with a whole spec that has one. */
export interface ReferenceKind {
  readonly kind: string
  readonly title: string
  readonly doc: string
  /** Id of the section with its keys. */
  readonly section: string
  readonly services: readonly string[]
  /** False where this version reads the kind and does not size it. */
  readonly sized: boolean
  readonly example: string
}

export interface SpecReference {
  readonly version: string
  /** Outside in, in the order in which a spec is written. */
  readonly sections: readonly ReferenceSection[]
  readonly kinds: readonly ReferenceKind[]
}

const takesOf = (field: Field, hasWords: boolean): string => {
  switch (field.field) {
    case 'quantity':
      return kindsInWords(field.kinds)
    case 'choice':
      return 'one of the words below'
    case 'text':
      return hasWords ? 'one of the words below' : 'a text'
    case 'integer':
      return `a whole number, ${field.least} or more`
    case 'number':
      return field.least === undefined ? 'a number' : `a number, ${field.least} or more`
    case 'yes or no':
      return 'yes or no'
  }
}

const TAKES: Readonly<Record<Exclude<Shape['shape'], 'field'>, string>> = {
  block: 'a block',
  map: 'a block',
  list: 'a list',
  'branch by value': 'a block',
  'branch by key': 'a block',
  either: 'a word or a block',
}

const fieldOf = (shape: Shape): FieldShape | undefined =>
  shape.shape === 'field' ? shape : shape.shape === 'either' ? shape.text : undefined

const choicesOf = (shape: FieldShape | undefined): ReferenceKey['choices'] => {
  const words = shape?.names ?? (shape?.field.field === 'choice' ? shape.field.choices : {})
  return Object.entries(words).map(([name, doc]) => ({ name, doc }))
}

/** Services that use a key of `temperatures` or `pressure`; undefined where the key is of neither. */
const servicesOf = (path: readonly string[], key: string): readonly string[] | undefined => {
  const table = path.at(-1)
  if (path[0] !== 'systems' || (table !== 'temperatures' && table !== 'pressure')) return undefined
  return (Object.keys(serviceKeys) as Service[]).filter((service) =>
    (serviceKeys[service][table] as readonly string[]).includes(key),
  )
}

const idOf = (path: readonly string[]): string =>
  path
    .filter((part) => part !== '…')
    .join('-')
    .replaceAll(' ', '-') || 'spec'

interface Heading {
  readonly id: string
  readonly title: string
}

const headingOf = (path: readonly string[]): Heading => ({
  id: idOf(path),
  title: path.findLast((part) => part !== '…') ?? 'Spec',
})

/** Writes the sections of a language; a block that stands in several places is described where it comes first. */
const createWriter = () => {
  const sections: ReferenceSection[] = []
  const written = new Map<Shape, string>()

  const keyOf = (key: string, shape: Shape, path: readonly string[], required: boolean): ReferenceKey => {
    const field = fieldOf(shape)
    const services = servicesOf(path, key)
    const choices = choicesOf(field)
    const section = describe(shape, [...path, key])
    return {
      key,
      doc: docOf(shape),
      takes: shape.shape === 'field' ? takesOf(shape.field, choices.length > 0) : TAKES[shape.shape],
      units:
        field?.field.field === 'quantity' ? [...new Set(field.field.kinds.flatMap((kind) => usualUnits(kind)))] : [],
      choices,
      required,
      example: exampleOf(shape),
      ...(field?.field.fallback !== undefined && { fallback: field.field.fallback }),
      ...(services && { services }),
      ...(section !== undefined && { section }),
    }
  }

  /** Reserves the place of a section, so that it comes before those of its keys. */
  const put = (
    shape: Shape,
    path: readonly string[],
    rest: () => Partial<ReferenceSection>,
    heading: Heading = headingOf(path),
  ): string => {
    const known = written.get(shape)
    if (known !== undefined) return known
    written.set(shape, heading.id)
    const at = sections.length
    const section: ReferenceSection = { ...heading, path, doc: docOf(shape), example: exampleOf(shape), keys: [] }
    sections.push(section)
    sections[at] = { ...section, ...rest() }
    return heading.id
  }

  const keysOf = (shape: BlockShape, path: readonly string[]): ReferenceKey[] =>
    Object.entries(shape.keys).map(([key, each]) => keyOf(key, each, path, shape.required.includes(key)))

  const blockSection = (shape: BlockShape, path: readonly string[], heading?: Heading): string =>
    put(shape, path, () => ({ keys: keysOf(shape, path) }), heading)

  /** Keys that the author gives are described with what stands behind them; keys from a list of names one by one. */
  const mapSection = (shape: MapShape, path: readonly string[]): string =>
    put(shape, path, () => {
      const inside = [...path, '…']
      const { of, names } = shape
      if (!names) {
        if (of.shape === 'block') return { named: shape.exampleKey, keys: keysOf(of, inside) }
        describe(of, inside)
        const lead = of.shape === 'branch by value' ? Object.values(of.branches)[0]?.keys[of.by] : undefined
        const keys = of.shape === 'branch by value' && lead ? [keyOf(of.by, lead, inside, true)] : []
        return { named: shape.exampleKey, keys }
      }
      const { id, title } = headingOf(path)
      const section =
        of.shape === 'block'
          ? blockSection(of, inside, { id: `${id}-entry`, title: `An entry of ${title}` })
          : describe(of, inside)
      return {
        keys: Object.entries(names).map(([key, doc]) => ({
          ...keyOf(key, of, path, false),
          doc,
          ...(section !== undefined && { section }),
        })),
      }
    })

  /** Describes what is no single value; the id of its section. */
  const describe = (shape: Shape, path: readonly string[]): string | undefined => {
    if (shape.shape === 'field') return undefined
    if (shape.shape === 'block') return blockSection(shape, path)
    if (shape.shape === 'map') return mapSection(shape, path)
    if (shape.shape === 'either') return blockSection(shape.block, path)
    if (shape.shape === 'list')
      return put(shape, path, () => {
        describe(shape.of, [...path, '…'])
        return {}
      })
    for (const [name, branch] of Object.entries(shape.branches)) {
      const heading = { id: idOf([...path, name]), title: name }
      // The key that chooses the branch has one value in it.
      const chosen = (entry: ReferenceKey): ReferenceKey =>
        shape.shape === 'branch by value' && entry.key === shape.by
          ? { ...entry, takes: 'this word', choices: [], example: name }
          : entry
      put(branch, path, () => ({ keys: keysOf(branch, path).map(chosen) }), heading)
    }
    return undefined
  }

  return { blockSection, sections }
}

const kindPage = (kind: VesselKind, sections: readonly ReferenceSection[], vocabulary: Vocabulary): ReferenceKind => {
  const { title, doc, services }: VesselKindDefinition = vesselKinds[kind]
  return {
    kind,
    title,
    doc,
    section: sections.find(({ title: name }) => name === kind)?.id ?? '',
    services,
    sized: vocabulary.kinds.includes(kind),
    example: exampleSpec(kind),
  }
}

/** The reference of the language by section and key, made from the model that reads it. */
export const specReference = (vocabulary: Vocabulary): SpecReference => {
  const { blockSection, sections } = createWriter()
  blockSection(specShape(vocabulary), [])
  return {
    version: specVersion,
    sections,
    kinds: vesselKindNames.map((kind) => kindPage(kind, sections, vocabulary)),
  }
}

import { usualUnits } from '@coldfill/units'
import type { QuantityField } from '../model/field.ts'
import { type BlockShape, docOf, exampleOf, type FieldShape, type Shape } from '../model/shape.ts'
import { specShape } from '../model/spec-shape.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { isService, serviceKeys } from '../model/system.ts'
import { lineStart, type Span } from '../parse/line-index.ts'
import { entryOf, type SourceMap } from '../parse/source-tree.ts'
import { asScalar } from '../read/keys.ts'
import { type Cursor, cursorAt, isProbe } from './cursor.ts'
import { givenNames } from './names.ts'
import { blockFor, type PlaceInLanguage, shapeAt, textBehind } from './shape-at.ts'
import { fittingKinds, freshName, type Snippet, systemSnippets, vesselSnippets } from './snippets.ts'

export interface Completion {
  /** What the list shows. */
  readonly label: string
  /** What is put in place of the typed text. */
  readonly insert: string
  readonly sort: 'key' | 'choice' | 'name' | 'unit' | 'snippet'
  /** Beside the label: an example, or what the key takes. */
  readonly detail: string
  /** One or two sentences that explain it. */
  readonly doc: string
}

export interface Completions {
  /** Offsets of the text that a completion replaces. */
  readonly span: Span
  readonly options: readonly Completion[]
}

const NOTHING: readonly Completion[] = []

const serviceAt = (place: PlaceInLanguage): string | undefined => {
  const system = place.above.find(({ path }) => /^systems\.[^.]+$/u.test(path))
  return textBehind(system?.node, 'service') ?? textBehind(place.node, 'service')
}

/** Keys of `temperatures` and `pressure` that the service of the system uses; undefined where all keys are offered. */
const usedKeys = (place: PlaceInLanguage, path: string): readonly string[] | undefined => {
  const service = serviceAt(place)
  if (service === undefined || !isService(service)) return undefined
  if (/^systems\.[^.]+\.temperatures$/u.test(path)) return serviceKeys[service].temperatures
  return /^systems\.[^.]+\.pressure$/u.test(path) ? serviceKeys[service].pressure : undefined
}

const behindKey = (cursor: Cursor, shape: Shape, indent: string): string => {
  if (cursor.hasColon) return ''
  if (shape.shape === 'field' || shape.shape === 'either') return ': '
  if (cursor.inBraces) return shape.shape === 'list' ? ': []' : ': {  }'
  return shape.shape === 'list' ? `:\n${indent}  - ` : `:\n${indent}  `
}

const indentOf = (text: string, at: number): string => ' '.repeat(Math.max(0, at - lineStart(text, at)))

const keyOption = (text: string, cursor: Cursor, key: string, shape: Shape): Completion => ({
  label: key,
  insert: asScalar(key, cursor.inBraces) + behindKey(cursor, shape, indentOf(text, cursor.span.start)),
  sort: 'key',
  detail: exampleOf(shape),
  doc:
    shape.shape === 'field' && shape.field.fallback !== undefined
      ? `${docOf(shape)} Left out: ${shape.field.fallback}.`
      : docOf(shape),
})

const keysOfBlock = (
  text: string,
  cursor: Cursor,
  block: BlockShape,
  used: readonly string[] | undefined,
  written: ReadonlySet<string>,
): Completion[] => {
  const keys = Object.keys(block.keys).filter((key) => !written.has(key) && (used === undefined || used.includes(key)))
  const order = [...block.required, ...keys].filter(
    (key, index, all) => keys.includes(key) && all.indexOf(key) === index,
  )
  return order.flatMap((key) => {
    const shape = block.keys[key]
    return shape ? [keyOption(text, cursor, key, shape)] : []
  })
}

const writtenKeys = (place: PlaceInLanguage): Set<string> =>
  new Set(place.node?.node === 'map' ? place.node.entries.map(({ key }) => key).filter((key) => !isProbe(key)) : [])

const whole = (detail: string, snippets: readonly Snippet[]): Completion[] =>
  snippets.map(({ label, text, doc }) => ({ label, insert: text, sort: 'snippet', detail, doc }))

/** Marks of all vessels: a mark stands once in a spec. */
const marksIn = (tree: SourceMap): Set<string> =>
  new Set(
    givenNames(tree)
      .filter(({ sort }) => sort === 'vessel')
      .map(({ name }) => name),
  )

const keyOptions = (
  text: string,
  cursor: Cursor,
  place: PlaceInLanguage,
  vocabulary: Vocabulary,
): readonly Completion[] => {
  const { shape } = place
  const written = writtenKeys(place)
  if (shape.shape === 'map') {
    if (shape.names)
      return Object.entries(shape.names)
        .filter(([name]) => !written.has(name))
        .map(([name, doc]) => ({ ...keyOption(text, cursor, name, shape.of), doc }))
    if (/^systems\.[^.]+\.vessels$/u.test(cursor.path))
      return whole('a whole vessel', vesselSnippets(vocabulary, serviceAt(place), marksIn(cursor.tree)))
    if (cursor.path === 'systems' && !cursor.inBraces)
      return whole(
        'a whole system',
        systemSnippets(vocabulary, { ids: written, marks: marksIn(cursor.tree) }, indentOf(text, cursor.span.start)),
      )
    const name = freshName(shape.exampleKey, written)
    return [{ ...keyOption(text, cursor, name, shape.of), sort: 'snippet' }]
  }
  if (shape.shape === 'list') return NOTHING
  const block = blockFor(shape, place.node)
  if (block) return keysOfBlock(text, cursor, block, usedKeys(place, cursor.path), written)
  if (shape.shape === 'branch by value') {
    const lead = Object.values(shape.branches)[0]?.keys[shape.by]
    return lead ? [keyOption(text, cursor, shape.by, lead)] : NOTHING
  }
  if (shape.shape !== 'branch by key') return NOTHING
  return Object.entries(shape.branches).flatMap(([key, branch]) => {
    const lead = branch.keys[key]
    return lead ? [{ ...keyOption(text, cursor, key, lead), detail: branch.example, doc: branch.doc }] : []
  })
}

const choiceOptions = (choices: Readonly<Record<string, string>>, sort: Completion['sort']): Completion[] =>
  Object.entries(choices).map(([label, doc]) => ({ label, insert: label, sort, detail: '', doc }))

/** The number that is typed with each unit that fits; the example where no number is typed. */
const unitOptions = (field: QuantityField, typed: string): Completion[] => {
  const number = /^\s*([+-]?(?:\d+\.?\d*|\.\d+))/u.exec(typed)?.[1]
  const units = [...new Set(field.kinds.flatMap((kind) => usualUnits(kind)))]
  if (number === undefined)
    return [{ label: field.example, insert: field.example, sort: 'unit', detail: 'for example', doc: field.doc }]
  return units.map((unit) => ({
    label: `${number} ${unit}`,
    insert: `${number} ${unit}`,
    sort: 'unit',
    detail: '',
    doc: field.doc,
  }))
}

const fluidNames = (tree: SourceMap): Readonly<Record<string, string>> => {
  const fluids = entryOf(tree, 'fluids')?.value
  const ids = fluids?.node === 'map' ? fluids.entries : []
  return Object.fromEntries([
    ...ids.map(({ key, value }) => [
      key,
      [textBehind(value, 'base'), textBehind(value, 'strength')].filter((part) => part !== undefined).join(', '),
    ]),
    ['water', 'no additive'],
  ])
}

const sizeNames = (vocabulary: Vocabulary, place: PlaceInLanguage): Readonly<Record<string, string>> => {
  const family = textBehind(place.above.at(-1)?.node, 'pipe') ?? ''
  const sizes = Object.hasOwn(vocabulary.pipes, family) ? (vocabulary.pipes[family] ?? []) : []
  return Object.fromEntries(sizes.map(({ size }) => [size, family]))
}

const fieldOptions = (
  cursor: Cursor,
  place: PlaceInLanguage,
  shape: FieldShape,
  vocabulary: Vocabulary,
): readonly Completion[] => {
  const { field, names, refersTo } = shape
  if (refersTo === 'fluid') return choiceOptions(fluidNames(cursor.tree), 'name')
  if (refersTo === 'pipe size') return choiceOptions(sizeNames(vocabulary, place), 'name')
  if (/\.kind$/u.test(cursor.path) && field.field === 'choice') {
    const fit: readonly string[] = fittingKinds(vocabulary, serviceAt(place))
    return choiceOptions(
      Object.fromEntries(Object.entries(field.choices).filter(([kind]) => fit.includes(kind))),
      'choice',
    )
  }
  if (names) return choiceOptions(names, field.field === 'choice' ? 'choice' : 'name')
  if (field.field === 'choice') return choiceOptions(field.choices, 'choice')
  if (field.field === 'yes or no') return choiceOptions({ yes: field.doc, no: field.doc }, 'choice')
  return field.field === 'quantity' ? unitOptions(field, cursor.typed) : NOTHING
}

const valueOptions = (cursor: Cursor, place: PlaceInLanguage, vocabulary: Vocabulary): readonly Completion[] => {
  const { shape } = place
  if (shape.shape === 'field') return fieldOptions(cursor, place, shape, vocabulary)
  if (shape.shape !== 'either') return NOTHING
  const block: Completion = {
    label: shape.block.example,
    insert: shape.block.example,
    sort: 'snippet',
    detail: '',
    doc: shape.block.doc,
  }
  return [...fieldOptions(cursor, place, shape.text, vocabulary), block]
}

/** What can be typed at an offset: keys of the place, choices, names defined elsewhere, units. Null where nothing can. */
export const completionsAt = (text: string, offset: number, vocabulary: Vocabulary): Completions | null => {
  const cursor = cursorAt(text, offset)
  const place = cursor && shapeAt(specShape(vocabulary), cursor.tree, cursor.path)
  if (!cursor || !place) return null
  const options =
    cursor.part === 'key' ? keyOptions(text, cursor, place, vocabulary) : valueOptions(cursor, place, vocabulary)
  if (options.length === 0) return null
  const glued = cursor.part === 'value' && text.charAt(cursor.span.start - 1) === ':'
  return {
    span: cursor.span,
    options: glued ? options.map((each) => ({ ...each, insert: ` ${each.insert}` })) : options,
  }
}

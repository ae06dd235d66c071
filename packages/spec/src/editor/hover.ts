import { usualUnits } from '@coldfill/units'
import type { Range } from '../finding.ts'
import { docOf, exampleOf, type FieldShape, type Shape } from '../model/shape.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import { treeForHelp } from '../parse/recent.ts'
import { pathAtOffset, placeOf } from '../parse/path.ts'
import { indexLines } from '../parse/line-index.ts'
import { blockFor, shapeAt } from './shape-at.ts'

/** What is said of a key or a value. */
export interface Hover {
  readonly path: string
  readonly range: Range
  /** The key, id or mark. */
  readonly title: string
  /** What the key means. */
  readonly doc: string
  readonly example: string
  /** Units that are mostly written, where the value has one. */
  readonly units: readonly string[]
  /** What holds where the key is left out. */
  readonly fallback?: string
  /** What the value at the cursor means, where it is a choice or a name. */
  readonly value?: { readonly text: string; readonly doc: string }
}

const fieldOf = (shape: Shape): FieldShape | undefined =>
  shape.shape === 'field' ? shape : shape.shape === 'either' ? shape.text : undefined

const meaning = (field: FieldShape | undefined, text: string | undefined): Hover['value'] => {
  if (!field || text === undefined) return undefined
  const choices = field.names ?? (field.field.field === 'choice' ? field.field.choices : {})
  const doc = Object.hasOwn(choices, text) ? choices[text] : undefined
  return doc === undefined ? undefined : { text, doc }
}

/** What the language says of the key or value at an offset. Null outside of both. */
export const hoverAt = (text: string, offset: number, vocabulary: Vocabulary): Hover | null => {
  const tree = treeForHelp(text)
  if (!tree) return null
  const { path, part } = pathAtOffset(tree, offset)
  const found = placeOf(tree, path)
  const place = path === '' || part === 'between' ? undefined : shapeAt(specShape(vocabulary), tree, path)
  if (!place || !found) return null
  const field = fieldOf(place.shape)
  const shape = blockFor(place.shape, place.node) ?? place.shape
  const key = text.slice(found.keySpan.start, found.keySpan.end)
  const parent = place.above.at(-1)
  const named = parent && shapeAt(specShape(vocabulary), tree, parent.path)?.shape
  const nameDoc =
    named?.shape === 'map' && named.names && Object.hasOwn(named.names, key) ? named.names[key] : undefined
  const value = meaning(field, place.node?.node === 'text' ? place.node.text.trim() : undefined)
  const fallback = field?.field.fallback
  const span = part === 'value' && found.value ? found.value.span : found.keySpan
  return {
    path,
    range: indexLines(text).range(span),
    title: key,
    doc: nameDoc ?? docOf(shape),
    example: exampleOf(shape),
    units: field?.field.field === 'quantity' ? [...new Set(field.field.kinds.flatMap((kind) => usualUnits(kind)))] : [],
    ...(fallback !== undefined && { fallback }),
    ...(value && { value }),
  }
}

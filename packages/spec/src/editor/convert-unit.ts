import {
  fromSi,
  isKind,
  type Kind,
  matchUnit,
  parseQuantity,
  printedUnit,
  toSi,
  type Unit,
  usualUnits,
} from '@coldfill/units'
import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import type { Span } from '../parse/line-index.ts'
import { pathAtOffset, placeOf } from '../parse/path.ts'
import type { SourceMap } from '../parse/source-tree.ts'
import { shapeAt } from './shape-at.ts'

export interface Conversion {
  readonly span: Span
  /** As it would be written: `82.2 °C`. */
  readonly text: string
}

const decimalsOf = (number: string): number => /\.(\d+)/u.exec(number)?.[1]?.length ?? 0

const MOST_DIGITS = 12

const plain = (value: number): string => {
  const text = String(value)
  return text.includes('e') ? value.toFixed(Math.abs(value) < 1 ? MOST_DIGITS : 0) : text
}

/** The fewest digits with which the number, turned back, is the typed one to a twentieth of its last place and to a thousandth. */
const converted = (si: number, from: Unit, to: Unit, typed: string): string => {
  const wanted = fromSi(si, from)
  const part = from.offset === 0 && to.offset === 0 ? 0.001 * Math.abs(wanted) : Infinity
  const allowed = Math.min(0.05 * 10 ** -decimalsOf(typed), part) + 1e-12
  const exact = fromSi(si, to)
  for (let digits = 1; digits < MOST_DIGITS; digits++) {
    const rounded = Number(exact.toPrecision(digits))
    if (Math.abs(fromSi(toSi(rounded, to), from) - wanted) <= allowed) return plain(rounded)
  }
  return plain(Number(exact.toPrecision(MOST_DIGITS)))
}

const kindsAt = (tree: SourceMap, path: string, vocabulary: Vocabulary): readonly Kind[] => {
  const place = shapeAt(specShape(vocabulary), tree, path)
  const field = place?.shape.shape === 'field' ? place.shape.field : undefined
  if (field?.field === 'quantity') return field.kinds
  // The value of an assumption has the kinds of the assumption that it replaces.
  const parent = place?.above.at(-1)?.path ?? ''
  const id = parent.startsWith('assumptions.') && path === `${parent}.value` ? parent.slice('assumptions.'.length) : ''
  const known = Object.hasOwn(vocabulary.assumptions, id) ? vocabulary.assumptions[id] : undefined
  return known?.choices ? [] : (known?.kinds.filter((kind) => isKind(kind)) ?? [])
}

/** The quantity at an offset in each other unit in which its kind is mostly written. Empty where none stands. */
export const conversionsAt = (tree: SourceMap, offset: number, vocabulary: Vocabulary): readonly Conversion[] => {
  const { path, part } = pathAtOffset(tree, offset)
  const value = part === 'between' ? undefined : placeOf(tree, path)?.value
  if (value?.node !== 'text') return []
  const kinds = kindsAt(tree, path, vocabulary)
  const typed = value.text.trim()
  const reading = parseQuantity(typed, kinds)
  const number = /^[+-]?(?:\d+\.?\d*|\.\d+)/u.exec(typed)?.[0]
  if (!reading.ok || number === undefined) return []
  const { quantity, unit } = reading
  return usualUnits(quantity.kind).flatMap((spelling) => {
    const to = matchUnit(spelling, quantity.kind)
    if (!to || to.symbol === unit.symbol || printedUnit(to) === '') return []
    return [{ span: value.span, text: `${converted(quantity.value, unit, to, number)} ${spelling}` }]
  })
}

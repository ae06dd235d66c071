import type { Difference } from '../compare/differences.ts'
import { flowText } from '../compare/flow-text.ts'
import { type Slot, slotsIn } from '../compare/slots.ts'
import { columnOf, ending, inline, linesOf, movedLines } from './entry-source.ts'

/** A text that a difference is put into, with the places that belong to those of the difference. */
export interface Target {
  readonly text: string
  /** What the difference changes or takes out; undefined where it puts something in. */
  readonly slot: Slot | undefined
  /** The block that something is put into. */
  readonly parent: { readonly node: Slot['parent']; readonly path: string } | undefined
  /** The slot behind which it comes; undefined where it comes first. */
  readonly before: Slot | undefined
}

const replaced = (text: string, start: number, end: number, put: string): string =>
  text.slice(0, start) + put + text.slice(end)

const takenOut = (text: string, slot: Slot): string | null => {
  const siblings = slotsIn(slot.parent, slot.parentPath)
  if (siblings.length < 2) return null
  const lines = linesOf(text, slot)
  if (lines) return replaced(text, lines.start, lines.end, '')
  if (!slot.parent.flow) return null
  const [previous, next] = [siblings[slot.index - 1], siblings[slot.index + 1]]
  if (previous) return replaced(text, ending(text, previous), ending(text, slot), '')
  return next ? replaced(text, slot.keySpan.start, next.keySpan.start, '') : null
}

const changed = (text: string, slot: Slot, from: string, now: Slot): string | null => {
  const { value } = slot
  // A text stays as its author wrote it, quotation marks and all; in braces it may need some.
  if (value?.node === 'text' && now.value?.node === 'text') {
    const { start, end } = now.value.span
    const written = from.slice(start, end)
    const put =
      slot.parent.flow && !now.parent.flow && !now.value.quoted ? inline({ ...now, key: null }, true) : written
    return replaced(text, value.span.start, value.span.end, put)
  }
  const lines = linesOf(text, slot)
  if (lines) return replaced(text, lines.start, lines.end, movedLines(from, now, columnOf(text, slot)))
  if (!slot.parent.flow) return null
  return replaced(text, slot.keySpan.start, ending(text, slot), inline(now, true))
}

const putIn = (text: string, { parent, before }: Target, from: string, now: Slot): string | null => {
  if (!parent) return null
  const siblings = slotsIn(parent.node, parent.path)
  const [first] = siblings
  if (!first) return null
  if (parent.node.flow) {
    const at = before ? ending(text, before) : first.keySpan.start
    return replaced(text, at, at, before ? `, ${inline(now, true)}` : `${inline(now, true)}, `)
  }
  const anchor = linesOf(text, before ?? first)
  if (!anchor) return null
  const lines = movedLines(from, now, columnOf(text, first))
  if (!before) return replaced(text, anchor.start, anchor.start, lines)
  const feed = text.charAt(anchor.end - 1) === '\n' ? '' : '\n'
  return replaced(text, anchor.end, anchor.end, feed + lines)
}

/** The text with a difference made in it that stands in `from`. Null where its place is not there or cannot be written at. */
export const putDifference = (target: Target, from: string, { now }: Difference): string | null => {
  const { text, slot } = target
  if (!now) return slot ? takenOut(text, slot) : null
  if (slot) return flowText(slot.value) === flowText(now.value) ? text : changed(text, slot, from, now)
  return putIn(text, target, from, now)
}

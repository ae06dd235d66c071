import { numberText } from '../value-text.ts'
import type { Scale } from './scale.ts'
import { line, PEN, text, wordsWidth, type Palette, type Shape } from './shape.ts'

/** The field of a drawing, and how far names above it may reach. */
export interface Frame {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
  readonly width: number
}

/** Where the title of the axis at the left stands. */
const TITLE = 18

/** Least width at which a drawing can be read. */
const LEAST = 300

/** A field with room for the axis at the left and for names at the right; `names` are what stands there. */
export const frameOf = (
  width: number,
  height: number,
  {
    names,
    rows,
    left = 64,
  }: {
    readonly names: readonly string[]
    /** Rows of settings that are named above the field. */
    readonly rows: number
    readonly left?: number
  },
): Frame => {
  const across = Math.max(LEAST, width)
  const room = Math.min(across * 0.34, Math.max(84, ...names.map((name) => wordsWidth(name) + 14)))
  const isNarrow = across < 480
  return {
    left: isNarrow ? Math.min(left, 44) : left,
    right: across - (isNarrow ? room : Math.max(room, 120)),
    // The title of the axis stands above the rows.
    top: 32 + 16 * rows,
    bottom: height - 48,
    width: across,
  }
}

/** Marks that an axis of this length has room for. */
export const marksAcross = ({ left, right }: Frame): number => Math.max(3, Math.round((right - left) / 62))

/** Axis along the bottom with its ticks and title, and hair lines up from each tick. */
export const bottomAxis = (
  scale: Scale,
  { left, right, top, bottom, width }: Frame,
  title: string,
  { ink, pencil, hair }: Palette,
): Shape[] => [
  ...scale.ticks.map((tick) =>
    line(scale.at(tick), top, scale.at(tick), bottom, { stroke: hair, strokeWidth: PEN.hair }),
  ),
  line(left, bottom, right, bottom, { stroke: ink, strokeWidth: PEN.fine }),
  ...scale.ticks.map((tick) =>
    text(scale.at(tick), bottom + 16, numberText(tick), { textAnchor: 'middle', fill: pencil }),
  ),
  text(Math.min(width - 4, Math.max(right, left + wordsWidth(title) + 8)), bottom + 34, title, {
    textAnchor: 'end',
    fill: ink,
    fontWeight: 600,
  }),
]

/** Axis at the left with its ticks, its title above it, and hair lines from each tick. */
export const leftAxis = (
  scale: Scale,
  { left, right, top, bottom }: Frame,
  title: string,
  { ink, pencil, hair }: Palette,
): Shape[] => [
  ...scale.ticks.map((tick) =>
    line(left, scale.at(tick), right, scale.at(tick), { stroke: hair, strokeWidth: PEN.hair }),
  ),
  line(left, top, left, bottom, { stroke: ink, strokeWidth: PEN.fine }),
  ...scale.ticks.map((tick) =>
    text(left - 8, scale.at(tick) + 4, numberText(tick), { textAnchor: 'end', fill: pencil }),
  ),
  text(left > 44 ? 12 : 4, TITLE, title, { fill: ink, fontWeight: 600 }),
]

/** An upright line at a setting, dashed in its own way, with its name above it; `row` lifts the name over another. */
export const setting = (
  x: number,
  { left, top, bottom, width }: Frame,
  name: string,
  dashes: string,
  { ink }: Palette,
  row = 0,
): Shape[] => {
  const half = wordsWidth(name) / 2
  return [
    line(x, top, x, bottom, { stroke: ink, strokeWidth: PEN.medium, strokeDasharray: dashes }),
    text(Math.min(width - half - 2, Math.max(left + half, x)), top - 6 - 16 * row, name, {
      textAnchor: 'middle',
      fill: ink,
    }),
  ]
}

export interface SideLabel {
  readonly name: string
  readonly at: number
  readonly weight: 400 | 600
}

/** Names to the right of a frame, each as near to its height as the others leave room for. */
export const sideLabels = (labels: readonly SideLabel[], { right }: Frame, { ink }: Palette): Shape[] => {
  let lowest = -Infinity
  return labels
    .toSorted((a, b) => a.at - b.at)
    .map(({ name, at, weight }) => {
      lowest = Math.max(at, lowest + 15)
      return text(right + 8, lowest + 4, name, { fill: ink, fontWeight: weight })
    })
}

/** A solid dot with `filled`, else a ring. */
export const dot = (x: number, y: number, colour: string, filled: boolean, { ground }: Palette): Shape => ({
  name: 'circle',
  attributes: { cx: x, cy: y, r: 5, fill: filled ? colour : ground, stroke: colour, strokeWidth: PEN.medium },
})

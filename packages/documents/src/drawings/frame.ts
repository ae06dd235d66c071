import { HAIR, INK, PENCIL } from '../look.ts'
import { numberText } from '../calculation/value-text.ts'
import type { Scale } from './scale.ts'
import { line, PEN, text } from './svg.ts'

const hash = (colour: string) => `#${colour}`
export const COLOUR = { ink: hash(INK), pencil: hash(PENCIL), hair: hash(HAIR) } as const

export interface Frame {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

/** Axis along the bottom with its ticks and title, and hair lines up from each tick. */
export const bottomAxis = (scale: Scale, { left, right, top, bottom }: Frame, title: string): string[] => [
  ...scale.ticks.map((tick) =>
    line(scale.at(tick), top, scale.at(tick), bottom, { stroke: COLOUR.hair, 'stroke-width': PEN.hair }),
  ),
  line(left, bottom, right, bottom, { stroke: COLOUR.ink, 'stroke-width': PEN.fine }),
  ...scale.ticks.map((tick) =>
    text(scale.at(tick), bottom + 16, numberText(tick), { 'text-anchor': 'middle', fill: COLOUR.pencil }),
  ),
  text(right, bottom + 34, title, { 'text-anchor': 'end', fill: COLOUR.ink, 'font-weight': 600 }),
]

/** Axis at the left with its ticks, its title above it, and hair lines from each tick. */
export const leftAxis = (scale: Scale, { left, right, top, bottom }: Frame, title: string): string[] => [
  ...scale.ticks.map((tick) =>
    line(left, scale.at(tick), right, scale.at(tick), { stroke: COLOUR.hair, 'stroke-width': PEN.hair }),
  ),
  line(left, top, left, bottom, { stroke: COLOUR.ink, 'stroke-width': PEN.fine }),
  ...scale.ticks.map((tick) =>
    text(left - 8, scale.at(tick) + 4, numberText(tick), { 'text-anchor': 'end', fill: COLOUR.pencil }),
  ),
  text(12, top - 24, title, { fill: COLOUR.ink, 'font-weight': 600 }),
]

/** An upright line at a setting, dashed in its own way, with its name above it; `row` lifts the name over another. */
export const setting = (x: number, { top, bottom }: Frame, name: string, dashes: string, row = 0): string[] => [
  line(x, top, x, bottom, { stroke: COLOUR.ink, 'stroke-width': PEN.medium, 'stroke-dasharray': dashes }),
  text(x, top - 6 - 16 * row, name, { 'text-anchor': 'middle', fill: COLOUR.ink }),
]

export interface SideLabel {
  readonly name: string
  readonly at: number
  readonly weight: 400 | 600
}

/** Names to the right of a frame, each as near to its height as the others leave room for. */
export const sideLabels = (labels: readonly SideLabel[], { right }: Frame): string[] => {
  let lowest = -Infinity
  return labels
    .toSorted((a, b) => a.at - b.at)
    .map(({ name, at, weight }) => {
      lowest = Math.max(at, lowest + 15)
      return text(right + 8, lowest + 4, name, { fill: COLOUR.ink, 'font-weight': weight })
    })
}

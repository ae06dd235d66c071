import type { SystemResult, VesselResult } from '@coldfill/sizing'
import { unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber } from '../display-number.ts'
import { numberText } from '../value-text.ts'
import { bottomAxis, dot, frameOf, leftAxis, marksAcross, setting, sideLabels, type Frame } from './frame.ts'
import { scaleOver, type Scale } from './scale.ts'
import { line, PEN, pointsOf, shape, text, wordsWidth, type Drawing, type DrawingLook, type Shape } from './shape.ts'

const said = (value: number): string => numberText(Number(value.toPrecision(3)))

/** Least rated pressure of the vessels chosen for a system, gauge Pa. */
const ratingOf = (system: SystemResult, vessels: readonly VesselResult[]) =>
  vessels
    .filter((vessel) => vessel.system === system.id && vessel.selected !== null)
    .map(({ mark, selected }) => ({ mark, pressure: selected?.maxPressure ?? Infinity }))
    .sort((a, b) => a.pressure - b.pressure)[0]

interface Point {
  readonly label: string
  readonly height: number
  readonly cold: number
  readonly hot: number
}

interface Field {
  readonly frame: Frame
  readonly across: Scale
  readonly up: Pick<Scale, 'at'>
  /** False where everything stands at one height, and there is no axis for it. */
  readonly tall: boolean
}

/**
 * A value beside its dot. A line falls to the right from its highest point, so there the value stands left of it, elsewhere
 * below to the right; where all is at one height, below.
 */
const reading = (x: number, y: number, words: string, isTop: boolean, tall: boolean, fill: string): Shape => {
  if (!tall) return text(x, y + 22, words, { textAnchor: 'middle', fill })
  return isTop
    ? text(x - 11, y + 4, words, { textAnchor: 'end', fill })
    : text(x + 8, y + 17, words, { textAnchor: 'start', fill })
}

const lineOf = (
  which: 'cold' | 'hot',
  points: readonly Point[],
  { frame, across, up, tall }: Field,
  { palette }: DrawingLook,
): Shape[] => {
  const colour = which === 'cold' ? palette.steel : palette.ink
  const place = (point: Point) => [across.at(point[which]), up.at(point.height)] as const
  const top = points.at(-1)
  return [
    ...(points.length > 1
      ? [
          shape('polyline', {
            points: pointsOf(points.map(place)),
            fill: 'none',
            stroke: colour,
            strokeWidth: PEN.heavy,
            ...(which === 'hot' ? { strokeDasharray: '9 4' } : {}),
          }),
        ]
      : []),
    ...points.flatMap((point) => {
      const [x, y] = place(point)
      const words = said(point[which])
      // A value at the left edge has no room left of its dot.
      const isLeft = point === top && x - 11 - wordsWidth(words) >= frame.left
      return [dot(x, y, colour, which === 'hot', palette), reading(x, y, words, isLeft, tall, palette.ink)]
    }),
    ...(top
      ? [
          text(across.at(top[which]), up.at(top.height) - 12, which === 'cold' ? 'Cold' : 'Hot', {
            textAnchor: 'middle',
            fill: colour,
            fontWeight: 600,
          }),
        ]
      : []),
  ]
}

/** A relief valve: a solid diamond where it stands. */
const valve = (x: number, y: number, fill: string): Shape =>
  shape('path', { d: `M${x.toFixed(2)} ${(y - 7).toFixed(2)}l6 7l-6 7l-6 -7z`, fill })

/**
 * Pressure against height of a system, cold and hot, with its relief valve and the rating of its chosen vessel. Null where no
 * vessel holds the pressure.
 */
export const drawPressures = (
  system: SystemResult,
  units: UnitSystem,
  look: DrawingLook,
  vessels: readonly VesselResult[] = [],
): Drawing | null => {
  if (system.pressures.length === 0) return null
  const { palette } = look
  const pressure = (value: number) => displayNumber(value, 'gauge pressure', units)
  const unit = unitLabel('gauge pressure', units)
  const points = system.pressures
    .map(({ label, height, cold, hot }) => ({
      label,
      height: displayNumber(height, 'length', units),
      cold: pressure(cold),
      hot: pressure(hot),
    }))
    .sort((a, b) => a.height - b.height)
  const relief = system.relief && {
    set: pressure(system.relief.set),
    height: displayNumber(system.relief.height, 'length', units),
  }
  const found = ratingOf(system, vessels)
  const rating = found && { mark: found.mark, pressure: pressure(found.pressure) }
  const heights = [0, ...points.map((point) => point.height), ...(relief ? [relief.height] : [])]
  const tall = Math.max(...heights) > Math.min(...heights)

  const height = tall ? 320 : 190
  const frame = frameOf(look.width, height, {
    names: points.map((point) => point.label),
    ...(tall ? {} : { left: 24 }),
  })
  const shown = [0, ...points.flatMap((point) => [point.cold, point.hot]), ...(relief ? [relief.set] : [])]
  // A rating far above everything else would press the rest together: then it is said and not drawn.
  const far = rating !== undefined && rating.pressure > 1.8 * Math.max(...shown)
  const across = scaleOver(
    [...shown, ...(rating && !far ? [rating.pressure] : [])],
    frame.left + (tall ? 0 : 10),
    frame.right,
    marksAcross(frame),
  )
  const up = tall
    ? scaleOver(heights, frame.bottom - 24, frame.top + 26, 6)
    : { ...scaleOver([-1, 1], frame.bottom, frame.top, 2), ticks: [] }
  const field: Field = { frame, across, up, tall }

  const way = (key: 'cold' | 'hot') => points.map((point) => `${said(point[key])} ${unit} at ${point.label}`).join(', ')
  const words = [
    `Cold ${way('cold')}.`,
    `Hot ${way('hot')}.`,
    ...(relief ? [`Relief valve set at ${said(relief.set)} ${unit}.`] : []),
    ...(rating ? [`${rating.mark} is rated ${said(rating.pressure)} ${unit}.`] : []),
  ].join(' ')

  const shapes = [
    ...(tall ? leftAxis(up, frame, `Height above the vessel (${unitLabel('length', units)})`, palette) : []),
    ...bottomAxis(across, frame, `Gauge pressure (${unit})`, palette),
    ...(across.least < 0
      ? [
          line(across.at(0), frame.top, across.at(0), frame.bottom, {
            stroke: palette.pencil,
            strokeWidth: PEN.fine,
            strokeDasharray: '10 3 2 3',
          }),
          text(across.at(0) + 5, frame.bottom - 6, 'Atmosphere', { fill: palette.pencil }),
        ]
      : []),
    ...points.map((point) =>
      line(tall ? across.at(point.hot) : frame.left, up.at(point.height), frame.right, up.at(point.height), {
        stroke: palette.pencil,
        strokeWidth: PEN.hair,
        strokeDasharray: '2 3',
      }),
    ),
    ...sideLabels(
      points.map((point) => ({ name: point.label, at: up.at(point.height), weight: 400 })),
      frame,
      palette,
    ),
    ...(relief ? setting(across.at(relief.set), frame, `Relief ${said(relief.set)}`, '12 4 2 4', palette) : []),
    ...(rating && !far
      ? setting(across.at(rating.pressure), frame, `${rating.mark} rated ${said(rating.pressure)}`, '2 4', palette, 1)
      : []),
    ...(rating && far
      ? [
          text(frame.right, frame.top - 22, `${rating.mark} rated ${said(rating.pressure)}, off the scale`, {
            textAnchor: 'end',
            fill: palette.ink,
          }),
        ]
      : []),
    ...lineOf('cold', points, field, look),
    ...lineOf('hot', points, field, look),
    ...(relief ? [valve(across.at(relief.set), up.at(relief.height), palette.ink)] : []),
  ]
  return { title: `${system.title}: pressure against height`, words, width: frame.width, height, shapes }
}

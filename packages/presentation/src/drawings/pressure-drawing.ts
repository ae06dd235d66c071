import type { SystemResult, VesselResult } from '@coldfill/sizing'
import { unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber } from '../display-number.ts'
import { numberText } from '../value-text.ts'
import { bottomAxis, dot, frameOf, leftAxis, marksAcross, setting, sideLabels, type Frame } from './frame.ts'
import { scaleOver, type Scale } from './scale.ts'
import {
  halo,
  line,
  type Palette,
  PEN,
  pointsOf,
  shape,
  text,
  wordsWidth,
  type Drawing,
  type DrawingLook,
  type Shape,
} from './shape.ts'

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
  /** While the pump runs; null where there is none. */
  readonly running: number | null
}

/** The state that counts: the lowest pressure is that of the cold suction side, the highest that of the hot discharge side. */
const runningState = (moves: 'suction side' | 'discharge side'): string =>
  moves === 'suction side' ? 'cold and at its least' : 'hot and at its most'

interface Field {
  readonly frame: Frame
  readonly across: Scale
  readonly up: Pick<Scale, 'at'>
  /** False where everything stands at one height, and there is no axis for it. */
  readonly tall: boolean
  /** Place of the line of the relief valve, null where there is none. */
  readonly relief: number | null
}

/** Middle of a name over a line, moved where the line of the relief valve would run through it. */
const clearOf = (relief: number | null, x: number, name: string): number => {
  const room = wordsWidth(name) / 2 + 6
  if (relief === null || Math.abs(relief - x) >= room) return x
  return x <= relief ? relief - room : relief + room
}

interface Dot {
  readonly x: number
  readonly y: number
  readonly words: string
  /** Of the lowest point, where the lines end. */
  readonly isLowest: boolean
}

/** Places across of the dots at a height. */
const dotsAt = (height: number, points: readonly Point[], { across }: Field): readonly number[] =>
  points
    .filter((point) => point.height === height)
    .flatMap(({ cold, hot, running }) => [cold, hot, ...(running === null ? [] : [running])])
    .map((pressure) => across.at(pressure))

/**
 * A value beside its dot. A line falls to the right, so a value stands left of it where neither the edge nor another dot is in
 * the way, and else below, as that of the lowest point does; where all is at one height, under its dot.
 */
const reading = (
  { x, y, words, isLowest }: Dot,
  others: readonly number[],
  { frame, tall }: Field,
  fill: string,
  palette: Palette,
): Shape => {
  const ink = { fill, ...halo(palette) }
  const width = wordsWidth(words)
  if (!tall) return text(x, y + 22, words, { textAnchor: 'middle', ...ink })
  const end = x - 11 - width
  if (!isLowest && end >= frame.left && !others.some((other) => other < x && other + 8 > end))
    return text(x - 11, y + 4, words, { textAnchor: 'end', ...ink })
  // The value of the dot before it stands below to the right, where there is no room for two.
  const level = isLowest && others.some((other) => other < x && other + width + 12 > x) ? y - 8 : y + 17
  return x + 8 + width <= frame.right
    ? text(x + 8, level, words, { textAnchor: 'start', ...ink })
    : text(x - 8, level, words, { textAnchor: 'end', ...ink })
}

/** Above the highest dot of a line. */
const NAME_RISE = 12
/** Where another name is in the way. */
const SECOND_ROW = 14

const lineOf = (which: 'cold' | 'hot', points: readonly Point[], field: Field, { palette }: DrawingLook): Shape[] => {
  const { across, up, relief } = field
  const colour = which === 'cold' ? palette.steel : palette.ink
  const name = which === 'cold' ? 'Cold' : 'Hot'
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
      const value = { x, y, words: said(point[which]), isLowest: point === points[0] }
      return [
        dot(x, y, colour, which === 'hot', palette),
        reading(value, dotsAt(point.height, points, field), field, palette.ink, palette),
      ]
    }),
    ...(top
      ? [
          text(clearOf(relief, across.at(top[which]), name), up.at(top.height) - NAME_RISE, name, {
            textAnchor: 'middle',
            fill: colour,
            fontWeight: 600,
            ...halo(palette),
          }),
        ]
      : []),
  ]
}

/** The side of the pump that moves, while it runs: a fine line, read at its ends. */
const runningLine = (points: readonly Point[], field: Field, { palette }: DrawingLook): Shape[] => {
  const { across, up, relief } = field
  const placed = points.flatMap(({ running, height }) =>
    running === null ? [] : [{ x: across.at(running), y: up.at(height), height, words: said(running) }],
  )
  const [first] = placed
  const last = placed.at(-1)
  const top = points.at(-1)
  if (!first || !last || !top) return []
  const name = 'Pump on'
  const x = clearOf(relief, last.x, name)
  const crowded = (['cold', 'hot'] as const).some(
    (other) => Math.abs(across.at(top[other]) - x) < (wordsWidth(name) + wordsWidth(other)) / 2 + 8,
  )
  return [
    ...(placed.length > 1
      ? [
          shape('polyline', {
            points: pointsOf(placed.map((place) => [place.x, place.y] as const)),
            fill: 'none',
            stroke: palette.pencil,
            strokeWidth: PEN.medium,
            strokeDasharray: '2 4',
          }),
        ]
      : []),
    ...(first === last ? [first] : [first, last]).flatMap((place) => [
      dot(place.x, place.y, palette.pencil, true, palette),
      reading(
        { ...place, isLowest: place === first },
        dotsAt(place.height, points, field),
        field,
        palette.pencil,
        palette,
      ),
    ]),
    text(x, last.y - NAME_RISE - (crowded ? SECOND_ROW : 0), name, {
      textAnchor: 'middle',
      fill: palette.pencil,
      fontWeight: 600,
      ...halo(palette),
    }),
  ]
}

/** A relief valve: a solid diamond where it stands. */
const valve = (x: number, y: number, fill: string): Shape =>
  shape('path', { d: `M${x.toFixed(2)} ${(y - 7).toFixed(2)}l6 7l-6 7l-6 -7z`, fill })

/**
 * Pressure against height of a system, cold and hot, and on the side of the pump that moves while it runs, with the relief
 * valve and the rating of the chosen vessel. Null where no vessel holds the pressure.
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
    .map(({ label, height, cold, hot, running }) => ({
      label,
      height: displayNumber(height, 'length', units),
      cold: pressure(cold),
      hot: pressure(hot),
      running: running === undefined ? null : pressure(running),
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
    rows: rating ? 2 : 1,
    ...(tall ? {} : { left: 24 }),
  })
  const shown = [
    0,
    ...points.flatMap(({ cold, hot, running }) => [cold, hot, ...(running === null ? [] : [running])]),
    ...(relief ? [relief.set] : []),
  ]
  // A rating far above everything else would press the rest together: then it is said and not drawn.
  const far = rating !== undefined && rating.pressure > 1.8 * Math.max(...shown)
  const across = scaleOver(
    [...shown, ...(rating && !far ? [rating.pressure] : [])],
    frame.left + (tall ? 0 : 10),
    frame.right,
    marksAcross(frame),
  )
  const up = tall
    ? scaleOver(heights, frame.bottom - 24, frame.top + 26 + (system.pump ? SECOND_ROW : 0), 6)
    : { ...scaleOver([-1, 1], frame.bottom, frame.top, 2), ticks: [] }
  const field: Field = { frame, across, up, tall, relief: relief ? across.at(relief.set) : null }

  const way = (key: 'cold' | 'hot' | 'running') =>
    points.map((point) => `${said(point[key] ?? 0)} ${unit} at ${point.label}`).join(', ')
  const words = [
    `Cold ${way('cold')}.`,
    `Hot ${way('hot')}.`,
    ...(system.pump
      ? [`With the pump on, its ${system.pump.moves}, ${runningState(system.pump.moves)}: ${way('running')}.`]
      : []),
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
    ...runningLine(points, field, look),
    ...lineOf('cold', points, field, look),
    ...lineOf('hot', points, field, look),
    ...(relief ? [valve(across.at(relief.set), up.at(relief.height), palette.ink)] : []),
  ]
  return { title: `${system.title}: pressure against height`, words, width: frame.width, height, shapes }
}

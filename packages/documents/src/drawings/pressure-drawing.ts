import type { SystemResult, VesselResult } from '@coldfill/sizing'
import { unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber } from '../calculation/display-number.ts'
import { numberText } from '../calculation/value-text.ts'
import { STEEL } from '../look.ts'
import { bottomAxis, COLOUR, leftAxis, setting, sideLabels, type Frame } from './frame.ts'
import { scaleOver } from './scale.ts'
import { drawing, element, line, PEN, text, type Drawing } from './svg.ts'

const WIDTH = 680

const said = (value: number): string => numberText(Number(value.toPrecision(3)))

/** Least rated pressure of the vessels chosen for a system, gauge Pa. */
const ratingOf = (system: SystemResult, vessels: readonly VesselResult[]) =>
  vessels
    .filter((vessel) => vessel.system === system.id && vessel.selected !== null)
    .map(({ mark, selected }) => ({ mark, pressure: selected?.maxPressure ?? Infinity }))
    .sort((a, b) => a.pressure - b.pressure)[0]

/** Pressure against height of a system, cold and hot, with its relief valve and the rating of its chosen vessel. Null where no vessel holds the pressure. */
export const drawPressures = (
  system: SystemResult,
  units: UnitSystem,
  vessels: readonly VesselResult[] = [],
): Drawing | null => {
  if (system.pressures.length === 0) return null
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
  const frame: Frame = { left: tall ? 64 : 24, right: 560, top: 62, bottom: height - 48 }
  const shown = [0, ...points.flatMap((point) => [point.cold, point.hot]), ...(relief ? [relief.set] : [])]
  // A rating far above everything else would press the rest together: then it is said and not drawn.
  const far = rating !== undefined && rating.pressure > 1.8 * Math.max(...shown)
  const across = scaleOver(
    [...shown, ...(rating && !far ? [rating.pressure] : [])],
    frame.left + (tall ? 0 : 10),
    frame.right,
    8,
  )
  const up = tall
    ? scaleOver(heights, frame.bottom - 24, frame.top + 26, 6)
    : { ...scaleOver([-1, 1], frame.bottom, frame.top, 2), ticks: [] }

  const way = (key: 'cold' | 'hot') => points.map((point) => `${said(point[key])} ${unit} at ${point.label}`).join(', ')
  const words = [
    `Cold ${way('cold')}.`,
    `Hot ${way('hot')}.`,
    ...(relief ? [`Relief valve set at ${said(relief.set)} ${unit}.`] : []),
    ...(rating ? [`${rating.mark} is rated ${said(rating.pressure)} ${unit}.`] : []),
  ].join(' ')

  const top = points.at(-1)
  // A line falls to the right from its highest point, so there its value stands left of it; elsewhere below.
  const value = (x: number, y: number, words: string, highest: boolean): string => {
    if (!tall) return text(x, y + 22, words, { 'text-anchor': 'middle', fill: COLOUR.ink })
    const place = highest
      ? { x: x - 11, y: y + 4, 'text-anchor': 'end' }
      : { x: x + 8, y: y + 17, 'text-anchor': 'start' }
    const { x: at, y: down, ...anchor } = place
    return text(at, down, words, { ...anchor, fill: COLOUR.ink })
  }
  const curve = (key: 'cold' | 'hot', colour: string, dashes: string): string[] => [
    ...(points.length > 1
      ? [
          element('polyline', {
            points: points
              .map((point) => `${across.at(point[key]).toFixed(2)},${up.at(point.height).toFixed(2)}`)
              .join(' '),
            fill: 'none',
            stroke: colour,
            'stroke-width': PEN.heavy,
            ...(dashes === '' ? {} : { 'stroke-dasharray': dashes }),
          }),
        ]
      : []),
    ...points.flatMap((point) => [
      element('circle', {
        cx: across.at(point[key]),
        cy: up.at(point.height),
        r: 5,
        fill: key === 'cold' ? '#FFFFFF' : colour,
        stroke: colour,
        'stroke-width': PEN.medium,
      }),
      value(across.at(point[key]), up.at(point.height), said(point[key]), point === top),
    ]),
    ...(top
      ? [
          text(across.at(top[key]), up.at(top.height) - 12, key === 'cold' ? 'Cold' : 'Hot', {
            'text-anchor': 'middle',
            fill: colour,
            'font-weight': 600,
          }),
        ]
      : []),
  ]

  return drawing({ width: WIDTH, height }, `${system.title}: pressure against height`, words, [
    ...(tall ? leftAxis(up, frame, `Height above the vessel (${unitLabel('length', units)})`) : []),
    ...bottomAxis(across, frame, `Gauge pressure (${unit})`),
    ...points.flatMap((point) => [
      line(tall ? across.at(point.hot) : frame.left, up.at(point.height), frame.right, up.at(point.height), {
        stroke: COLOUR.pencil,
        'stroke-width': PEN.hair,
        'stroke-dasharray': '2 3',
      }),
    ]),
    ...sideLabels(
      points.map((point) => ({ name: point.label, at: up.at(point.height), weight: 400 })),
      frame,
    ),
    ...(relief ? setting(across.at(relief.set), frame, `Relief ${said(relief.set)}`, '12 4 2 4') : []),
    ...(rating && !far
      ? setting(across.at(rating.pressure), frame, `${rating.mark} rated ${said(rating.pressure)}`, '2 4', 1)
      : []),
    ...(rating && far
      ? [
          text(frame.right, frame.top - 22, `${rating.mark} rated ${said(rating.pressure)}, off the scale`, {
            'text-anchor': 'end',
            fill: COLOUR.ink,
          }),
        ]
      : []),
    ...curve('cold', `#${STEEL}`, ''),
    ...curve('hot', COLOUR.ink, '9 4'),
    ...(relief ? [valve(across.at(relief.set), up.at(relief.height))] : []),
  ])
}

/** A relief valve: a solid diamond where it stands. */
const valve = (x: number, y: number): string =>
  element('path', { d: `M${x.toFixed(2)} ${(y - 7).toFixed(2)}l6 7l-6 7l-6 -7z`, fill: COLOUR.ink })

/** `drawPressures` as an SVG alone. */
export const pressureDrawing = (
  system: SystemResult,
  units: UnitSystem,
  vessels: readonly VesselResult[] = [],
): string | null => drawPressures(system, units, vessels)?.svg ?? null

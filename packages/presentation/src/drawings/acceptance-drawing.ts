import type { VesselResult } from '@coldfill/sizing'
import { unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber } from '../display-number.ts'
import { numberText } from '../value-text.ts'
import { chargedVessel, waterInVessel } from './charged-vessel.ts'
import { bottomAxis, dot, frameOf, leftAxis, marksAcross, setting, sideLabels, type Frame } from './frame.ts'
import { scaleOver } from './scale.ts'
import { line, PEN, pointsOf, shape, text, wordsWidth, type Drawing, type DrawingLook, type Shape } from './shape.ts'

const HEIGHT = 320
/** Points of a curve. */
const POINTS = 60

const said = (value: number): string => numberText(Number(value.toPrecision(3)))

/** Words at a point of a rising curve: above it to the left, or below it to the right where that has no room. */
const besidePoint = (x: number, y: number, words: string, { left, bottom, width }: Frame, fill: string): Shape => {
  const room = wordsWidth(words)
  if (x - 8 - room >= left) return text(x - 8, y - 10, words, { textAnchor: 'end', fill })
  const down = y + 18 < bottom - 4 ? y + 18 : y - 12
  const over = x + 10 + room - (width - 4)
  return text(x + 10 - Math.max(0, over), down, words, { textAnchor: 'start', fill })
}

/**
 * Water in the vessel against pressure: the curve of the vessel, cold, hot, relief, and what it can take. Null for a vessel
 * without a size or without gas.
 */
export const drawAcceptance = (vessel: VesselResult, units: UnitSystem, look: DrawingLook): Drawing | null => {
  const charged = chargedVessel(vessel)
  if (charged === null) return null
  const { palette } = look
  const { charge, cold, hot, volume, required, acceptance, relief } = charged
  const pressure = (value: number) => displayNumber(value, 'gauge pressure', units)
  const amount = (value: number) => displayNumber(value, 'volume', units)
  const [pressureUnit, volumeUnit] = [unitLabel('gauge pressure', units), unitLabel('volume', units)]
  const end = 1.06 * Math.max(hot, relief ?? 0)
  const held = (size: number, at: number) => amount(waterInVessel(size, charged, at))
  const limit = acceptance !== undefined && acceptance < volume * 0.9999 ? amount(acceptance) : undefined
  const chosen = vessel.selected !== null
  const names = {
    curve: `${chosen ? 'Chosen' : 'Required'} ${said(amount(volume))}`,
    required: `Required ${said(amount(required))}`,
    limit: limit === undefined ? '' : `Acceptance ${said(limit)}`,
  }
  const frame = frameOf(look.width, HEIGHT, { names: Object.values(names), rows: 1 })
  const across = scaleOver([Math.min(0, pressure(charge)), pressure(end)], frame.left, frame.right, marksAcross(frame))
  const up = scaleOver(
    [0, held(Math.max(volume, required), end), ...(limit === undefined ? [] : [limit])],
    frame.bottom,
    frame.top + 8,
    6,
  )

  const curve = (size: number, attributes: Record<string, string | number>): Shape => {
    const steps = Array.from({ length: POINTS + 1 }, (_, index) => charge + ((end - charge) * index) / POINTS)
    const points = pointsOf(steps.map((at) => [across.at(pressure(at)), up.at(held(size, at))]))
    return shape('polyline', { points, fill: 'none', ...attributes })
  }

  const pumped = vessel.results['cut-in-pressure'] !== undefined
  const [coldName, hotName] = pumped ? ['Cut-in', 'Cut-out'] : ['Cold', 'Hot']
  const marks = [
    { name: coldName, at: cold, filled: false },
    { name: hotName, at: hot, filled: true },
  ].map((mark) => ({ ...mark, held: held(volume, mark.at) }))
  const which = `the ${chosen ? 'chosen' : 'required'} ${said(amount(volume))} ${volumeUnit}`
  const words = [
    `With ${which}, precharged to ${said(pressure(charge))} ${pressureUnit}:`,
    `${marks.map((mark) => `${mark.name.toLowerCase()} ${said(pressure(mark.at))} ${pressureUnit} with ${said(mark.held)} ${volumeUnit} of water`).join(', ')}.`,
    ...(relief === undefined ? [] : [`Relief valve set at ${said(pressure(relief))} ${pressureUnit}.`]),
    ...(limit === undefined ? [] : [`The vessel can take ${said(limit)} ${volumeUnit}.`]),
  ].join(' ')

  const guide = { stroke: palette.pencil, strokeWidth: PEN.hair, strokeDasharray: '2 3' }
  const shapes = [
    ...leftAxis(up, frame, `Water in the vessel (${volumeUnit})`, palette),
    ...bottomAxis(across, frame, `Gauge pressure at the vessel (${pressureUnit})`, palette),
    ...(relief === undefined
      ? []
      : setting(across.at(pressure(relief)), frame, `Relief ${said(pressure(relief))}`, '12 4 2 4', palette)),
    ...(limit === undefined
      ? []
      : [
          line(frame.left, up.at(limit), frame.right, up.at(limit), {
            stroke: palette.ink,
            strokeWidth: PEN.medium,
            strokeDasharray: '2 4',
          }),
        ]),
    ...(chosen ? [curve(required, { stroke: palette.pencil, strokeWidth: PEN.fine, strokeDasharray: '6 4' })] : []),
    curve(volume, { stroke: palette.steel, strokeWidth: PEN.heavy }),
    ...sideLabels(
      [
        { name: names.curve, at: up.at(held(volume, end)), weight: 600 },
        ...(chosen ? [{ name: names.required, at: up.at(held(required, end)), weight: 400 } as const] : []),
        ...(limit === undefined ? [] : [{ name: names.limit, at: up.at(limit), weight: 400 } as const]),
      ],
      frame,
      palette,
    ),
    ...marks.flatMap((mark) => {
      const [x, y] = [across.at(pressure(mark.at)), up.at(mark.held)]
      const label = `${mark.name} ${said(pressure(mark.at))}: ${said(mark.held)} ${volumeUnit}`
      return [
        line(frame.left, y, x, y, guide),
        line(x, y, x, frame.bottom, guide),
        dot(x, y, palette.ink, mark.filled, palette),
        besidePoint(x, y, label, frame, palette.ink),
      ]
    }),
  ]
  return {
    title: `${vessel.mark}: water in the vessel against pressure`,
    words,
    width: frame.width,
    height: HEIGHT,
    shapes,
  }
}

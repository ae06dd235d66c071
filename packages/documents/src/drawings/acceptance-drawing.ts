import type { VesselResult } from '@coldfill/sizing'
import { unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber } from '../calculation/display-number.ts'
import { numberText } from '../calculation/value-text.ts'
import { STEEL } from '../look.ts'
import { bottomAxis, COLOUR, leftAxis, setting, sideLabels, type Frame } from './frame.ts'
import { scaleOver } from './scale.ts'
import { drawing, element, line, PEN, text, type Drawing } from './svg.ts'

const SIZE = { width: 680, height: 320 }
const FRAME: Frame = { left: 64, right: 560, top: 62, bottom: 272 }

const said = (value: number): string => numberText(Number(value.toPrecision(3)))

const traced = (vessel: VesselResult, symbol: string, kind: string): number | undefined =>
  vessel.trace.flatMap((section) => section.entries).find((entry) => entry.symbol === symbol && entry.kind === kind)
    ?.value

/** A vessel in the numbers that its water content follows from; pressures gauge in Pa, the atmosphere in Pa abs, volumes in m3. */
interface ChargedVessel {
  readonly atmosphere: number
  /** Gauge pressure of the gas while there is no water in the vessel. */
  readonly charge: number
  readonly cold: number
  readonly hot: number
  readonly volume: number
  readonly required: number
  readonly acceptance: number | undefined
  readonly relief: number | undefined
}

/** Pa abs. Methods that do not take the atmosphere of the site round it to one bar. */
const ROUND_ATMOSPHERE = 1e5

const chargedVessel = (vessel: VesselResult): ChargedVessel | null => {
  const { results, selected } = vessel
  const atmosphere = traced(vessel, 'P_a', 'absolute pressure') ?? ROUND_ATMOSPHERE
  const cold = (results['cut-in-pressure'] ?? results['fill-pressure'])?.value
  const hot = (results['final-pressure'] ?? results['maximum-pressure'])?.value
  const required = results['required-volume']?.value
  if (cold === undefined || hot === undefined || required === undefined) return null
  if (vessel.status !== 'sized' || !(hot > cold) || !(required > 0)) return null
  return {
    atmosphere,
    cold,
    hot,
    required,
    // A tank without a diaphragm is filled from the air it stands in.
    charge: results['precharge']?.value ?? 0,
    volume: selected ? selected.volume * selected.quantity : required,
    acceptance: selected?.acceptance === undefined ? undefined : selected.acceptance * selected.quantity,
    relief: traced(vessel, 'p_rv', 'gauge pressure'),
  }
}

/** Water in a vessel of `volume` at a gauge pressure by Boyle and Mariotte: the gas of the empty vessel, pressed together at one temperature. */
export const waterInVessel = (
  volume: number,
  { charge, atmosphere }: Pick<ChargedVessel, 'charge' | 'atmosphere'>,
  pressure: number,
): number => Math.max(0, volume * (1 - (charge + atmosphere) / (pressure + atmosphere)))

const POINTS = 60

/** How much water a charged vessel holds against its pressure, with its cold, hot and relief pressure. Null for a vessel without a gas charge or without a size. */
export const drawAcceptance = (vessel: VesselResult, units: UnitSystem): Drawing | null => {
  const charged = chargedVessel(vessel)
  if (charged === null) return null
  const { charge, cold, hot, volume, required, acceptance, relief } = charged
  const pressure = (value: number) => displayNumber(value, 'gauge pressure', units)
  const amount = (value: number) => displayNumber(value, 'volume', units)
  const [pressureUnit, volumeUnit] = [unitLabel('gauge pressure', units), unitLabel('volume', units)]
  const end = 1.06 * Math.max(hot, relief ?? 0)
  const across = scaleOver([Math.min(0, pressure(charge)), pressure(end)], FRAME.left, FRAME.right, 8)
  const held = (size: number, at: number) => amount(waterInVessel(size, charged, at))
  const limit = acceptance !== undefined && acceptance < volume * 0.9999 ? amount(acceptance) : undefined
  const up = scaleOver(
    [0, held(Math.max(volume, required), end), ...(limit === undefined ? [] : [limit])],
    FRAME.bottom,
    FRAME.top + 8,
    6,
  )

  const path = (size: number): string => {
    const steps = Array.from({ length: POINTS + 1 }, (_, index) => charge + ((end - charge) * index) / POINTS)
    return steps.map((at) => `${across.at(pressure(at)).toFixed(2)},${up.at(held(size, at)).toFixed(2)}`).join(' ')
  }
  const curve = (size: number, attributes: Record<string, string | number>): string =>
    element('polyline', { points: path(size), fill: 'none', ...attributes })

  const pumped = vessel.results['cut-in-pressure'] !== undefined
  const [coldName, hotName] = pumped ? ['Cut-in', 'Cut-out'] : ['Cold', 'Hot']
  const marks = [
    { name: coldName, at: cold, filled: false, side: -1 },
    { name: hotName, at: hot, filled: true, side: 1 },
  ].map((mark) => ({ ...mark, held: held(volume, mark.at) }))
  const chosen = vessel.selected !== null
  const which = chosen
    ? `the chosen ${said(amount(volume))} ${volumeUnit}`
    : `the required ${said(amount(required))} ${volumeUnit}`
  const words = [
    `With ${which}, precharged to ${said(pressure(charge))} ${pressureUnit}:`,
    `${marks.map((mark) => `${mark.name.toLowerCase()} ${said(pressure(mark.at))} ${pressureUnit} with ${said(mark.held)} ${volumeUnit} of water`).join(', ')}.`,
    ...(relief === undefined ? [] : [`Relief valve set at ${said(pressure(relief))} ${pressureUnit}.`]),
    ...(limit === undefined ? [] : [`The vessel can take ${said(limit)} ${volumeUnit}.`]),
  ].join(' ')

  return drawing(SIZE, `${vessel.mark}: water in the vessel against pressure`, words, [
    ...leftAxis(up, FRAME, `Water in the vessel (${volumeUnit})`),
    ...bottomAxis(across, FRAME, `Gauge pressure at the vessel (${pressureUnit})`),
    ...(relief === undefined
      ? []
      : setting(across.at(pressure(relief)), FRAME, `Relief ${said(pressure(relief))}`, '12 4 2 4')),
    ...(limit === undefined
      ? []
      : [
          line(FRAME.left, up.at(limit), FRAME.right, up.at(limit), {
            stroke: COLOUR.ink,
            'stroke-width': PEN.medium,
            'stroke-dasharray': '2 4',
          }),
        ]),
    ...(chosen
      ? [curve(required, { stroke: COLOUR.pencil, 'stroke-width': PEN.fine, 'stroke-dasharray': '6 4' })]
      : []),
    curve(volume, { stroke: `#${STEEL}`, 'stroke-width': PEN.heavy }),
    ...sideLabels(
      [
        {
          name: `${chosen ? 'Chosen' : 'Required'} ${said(amount(volume))}`,
          at: up.at(held(volume, end)),
          weight: 600,
        },
        ...(chosen
          ? [{ name: `Required ${said(amount(required))}`, at: up.at(held(required, end)), weight: 400 } as const]
          : []),
        ...(limit === undefined ? [] : [{ name: `Acceptance ${said(limit)}`, at: up.at(limit), weight: 400 } as const]),
      ],
      FRAME,
    ),
    ...marks.flatMap((mark) => {
      const [x, y] = [across.at(pressure(mark.at)), up.at(mark.held)]
      return [
        line(FRAME.left, y, x, y, { stroke: COLOUR.pencil, 'stroke-width': PEN.hair, 'stroke-dasharray': '2 3' }),
        line(x, y, x, FRAME.bottom, { stroke: COLOUR.pencil, 'stroke-width': PEN.hair, 'stroke-dasharray': '2 3' }),
        element('circle', {
          cx: x,
          cy: y,
          r: 5,
          fill: mark.filled ? COLOUR.ink : '#FFFFFF',
          stroke: COLOUR.ink,
          'stroke-width': PEN.medium,
        }),
        text(x - 8, y - 10, `${mark.name} ${said(pressure(mark.at))}: ${said(mark.held)} ${volumeUnit}`, {
          'text-anchor': x < FRAME.left + 150 ? 'start' : 'end',
          fill: COLOUR.ink,
        }),
      ]
    }),
  ])
}

/** `drawAcceptance` as an SVG alone. */
export const acceptanceDrawing = (vessel: VesselResult, units: UnitSystem): string | null =>
  drawAcceptance(vessel, units)?.svg ?? null

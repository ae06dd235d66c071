import { displayUnit, formatQuantity, fromSi, unitLabel, type UnitSystem } from '@coldfill/units'
import type { System } from '#lib/sized-project.ts'

export interface DrawnReading {
  readonly x: number
  readonly text: string
  /** Where the text stands beside its dot, clear of the lines, which lean to the right downwards. */
  readonly at: { readonly dx: number; readonly dy: number; readonly anchor: 'start' | 'end' }
}

export interface DrawnPoint {
  readonly label: string
  /** Height above the vessel connection with its unit. */
  readonly height: string
  readonly y: number
  readonly cold: DrawnReading
  readonly hot: DrawnReading
}

export interface PressurePicture {
  readonly width: number
  readonly height: number
  /** Left, right, upper and lower edge of the field, px. */
  readonly field: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number }
  /** Lowest first. */
  readonly points: readonly DrawnPoint[]
  /** `named`: where its name stands over the field. */
  readonly relief: { readonly x: number; readonly y: number; readonly text: string; readonly named: number } | null
  /** Where the gauge reads zero. */
  readonly atmosphere: number
  readonly ticks: readonly { readonly x: number; readonly text: string }[]
  readonly axis: string
  /** The same in words. */
  readonly words: string
}

/** Steps of 1, 2 or 5 that give four to seven marks. */
export const niceStep = (span: number): number => {
  const rough = span / 6
  const power = 10 ** Math.floor(Math.log10(rough))
  const part = rough / power
  return (part <= 1 ? 1 : part <= 2 ? 2 : part <= 5 ? 5 : 10) * power
}

/** Room that a reading takes beside its dot. */
const READING = 68

const beside = (x: number, next: number, left: number, isLowest: boolean): DrawnReading['at'] =>
  next - x < READING && x - left > READING
    ? { dx: -9, dy: isLowest ? 17 : -7, anchor: 'end' }
    : { dx: 9, dy: -7, anchor: 'start' }

const HALF_A_NAME = 50
const LABELS = 96
const RIGHT = 16
const TOP = 42
const BOTTOM = 46

/** The drawing of a system's pressures in px: height upwards, gauge pressure to the right. Null where the system has none. */
export const pressurePicture = (system: System, units: UnitSystem, width: number): PressurePicture | null => {
  if (system.pressures.length === 0) return null
  const unit = displayUnit('gauge pressure', units)
  const read = (value: number): number => fromSi(value, unit)
  const gauge = (value: number): string => formatQuantity({ kind: 'gauge pressure', value }, units)
  const points = system.pressures.toSorted((a, b) => a.height - b.height)
  const { relief } = system
  const pressures = [0, ...points.flatMap((point) => [point.cold, point.hot]), ...(relief ? [relief.set] : [])].map(
    read,
  )
  const least = Math.min(...pressures)
  const most = Math.max(...pressures)
  const step = niceStep(Math.max(most - least, 1e-6))
  const first = Math.floor(least / step)
  const last = Math.ceil(most / step - 1e-9)
  const heights = [...points.map((point) => point.height), ...(relief ? [relief.height] : [])]
  const lowest = Math.min(...heights)
  const rise = Math.max(...heights) - lowest
  const height = rise > 0 ? 380 : 190
  const field = { left: LABELS, right: width - RIGHT, top: TOP, bottom: height - BOTTOM }
  const x = (reading: number): number =>
    field.left + ((reading - first * step) / ((last - first) * step)) * (field.right - field.left)
  const inset = 22
  const y = (metres: number): number =>
    rise > 0
      ? field.bottom - inset - ((metres - lowest) / rise) * (field.bottom - field.top - 2 * inset)
      : (field.top + field.bottom) / 2
  const length = (metres: number): string => formatQuantity({ kind: 'length', value: metres }, units)
  const sentences = points.map(
    (point) => `${point.label}, ${length(point.height)} up: ${gauge(point.cold)} cold, ${gauge(point.hot)} hot.`,
  )
  return {
    width,
    height,
    field,
    points: points.map((point, n) => {
      const cold = x(read(point.cold))
      const hot = x(read(point.hot))
      const next = relief && Math.abs(y(relief.height) - y(point.height)) < 24 ? x(read(relief.set)) : Infinity
      return {
        label: point.label,
        height: length(point.height),
        y: y(point.height),
        cold: { x: cold, text: gauge(point.cold), at: beside(cold, hot, field.left, n === 0) },
        hot: { x: hot, text: gauge(point.hot), at: beside(hot, next, cold, n === 0) },
      }
    }),
    relief: relief && {
      x: x(read(relief.set)),
      y: y(relief.height),
      text: `relief ${gauge(relief.set)}`,
      named: Math.min(x(read(relief.set)), width - HALF_A_NAME),
    },
    atmosphere: x(0),
    ticks: Array.from({ length: last - first + 1 }, (_, n) => ({
      x: x((first + n) * step),
      text: String(Number(((first + n) * step).toPrecision(6))),
    })),
    axis: `gauge pressure, ${unitLabel('gauge pressure', units)}`,
    words: [
      `Pressure against height in ${system.title}.`,
      ...sentences,
      ...(relief ? [`Relief valve set to ${gauge(relief.set)}, ${length(relief.height)} up.`] : []),
    ].join(' '),
  }
}

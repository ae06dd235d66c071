import { describe, expect, it } from 'vitest'
import { niceStep, pressurePicture } from './pressure-drawing.ts'

const PSI = 6894.757293168361
const FOOT = 0.3048
const system = {
  id: 'HWS',
  title: 'Heating water',
  path: 'systems.HWS',
  service: 'heating water',
  fluid: 'water',
  pressures: [
    { label: 'ET-1', height: 0, cold: 20 * PSI, hot: 27 * PSI },
    { label: 'Highest point', height: 40 * FOOT, cold: -3 * PSI, hot: 4 * PSI },
  ],
  relief: { set: 30 * PSI, height: 10 * FOOT },
}

describe('the drawing of pressures', () => {
  it('has height upwards and pressure to the right, in either units', () => {
    for (const units of ['US', 'SI'] as const) {
      const picture = pressurePicture(system, units, 640)
      const [low, high] = picture?.points ?? []
      if (!picture || !low || !high || !picture.relief) throw new Error('nothing is drawn')
      expect(low.y).toBeGreaterThan(picture.relief.y)
      expect(picture.relief.y).toBeGreaterThan(high.y)
      expect(low.cold.x).toBeLessThan(low.hot.x)
      expect(low.hot.x).toBeLessThan(picture.relief.x)
      // The gauge is below zero at the top, so the line of atmosphere runs between.
      expect(high.cold.x).toBeLessThan(picture.atmosphere)
      expect(high.hot.x).toBeGreaterThan(picture.atmosphere)
      // A quarter of the way up: 10 ft of 40.
      expect((low.y - picture.relief.y) / (low.y - high.y)).toBeCloseTo(0.25, 9)
    }
  })

  it('keeps everything within its field', () => {
    for (const width of [300, 640]) {
      const picture = pressurePicture(system, 'US', width)
      const { left = 0, right = 0 } = picture?.field ?? {}
      for (const x of [
        ...(picture?.ticks.map((tick) => tick.x) ?? []),
        ...(picture?.points.flatMap(({ cold, hot }) => [cold.x, hot.x]) ?? []),
      ]) {
        expect(x).toBeGreaterThanOrEqual(left - 1e-9)
        expect(x).toBeLessThanOrEqual(right + 1e-9)
      }
    }
  })

  it('says the same in words', () => {
    expect(pressurePicture(system, 'US', 640)?.words).toBe(
      'Pressure against height in Heating water. ET-1, 0 ft up: 20.0 psig cold, 27.0 psig hot. Highest point, 40.0 ft up: -3.0 psig cold, 4.0 psig hot. Relief valve set to 30.0 psig, 10.0 ft up.',
    )
  })

  it('is nothing where a system has no pressures, and one line of dots where it has no height', () => {
    expect(pressurePicture({ ...system, pressures: [] }, 'US', 640)).toBeNull()
    const flat = pressurePicture({ ...system, pressures: system.pressures.slice(0, 1), relief: null }, 'US', 640)
    expect(flat?.points).toHaveLength(1)
    expect(Number.isFinite(flat?.points[0]?.y)).toBe(true)
  })

  it('marks the axis in steps of 1, 2 or 5', () => {
    expect([30, 33, 7, 250, 0.8].map(niceStep)).toEqual([5, 10, 2, 50, 0.2])
  })
})

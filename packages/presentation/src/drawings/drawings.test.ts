import type { SystemResult } from '@coldfill/sizing'
import { describe, expect, it } from 'vitest'
import { waterInVessel } from './charged-vessel.ts'
import { drawPressures } from './pressure-drawing.ts'
import { scaleOver } from './scale.ts'
import { ON_PAPER, PAPER, wordsWidth } from './shape.ts'
import { svgText } from './svg-text.ts'

const PSI = 6894.757293168361
const FOOT = 0.3048

const heating: SystemResult = {
  id: 'HWS',
  title: 'Heating <water> & "more"',
  path: 'systems.HWS',
  service: 'heating water',
  fluid: 'water',
  pressures: [
    { label: 'ET-1', height: 0, cold: 22 * PSI, hot: 40 * PSI },
    {
      label: 'Highest point',
      height: 40 * FOOT,
      cold: 5 * PSI,
      hot: 23 * PSI,
    },
  ],
  relief: { set: 50 * PSI, height: 0 },
}

const circles = (svg: string): { x: number; y: number; fill: string }[] =>
  [...svg.matchAll(/<circle cx="([\d.-]+)" cy="([\d.-]+)" r="5" fill="([^"]+)"/g)].map(([, x, y, fill = '']) => ({
    x: Number(x),
    y: Number(y),
    fill,
  }))

/** Every element closed in order, every attribute quoted: enough for a picture written by hand. */
const wellFormed = (svg: string): boolean => {
  const open: string[] = []
  for (const [, close, name = '', empty] of svg.matchAll(/<(\/?)([a-z]+)(?: [a-zA-Z:-]+="[^"<]*")*(\/?)>/g)) {
    if (close) {
      if (open.pop() !== name) return false
    } else if (!empty) open.push(name)
  }
  return open.length === 0 && !/<(?!\/?[a-z])|&(?!amp;|lt;|gt;|quot;)/.test(svg)
}

describe('the drawing of pressure against height', () => {
  it('draws the side of the pump that moves by its head, and says which', () => {
    const running = drawPressures(
      {
        ...heating,
        pressures: heating.pressures.map((point) => ({ ...point, running: point.hot + 9 * PSI })),
        pump: { head: 9 * PSI, moves: 'discharge side' },
      },
      'US',
      ON_PAPER,
    )
    expect(running?.words).toContain(
      'With the pump on, its discharge side, hot and at its most: 49 psig at ET-1, 32 psig at Highest point.',
    )
    const dots = running ? circles(svgText(running, PAPER)) : []
    const [pumpLow, pumpTop, coldLow, , hotLow, hotTop] = dots
    // 9 psi is half of the 18 psi between cold and hot.
    const eighteen = (hotLow?.x ?? 0) - (coldLow?.x ?? 0)
    expect(((pumpLow?.x ?? 0) - (hotLow?.x ?? 0)) / eighteen).toBeCloseTo(0.5, 2)
    expect((pumpTop?.x ?? 0) - (hotTop?.x ?? 0)).toBeCloseTo((pumpLow?.x ?? 0) - (hotLow?.x ?? 0), 1)
  })

  const drawn = drawPressures(heating, 'US', ON_PAPER)
  const svg = drawn ? svgText(drawn, PAPER) : ''

  it('puts cold and hot where their numbers are', () => {
    const [coldLow, coldTop, hotLow, hotTop] = circles(svg)
    // Equal differences of pressure are equal distances: cold to hot is 18 psi at both heights, bottom to top 17 psi.
    const [low, top] = [(hotLow?.x ?? 0) - (coldLow?.x ?? 0), (hotTop?.x ?? 0) - (coldTop?.x ?? 0)]
    expect(top).toBeCloseTo(low, 1)
    expect(((coldLow?.x ?? 0) - (coldTop?.x ?? 0)) / low).toBeCloseTo(17 / 18, 2)
    expect(coldTop?.y).toBeLessThan(coldLow?.y ?? 0)
    expect(hotTop?.y).toBe(coldTop?.y)
  })

  it('tells cold from hot, relief and rating without colour: by words, fill and dashes', () => {
    for (const words of ['>Cold<', '>Hot<', '>Relief 50<']) expect(svg).toContain(words)
    const [coldLow, , hotLow] = circles(svg)
    expect(coldLow?.fill).not.toBe(hotLow?.fill)
    expect(svg.match(/stroke-dasharray="9 4"/g)).toHaveLength(1)
    expect(svg.match(/stroke-dasharray="12 4 2 4"/g)).toHaveLength(1)
  })

  it('says in words what it shows, and takes any text for text', () => {
    expect(drawn?.words).toBe(
      'Cold 22 psig at ET-1, 5 psig at Highest point. Hot 40 psig at ET-1, 23 psig at Highest point. Relief valve set at 50 psig.',
    )
    expect(svg).toContain('Heating &lt;water&gt; &amp; &quot;more&quot;: pressure against height')
    expect(wellFormed(svg)).toBe(true)
  })

  it('is none where no vessel holds the pressure', () => {
    expect(drawPressures({ ...heating, pressures: [] }, 'US', ON_PAPER)).toBeNull()
  })

  it('keeps the names of the lines clear of the line of the relief valve', () => {
    const [low, top] = heating.pressures
    if (!low || !top) throw new Error('the system has two points')
    // Hot at the top half a psi below the set pressure: the two would stand on each other.
    const drawn = drawPressures({ ...heating, pressures: [low, { ...top, hot: 49.5 * PSI }] }, 'US', ON_PAPER)
    const hot = drawn?.shapes.find(({ text }) => text === 'Hot')
    const relief = drawn?.shapes.find(({ attributes }) => attributes['strokeDasharray'] === '12 4 2 4')
    const right = Number(hot?.attributes['x']) + wordsWidth('Hot') / 2
    expect(right).toBeLessThan(Number(relief?.attributes['x1']))
  })

  it('marks the atmosphere where a gauge reads below it, and nowhere else', () => {
    const [low, top] = heating.pressures
    if (!low || !top) throw new Error('the system has two points')
    const drawn = drawPressures({ ...heating, pressures: [low, { ...top, cold: -3 * PSI }] }, 'US', ON_PAPER)
    expect(drawn?.shapes.some(({ text }) => text === 'Atmosphere')).toBe(true)
    expect(svg).not.toContain('Atmosphere')
  })

  it('keeps everything inside, however narrow it is, and takes its colours from the palette', () => {
    const theme = { ink: 'v(ink)', pencil: 'v(pencil)', hair: 'v(hair)', steel: 'v(steel)', ground: 'v(ground)' }
    for (const width of [300, 340, 480, 720]) {
      const narrow = drawPressures(heating, 'US', { palette: theme, width })
      expect(narrow?.width).toBe(width)
      for (const { name, attributes, text = '' } of narrow?.shapes ?? []) {
        expect(JSON.stringify(attributes)).not.toContain('#')
        if (name !== 'text') continue
        const [x, room] = [Number(attributes['x']), wordsWidth(text)]
        const anchor = attributes['textAnchor'] ?? 'start'
        const left = anchor === 'start' ? x : anchor === 'end' ? x - room : x - room / 2
        expect({ text, inside: left >= -1 && left + room <= width + 1 }).toEqual({ text, inside: true })
      }
    }
  })
})

describe('water in a vessel', () => {
  it('follows the law of Boyle and Mariotte', () => {
    // By hand: gas at 14.7 psia above a charge of 12 psig in 100 gal, pressed to 30 psig: 100 · (1 − 26.7 / 44.7) = 40.27 gal.
    expect(waterInVessel(100, { charge: 12, atmosphere: 14.7 }, 30)).toBeCloseTo(40.27, 2)
    expect(waterInVessel(100, { charge: 12, atmosphere: 14.7 }, 5)).toBe(0)
  })
})

describe('a scale', () => {
  it('begins and ends on a tick and has round steps', () => {
    expect(scaleOver([3, 47], 0, 100, 6).ticks).toEqual([0, 10, 20, 30, 40, 50])
    expect(scaleOver([-3, 3], 0, 100, 4).ticks).toEqual([-4, -2, 0, 2, 4])
    expect(scaleOver([5, 5], 0, 100, 4).ticks.length).toBeGreaterThan(1)
  })
})

import type { SystemResult } from '@coldfill/sizing'
import { water } from '@coldfill/engine'
import { describe, expect, it } from 'vitest'
import { clinicProject, si } from '../testing/index.ts'
import { drawAcceptance, waterInVessel } from './acceptance-drawing.ts'
import { drawPressures, pressureDrawing } from './pressure-drawing.ts'
import { scaleOver } from './scale.ts'

const project = clinicProject(water.functions)

const heating: SystemResult = {
  id: 'HWS',
  title: 'Heating <water> & "more"',
  path: 'systems.HWS',
  service: 'heating water',
  fluid: 'water',
  pressures: [
    { label: 'ET-1', height: 0, cold: si('22 psi', 'gauge pressure'), hot: si('40 psi', 'gauge pressure') },
    {
      label: 'Highest point',
      height: si('40 ft', 'length'),
      cold: si('5 psi', 'gauge pressure'),
      hot: si('23 psi', 'gauge pressure'),
    },
  ],
  relief: { set: si('50 psi', 'gauge pressure'), height: 0 },
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
  const drawn = drawPressures(heating, 'US')
  const svg = drawn?.svg ?? ''

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

  it('says a rating that is far off and draws one that is near', () => {
    const vessel = project.vessels.find((each) => each.selected !== null)
    if (!vessel?.selected) throw new Error('the clinic has a chosen vessel')
    const rated = (psi: number) =>
      pressureDrawing(heating, 'US', [
        {
          ...vessel,
          mark: 'ET-1',
          system: 'HWS',
          selected: { ...vessel.selected!, maxPressure: si(`${psi} psi`, 'gauge pressure') },
        },
      ]) ?? ''
    expect(rated(75)).toContain('stroke-dasharray="2 4"')
    expect(rated(300)).not.toContain('stroke-dasharray="2 4"')
    expect(rated(300)).toContain('ET-1 rated 300, off the scale')
  })

  it('is none where no vessel holds the pressure', () => {
    expect(drawPressures({ ...heating, pressures: [] }, 'US')).toBeNull()
  })
})

describe('the drawing of water in a vessel against pressure', () => {
  it('follows the law of Boyle and Mariotte', () => {
    // By hand: gas at 14.7 psia above a charge of 12 psig in 100 gal, pressed to 30 psig: 100 · (1 − 26.7 / 44.7) = 40.27 gal.
    expect(waterInVessel(100, { charge: 12, atmosphere: 14.7 }, 30)).toBeCloseTo(40.27, 2)
    expect(waterInVessel(100, { charge: 12, atmosphere: 14.7 }, 5)).toBe(0)
  })

  it('has the expansion of the engine between cold and hot of the required vessel', () => {
    // The engine sizes by ASHRAE's equation; the drawing goes by the gas alone. They have to agree.
    const vessel = project.vessels[0]
    if (!vessel) throw new Error('the clinic has vessels')
    const bare = { ...vessel, selected: null, results: { ...vessel.results } }
    delete (bare.results as Record<string, unknown>)['final-pressure']
    const words = drawAcceptance(bare, 'US')?.words ?? ''
    const [, cold = '', hot = ''] = /with ([\d.]+) gal of water, hot .* with ([\d.]+) gal of water/.exec(words) ?? []
    const expansion = (vessel.results['expansion-volume']?.value ?? 0) / si('1 gal', 'volume')
    expect(Math.abs(Number(hot) - Number(cold) - expansion)).toBeLessThan(0.005 * expansion)
  })

  it('is well formed, marks cold and hot, and is none for a vessel without a size', () => {
    const [vessel] = project.vessels.filter((each) => each.status === 'sized')
    if (!vessel) throw new Error('the clinic has a sized vessel')
    const svg = drawAcceptance(vessel, 'SI')?.svg ?? ''
    expect(wellFormed(svg)).toBe(true)
    expect(circles(svg)).toHaveLength(2)
    expect(drawAcceptance({ ...vessel, status: 'infeasible' }, 'SI')).toBeNull()
  })
})

describe('a scale', () => {
  it('begins and ends on a tick and has round steps', () => {
    expect(scaleOver([3, 47], 0, 100, 6).ticks).toEqual([0, 10, 20, 30, 40, 50])
    expect(scaleOver([-3, 3], 0, 100, 4).ticks).toEqual([-4, -2, 0, 2, 4])
    expect(scaleOver([5, 5], 0, 100, 4).ticks.length).toBeGreaterThan(1)
  })
})

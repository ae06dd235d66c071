import { water } from '@coldfill/engine'
import { drawAcceptance, drawPressures, ON_PAPER } from '@coldfill/presentation'
import type { SystemResult } from '@coldfill/sizing'
import { describe, expect, it } from 'vitest'
import { clinicProject, si } from '../testing/index.ts'

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

describe('the drawing of pressure against height', () => {
  it('says a rating that is far off and draws one that is near', () => {
    const vessel = project.vessels.find((each) => each.selected !== null)
    if (!vessel?.selected) throw new Error('the clinic has a chosen vessel')
    const rated = (psi: number) =>
      drawPressures(heating, 'US', ON_PAPER, [
        {
          ...vessel,
          mark: 'ET-1',
          system: 'HWS',
          selected: { ...vessel.selected!, maxPressure: si(`${psi} psi`, 'gauge pressure') },
        },
      ])?.shapes ?? []
    const isDrawn = (psi: number) => rated(psi).some(({ attributes }) => attributes['strokeDasharray'] === '2 4')
    expect(isDrawn(75)).toBe(true)
    expect(isDrawn(300)).toBe(false)
    expect(rated(300).map(({ text }) => text)).toContain('ET-1 rated 300, off the scale')
  })
})

describe('the drawing of water in a vessel against pressure', () => {
  it('has the expansion of the engine between cold and hot of the required vessel', () => {
    // The engine sizes by ASHRAE's equation; the drawing goes by the gas alone. They have to agree.
    const vessel = project.vessels[0]
    if (!vessel) throw new Error('the clinic has vessels')
    const bare = { ...vessel, selected: null, results: { ...vessel.results } }
    delete (bare.results as Record<string, unknown>)['final-pressure']
    const words = drawAcceptance(bare, 'US', ON_PAPER)?.words ?? ''
    const [, cold = '', hot = ''] = /with ([\d.]+) gal of water, hot .* with ([\d.]+) gal of water/.exec(words) ?? []
    const expansion = (vessel.results['expansion-volume']?.value ?? 0) / si('1 gal', 'volume')
    expect(Math.abs(Number(hot) - Number(cold) - expansion)).toBeLessThan(0.005 * expansion)
  })

  it('marks cold and hot, and is none for a vessel without a size', () => {
    const [vessel] = project.vessels.filter((each) => each.status === 'sized')
    if (!vessel) throw new Error('the clinic has a sized vessel')
    const drawn = drawAcceptance(vessel, 'SI', ON_PAPER)
    expect(drawn?.shapes.filter(({ name }) => name === 'circle')).toHaveLength(2)
    expect(drawAcceptance({ ...vessel, status: 'infeasible' }, 'SI', ON_PAPER)).toBeNull()
  })
})

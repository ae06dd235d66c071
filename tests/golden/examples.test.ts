import { resultJson, sizeSpec } from '@coldfill/sizing'
import { describe, expect, it } from 'vitest'
import { ev1, ev2, pt1 } from './alder-court.by-hand.ts'
import { exampleNames, exampleText, reading, vesselOf } from './examples.ts'
import { et1, et1With, et2, tet1 } from './fernhollow.by-hand.ts'

// Fluid values in the hand calculations have seven digits or more and expansion is a difference of two of them: a unit in
// the last place is 1e-9/1e-3 of about 0.03, some 3e-5 of the result. Half a unit of the fourth digit is 5e-5.
const DIGITS = 4

describe.each(exampleNames)('the example %s', (name) => {
  const text = exampleText(name)
  const result = sizeSpec(text)

  it('begins with the line that tells an editor its schema', () => {
    expect(text.split('\n')[0]).toBe('# yaml-language-server: $schema=https://localhost/schema/coldfill-1.json')
  })

  it('has no error, and no warning that is not accepted with a reason', () => {
    const open = result.findings.filter(({ severity, accepted }) => severity !== 'note' && accepted === undefined)
    expect(open.map(({ code, message }) => `${code} ${message}`)).toEqual([])
  })

  it('has a size for every vessel', () => {
    expect(result.vessels.map(({ mark, status }) => `${mark} ${status}`)).toEqual(
      result.vessels.map(({ mark }) => `${mark} sized`),
    )
    expect(result.vessels.length).toBeGreaterThan(0)
  })

  it('is sized twice to the same bytes', () => {
    expect(JSON.stringify(sizeSpec(text))).toBe(JSON.stringify(result))
    expect(JSON.stringify(resultJson(sizeSpec(text)))).toBe(JSON.stringify(resultJson(result)))
  })

  it('has a source for every step and every assumption', () => {
    const cited = [
      ...result.assumptions.map(({ source }) => source.source),
      ...result.vessels.flatMap(({ trace }) =>
        trace.flatMap(({ entries }) =>
          entries.flatMap((entry) => (entry.entry === 'step' ? [entry.source.source] : [])),
        ),
      ),
    ]
    expect(cited.length).toBeGreaterThan(10)
    expect(cited.filter((id) => result.sources[id] === undefined)).toEqual([])
  })
})

describe('the clinic at 5,200 ft, against the hand calculation', () => {
  const result = sizeSpec(exampleText('fernhollow'))

  it('has the atmosphere of its height', () => {
    expect(result.project.atmosphere / 6894.757293168361 / 12.136587).toBeCloseTo(1, DIGITS)
  })

  it.each([
    ['ET-1', et1],
    ['ET-2', et2],
    ['TET-1', tet1],
  ])('%s', (mark, hand) => {
    const vessel = vesselOf(result, mark)
    expect(reading(vessel, 'system-volume', 'gal') / hand.system).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'expansion-volume', 'gal') / hand.expansion).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'fill-pressure', 'psi') / hand.fill).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'precharge', 'psi') / hand.fill).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'maximum-pressure', 'psi') / hand.maximum).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'required-volume', 'gal') / hand.required).toBeCloseTo(1, DIGITS)
  })

  it('holds the least volume of the mechanical code beside ET-1', () => {
    expect(reading(vesselOf(result, 'ET-1'), 'code-minimum-volume', 'gal') / et1.codeMinimum).toBeCloseTo(1, DIGITS)
    expect(et1.required).toBeGreaterThan(et1.codeMinimum)
  })

  it.each([30, 60])('answers to a relief valve of %i psi', (relief) => {
    const changed = sizeSpec(exampleText('fernhollow').replace('relief-valve: 50 psi', `relief-valve: ${relief} psi`))
    expect(
      reading(vesselOf(changed, 'ET-1'), 'required-volume', 'gal') / et1With({ relief, height: 42 }).required,
    ).toBeCloseTo(1, DIGITS)
    expect(reading(vesselOf(changed, 'ET-1'), 'precharge', 'psi') / et1.fill).toBeCloseTo(1, DIGITS)
  })

  it('warns of a tank below the code minimum where the piping is copper', () => {
    const copper = sizeSpec(exampleText('fernhollow').replace('material: steel # most', 'material: copper # most'))
    expect(copper.findings.filter(({ code }) => code === 'CF-E045').map(({ path }) => path)).toEqual([
      'systems.HWS.vessels.ET-1',
    ])
  })

  it('blocks the glycol vessel alone where its data end', () => {
    const hot = sizeSpec(exampleText('fernhollow').replace('high: 165 °F', 'high: 230 °F'))
    expect(hot.vessels.map(({ mark, status }) => `${mark} ${status}`)).toEqual([
      'ET-1 sized',
      'ET-2 blocked',
      'TET-1 sized',
    ])
  })

  it('has no vessel for hot water without a regulator, and says so', () => {
    const bare = sizeSpec(exampleText('fernhollow').replace(/^ *regulator: .*\n/mu, ''))
    expect(vesselOf(bare, 'TET-1').status).toBe('infeasible')
    expect(bare.findings.map(({ code }) => code)).toEqual(expect.arrayContaining(['CF-E022', 'CF-E051']))
  })
})

describe('the apartment house, against the hand calculation', () => {
  const result = sizeSpec(exampleText('alder-court'))

  it('EV-1, EN 12828', () => {
    const vessel = vesselOf(result, 'EV-1')
    expect(reading(vessel, 'system-volume', 'L') / ev1.system).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'expansion-volume', 'L') / ev1.expansion).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'water-reserve', 'L') / ev1.reserve).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'precharge', 'bar') / ev1.precharge).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'maximum-pressure', 'bar') / ev1.maximum).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'required-volume', 'L') / ev1.required).toBeCloseTo(1, DIGITS)
  })

  it('PT-1, starts per hour', () => {
    const vessel = vesselOf(result, 'PT-1')
    expect(reading(vessel, 'drawdown', 'L') / pt1.drawdown).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'precharge', 'bar') / pt1.precharge).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'required-volume', 'L') / pt1.required).toBeCloseTo(1, DIGITS)
  })

  it('EV-2, DIN 4807-5', () => {
    const vessel = vesselOf(result, 'EV-2')
    expect(reading(vessel, 'system-volume', 'L') / ev2.system).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'expansion-volume', 'L') / ev2.expansion).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'precharge', 'bar') / ev2.precharge).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'maximum-pressure', 'bar') / ev2.maximum).toBeCloseTo(1, DIGITS)
    expect(reading(vessel, 'required-volume', 'L') / ev2.required).toBeCloseTo(1, DIGITS)
  })
})

describe('sizes of the clinic, against the trade (common practice, no source)', () => {
  const result = sizeSpec(exampleText('fernhollow'))

  it('a pair of heaters of 200 gal takes a tank several times the 2 to 5 gal of a house', () => {
    const volume = reading(vesselOf(result, 'TET-1'), 'required-volume', 'gal')
    expect(volume).toBeGreaterThan(6)
    expect(volume).toBeLessThan(85)
  })

  it('the potable tank is charged to the incoming pressure', () => {
    expect(reading(vesselOf(result, 'TET-1'), 'precharge', 'psi') / 60).toBeCloseTo(1, DIGITS)
  })

  it('hydronic charge leaves 4 psi or more at the top', () => {
    // 2.31 ft of cold water to the psi.
    expect(reading(vesselOf(result, 'ET-1'), 'precharge', 'psi') - 42 / 2.31).toBeGreaterThan(3.95)
  })
})

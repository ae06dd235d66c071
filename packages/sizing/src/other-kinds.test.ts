import { fromSi, type Kind, unitOf } from '@coldfill/units'
import { describe, expect, it } from 'vitest'
import type { ProjectResult, VesselResult } from './result.ts'
import { sizeSpec } from './size-spec.ts'

const spec = (service: string, system: string, vessel: string): string => `coldfill: 1
project: { number: T-1 }
systems:
  S:
    service: ${service}
${system}
    vessels:
      V-1: { ${vessel} }
`

const only = (result: ProjectResult): VesselResult => {
  const [vessel] = result.vessels
  if (!vessel) throw new Error(result.findings.map(({ message }) => message).join('\n'))
  return vessel
}
const sized = (text: string): VesselResult => {
  const vessel = only(sizeSpec(text))
  if (vessel.status !== 'sized') throw new Error(`${vessel.status}: ${vessel.reason}`)
  return vessel
}
const read = (vessel: VesselResult, name: string, kind: Kind, unit: string): number =>
  fromSi(vessel.results[name]?.value ?? Number.NaN, unitOf(kind, unit))
const gallons = (vessel: VesselResult, name = 'required-volume') => read(vessel, name, 'volume', 'gal')
const litres = (vessel: VesselResult, name = 'required-volume') => read(vessel, name, 'volume', 'L')
const gph = (vessel: VesselResult, name = 'recovery') => read(vessel, name, 'hourly flow', 'gph')
/** Relative deviation from a printed figure. */
const off = (actual: number, expected: number): number => Math.abs(actual / expected - 1)

const storage = (demand: string, vessel: string): string =>
  spec(
    'domestic hot water',
    `    temperatures: { cold: 40 °F, storage: 140 °F }\n    demand: { ${demand} }`,
    `kind: storage tank, ${vessel}`,
  )

describe('storage tank', () => {
  // ASHRAE HVAC Applications, service water heating, example of the apartment building, from memory.
  it('is 945 gal with 756 gph for the apartment building of the handbook', () => {
    const vessel = sized(
      storage(
        'building: apartment house, fixtures: { lavatory: 60, bathtub: 30, shower: 30, kitchen sink: 60, laundry tub: 15 }',
        'method: ashrae fixture',
      ),
    )
    expect(off(gph(vessel), 756)).toBeLessThanOrEqual(1e-9)
    expect(off(gallons(vessel), 945)).toBeLessThanOrEqual(1e-9)
    expect(off(gallons(vessel, 'storage-volume'), 945)).toBeLessThanOrEqual(1e-9)
    // 756 gph, 100 °F and 8.33 lb/gal: 629.7 MBH; the density at the mean temperature is some 0.4 % lower.
    expect(off(read(vessel, 'heat-input', 'power', 'MBH'), 629.7)).toBeLessThanOrEqual(0.006)
    expect(vessel.assumptions).toContain('storage.fixture-demand-age')
  })

  // ASPE Plumbing Engineering Design Handbook volume 2, method 1: 1104, 331, 414 and 591; its bath with shower counts 20 gph.
  it('is 591 gal with 331 gph for the sixteen apartments of the plumbing handbook', () => {
    const vessel = sized(
      storage(
        'building: apartment house, fixtures: { kitchen sink: 16, dishwasher: 16, lavatory: 32, bathtub: 32 }',
        'method: aspe fixture',
      ),
    )
    expect(off(gph(vessel), 331)).toBeLessThanOrEqual(0.0015)
    expect(off(gallons(vessel, 'usable-volume'), 414)).toBeLessThanOrEqual(0.001)
    expect(off(gallons(vessel, 'storage-volume'), 591)).toBeLessThanOrEqual(0.001)
    expect(off(gallons(vessel), 591)).toBeLessThanOrEqual(0.001)
    expect(vessel.assumptions).toContain('storage.usable-fraction')
  })

  // ASHRAE HVAC Applications, service water heating, example 1: 330 gph and 5,143 gal, rounded to 5,150.
  it('is 5,150 gal with 330 gph for a dormitory of 300 students by readings of the curve', () => {
    const vessel = sized(storage('people: 300', 'method: recovery and storage, recovery: 1.1 gph, storage: 12 gal'))
    expect(off(gph(vessel), 330)).toBeLessThanOrEqual(1e-9)
    expect(off(gallons(vessel), 5150)).toBeLessThanOrEqual(0.0015)
  })

  // ASHRAE HVAC Applications, table of demands by type of building, from memory: 100 apartments, 700 gal in an hour, 6,000 gal on the largest day.
  it('recovers 700 gph for 100 apartments', () => {
    const vessel = sized(storage('apartments: 100', 'method: per apartment'))
    expect(off(gph(vessel), 700)).toBeLessThanOrEqual(1e-9)
    expect(off(gallons(vessel, 'largest-day'), 6000)).toBeLessThanOrEqual(1e-9)
    expect(off(gallons(vessel, 'average-day'), 3700)).toBeLessThanOrEqual(1e-9)
  })

  // By hand between the rows of the same table: 35 apartments stand halfway between 20 (12 gal) and 50 (10 gal): 11 · 35.
  it('reads between the rows for 35 apartments', () => {
    expect(off(gph(sized(storage('apartments: 35', 'method: per apartment'))), 385)).toBeLessThanOrEqual(1e-9)
  })

  // ASHRAE table of draws per person, from memory, by hand: 2.9 gal in half an hour, usable 70 %.
  it('holds 414 gal for 100 people and half an hour of peak', () => {
    const vessel = sized(storage('people: 100', 'method: per person'))
    expect(off(gallons(vessel), 290 / 0.7)).toBeLessThanOrEqual(1e-9)
    expect(off(gph(vessel), 270)).toBeLessThanOrEqual(1e-9)
  })

  // By hand between the rows: 20 min lie a third of the way from 1.7 gal in 15 min to 2.9 gal in 30 min: 2.1 gal.
  it('reads between the rows for a peak of 20 minutes', () => {
    const vessel = sized(storage('people: 100', 'method: per person, peak-time: 20 min'))
    expect(off(gallons(vessel, 'usable-volume'), 210)).toBeLessThanOrEqual(1e-9)
  })

  // DIN 4708-2: the standard dwelling is the unit of the index.
  it('asks for an index of 10 for ten standard dwellings, and for the index that is given', () => {
    const dwellings = sized(storage('apartments: 10', 'method: din 4708'))
    expect(off(dwellings.results['demand-index']?.value ?? Number.NaN, 10)).toBeLessThanOrEqual(1e-12)
    const given = sized(storage('apartments: 10', 'method: din 4708, demand-index: 12'))
    expect(off(given.results['performance-index']?.value ?? Number.NaN, 12)).toBeLessThanOrEqual(1e-12)
  })

  it('is blocked, with a finding at the fixture, where the table has no figure for it', () => {
    const result = sizeSpec(storage('building: office building, fixtures: { bathtub: 3 }', 'method: ashrae fixture'))
    expect(only(result).status).toBe('blocked')
    const found = result.findings.find(({ code }) => code === 'CF-E014')
    expect(found?.path).toBe('systems.S.demand.fixtures.bathtub')
  })

  it('is blocked where the peak is longer than the table', () => {
    const result = sizeSpec(storage('people: 10', 'method: per person, peak-time: 5 h'))
    expect(only(result).status).toBe('blocked')
    expect(result.findings.map(({ code }) => code)).toContain('CF-E014')
  })
})

describe('solar expansion tank', () => {
  // Technical guide 022 of ASIT and IDAE, p. 88, case 1: 48.5 L times 2.37 give 114.9 L; the growth of 5.525 L is rounded to 5.5.
  const loop = (pressure: string): string =>
    spec(
      'solar thermal',
      `    pressure: ${pressure}\n    contents: [ { volume: 65 L, note: loop } ]`,
      'kind: solar expansion tank, collector-volume: 30 L, piping-above: 10 L',
    ).replace('project: { number: T-1 }', 'project: { number: T-1, elevation: 0 ft }')

  it('is 114.9 L for the loop of the guide', () => {
    const vessel = sized(loop('{ fill: 2.7 bar, maximum: 5.4 bar }'))
    expect(off(litres(vessel, 'expansion-volume'), 48.5)).toBeLessThanOrEqual(0.001)
    // The guide takes the atmosphere as 1 bar; the standard atmosphere makes the coefficient 0.2 % larger.
    expect(off(litres(vessel), 114.9)).toBeLessThanOrEqual(0.004)
  })

  // The same, case 2: the coefficient is 2 at least, 97 L.
  it('is 97 L where the coefficient falls to its least', () => {
    expect(off(litres(sized(loop('{ fill: 1 bar, maximum: 5.4 bar }'))), 97)).toBeLessThanOrEqual(0.0006)
  })

  it('is infeasible where the pressures leave no room', () => {
    expect(only(sizeSpec(loop('{ fill: 5.4 bar, maximum: 5.4 bar }'))).status).toBe('infeasible')
  })
})

describe('vessels by trade rules', () => {
  const heating = (vessel: string): string => spec('heating water', '    contents: [ { volume: 3000 gal } ]', vessel)

  // Common practice, no source: 3 % of 3,000 gal are more than a drum.
  it('holds 90 gal of glycol for 3,000 gal', () => {
    expect(off(gallons(sized(heating('kind: glycol feeder'))), 90)).toBeLessThanOrEqual(1e-9)
  })

  // Hydronics trade article: 4 ft/s at most; evaluated apart from this program: 3.1957 in.
  it('enters an air and dirt separator by 3.20 in at 100 gpm', () => {
    const vessel = sized(heating('kind: air and dirt separator, flow: 100 gpm'))
    expect(off(read(vessel, 'minimum-bore', 'diameter', 'in'), 3.1957)).toBeLessThanOrEqual(0.0002)
  })

  // By hand: 0.2228 ft3/s at 0.4 ft/s are 80.21 in2, a circle of 10.106 in.
  it('gives a hydraulic separator of 100 gpm a body of 10.1 in', () => {
    const vessel = sized(heating('kind: hydraulic separator, source-flow: 80 gpm, load-flow: 100 gpm'))
    expect(off(read(vessel, 'body-diameter', 'diameter', 'in'), 10.1057)).toBeLessThanOrEqual(1e-5)
  })

  // Solar design practice, by hand: 10 + 3 + 4.
  it('gives 17 gal to a drain-back tank', () => {
    const vessel = sized(
      spec('solar thermal', '', 'kind: drain-back tank, collector-volume: 10 gal, piping-above: 3 gal'),
    )
    expect(off(gallons(vessel), 17)).toBeLessThanOrEqual(1e-9)
  })

  // By hand: 40 gpm over half an hour, 80 % usable.
  it('gives 1,500 gal to a break tank', () => {
    const vessel = sized(
      spec('domestic cold water', '', 'kind: break tank, peak-flow: 60 gpm, refill-flow: 20 gpm, holding-time: 30 min'),
    )
    expect(off(gallons(vessel), 1500)).toBeLessThanOrEqual(1e-9)
  })
})

describe('steam vessels', () => {
  const steam = (vessel: string, system = ''): string => spec('steam', system, vessel)

  // ASHRAE HVAC Systems and Equipment practice of 10 ft/s, evaluated apart from this program: 591.67 lb/h and 7.837 in.
  it('flashes 592 lb/h of 5,000 lb/h from 100 to 5 psig, in a tank of 7.8 in', () => {
    const vessel = sized(
      steam('kind: flash tank, condensate-flow: 5000 lb/h, condensate-pressure: 100 psi, flash-pressure: 5 psi'),
    )
    expect(off(read(vessel, 'flash-steam', 'mass flow', 'lb/h'), 591.67)).toBeLessThanOrEqual(0.001)
    expect(off(read(vessel, 'diameter', 'diameter', 'in'), 7.83693)).toBeLessThanOrEqual(0.001)
  })

  // Article on flash tanks by an ASHRAE member: 13.3 % from 100 psig to atmosphere.
  it('flashes 13.3 % from 100 psig to atmosphere', () => {
    const vessel = sized(
      steam('kind: flash tank, condensate-flow: 1000 lb/h, condensate-pressure: 100 psi, flash-pressure: 0 psi'),
    )
    expect(off(vessel.results['flash-fraction']?.value ?? Number.NaN, 0.133)).toBeLessThanOrEqual(0.004)
  })

  it('is infeasible where the flash pressure is not below the condensate pressure', () => {
    const text = steam(
      'kind: flash tank, condensate-flow: 1000 lb/h, condensate-pressure: 5 psi, flash-pressure: 5 psi',
    )
    const result = sizeSpec(text)
    expect(only(result).status).toBe('infeasible')
    expect(result.findings.map(({ code }) => code)).toContain('CF-E026')
  })

  // National Board NB-27: twice the volume blown; 60 ft2 dropped by 4 in are 149.61 gal.
  it('gives a blowdown separator twice the volume blown', () => {
    const vessel = sized(steam('kind: blowdown separator, water-surface: 60 ft2, boiler-pressure: 100 psi'))
    expect(off(gallons(vessel, 'blown-volume'), 149.61)).toBeLessThanOrEqual(2e-5)
    expect(off(gallons(vessel), 299.22)).toBeLessThanOrEqual(2e-5)
    expect(
      off(gallons(sized(steam('kind: blowdown separator, blown-volume: 60 gal, boiler-pressure: 100 psi'))), 120),
    ).toBeLessThanOrEqual(1e-9)
  })

  // Steam-heating columnist: 8,000 ft2 EDR make 4 gpm of condensate and ask for a pump of 12 gpm; 240 Btu/h a square foot over 970.3 Btu/lb.
  it('pumps 12 gpm of condensate for 8,000 ft2, and holds a minute of it', () => {
    const vessel = sized(steam('kind: condensate receiver, steaming-rate: 1978.77 lb/h'))
    expect(off(read(vessel, 'pump-flow', 'flow', 'gpm'), 12)).toBeLessThanOrEqual(0.035)
    expect(off(gallons(vessel), 12)).toBeLessThanOrEqual(0.035)
    expect(vessel.assumptions).toContain('condensate.duty')
  })

  // By hand with 7.996 lb/gal at 212 °F: 3,450 lb/h over 20 minutes, 75 % usable.
  it('holds twenty minutes of evaporation for boiler feed', () => {
    const vessel = sized(steam('kind: condensate receiver, steaming-rate: 3450 lb/h, duty: boiler feed'))
    expect(off(gallons(vessel), 191.8)).toBeLessThanOrEqual(0.001)
    expect(vessel.assumptions).not.toContain('condensate.duty')
  })

  it('is blocked where the steam system is said to hold glycol', () => {
    const fluid = '    fluid: { base: propylene glycol, strength: 30 % vol }'
    const result = sizeSpec(steam('kind: condensate receiver, steaming-rate: 3450 lb/h', fluid))
    expect(only(result).status).toBe('blocked')
  })
})

describe('pressure tank by further rules', () => {
  const booster = (vessel: string): string =>
    spec('domestic cold water', '    pressure: { cut-in: 30 psi, cut-out: 50 psi }', `kind: pressure tank, ${vessel}`)

  // Recommended Standards for Water Works, 7.2.2 b: ten times the flow of the largest pump.
  it('is 2,500 gal for a pump of 250 gpm by the rule for public water', () => {
    expect(off(gallons(sized(booster('method: ten states, pump-flow: 250 gpm'))), 2500)).toBeLessThanOrEqual(1e-9)
  })

  // Common practice, no source: the least demand for the time that the pumps stay off, 4 gpm for 5 min.
  it('draws down 20 gal for a least demand of 4 gpm and five minutes', () => {
    const vessel = sized(booster('low-demand: 4 gpm, off-time: 5 min'))
    expect(vessel.method).toBe('off time')
    expect(off(gallons(vessel, 'drawdown'), 20)).toBeLessThanOrEqual(1e-9)
  })
})

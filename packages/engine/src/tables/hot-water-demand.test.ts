import { describe, expect, it } from 'vitest'
import { apartmentDemand } from './ashrae-service-water.apartments.ts'
import {
  demandBuildings,
  demandFactor,
  demandFixture,
  fixtureDemand,
  fixtureDemandRows,
  storageFactor,
  type DemandBuilding,
} from './ashrae-service-water.fixture-demand.ts'
import { personDayDemand, personPeakDemand } from './ashrae-service-water.people.ts'
import { draws } from './din-4708-2.draws.ts'
import { occupancy, standardDwelling } from './din-4708-2.occupancy.ts'

const total = (building: DemandBuilding, fixtures: Readonly<Record<string, number>>): number =>
  Object.entries(fixtures).reduce((sum, [name, count]) => {
    const fixture = demandFixture(name)
    const demand = fixture === undefined ? null : fixtureDemand(fixture, building)
    return sum + count * (typeof demand === 'number' ? demand : Number.NaN)
  }, 0)

describe('hot-water demand per fixture', () => {
  // ASHRAE HVAC Applications, Service Water Heating, example of the apartment building: 2520 gal/h possible, 756 probable, 945 gal.
  it('gives the figures of the handbook example', () => {
    const possible = total('apartment house', {
      lavatory: 60,
      bathtub: 30,
      shower: 30,
      'kitchen sink': 60,
      'laundry tub': 15,
    })
    expect(possible).toBe(2520)
    expect(possible * demandFactor['apartment house']).toBeCloseTo(756, 9)
    expect(possible * demandFactor['apartment house'] * storageFactor['apartment house']).toBeCloseTo(945, 9)
  })

  // ASPE Plumbing Engineering Design Handbook, sixteen apartments: 1104 gal/h, 331 probable, 414 gal usable (its bath with shower counts 20).
  it('gives the figures of the second example', () => {
    const possible = total('apartment house', { 'kitchen sink': 16, dishwasher: 16, lavatory: 32, bathtub: 32 })
    expect(possible).toBe(1104)
    expect(possible * demandFactor['apartment house']).toBeCloseTo(331, 0)
    expect(possible * demandFactor['apartment house'] * storageFactor['apartment house']).toBeCloseTo(414, 0)
  })

  it('has a figure or none for every fixture in every building, and ranges that rise', () => {
    const rows = Object.values(fixtureDemandRows)
    expect(rows.map((row) => row.length)).toEqual(rows.map(() => demandBuildings.length))
    const falling = rows.flatMap((row) => row.filter((cell) => Array.isArray(cell) && cell[0] >= cell[1]))
    expect(falling).toEqual([])
  })

  it('does not know a fixture that the table has not', () => {
    expect(demandFixture('bath robe')).toBeUndefined()
    expect(demandFixture('constructor')).toBeUndefined()
    expect(fixtureDemand('bathtub', 'office building')).toBeNull()
  })
})

describe('demand by apartment and person', () => {
  // ASHRAE HVAC Applications, table of demands by type of building, from memory: 100 apartments use 700 gal in the busiest hour,
  // 6000 gal on the busiest day and 3700 gal on an average one.
  it('gives the handbook figures for a hundred apartments', () => {
    const row = apartmentDemand.find(({ apartments }) => apartments === 100)
    expect([row?.mostInAnHour, row?.mostInADay, row?.averageDay].map((each) => (each ?? Number.NaN) * 100)).toEqual([
      700, 6000, 3700,
    ])
  })

  it('falls an apartment as there are more, and grows with the period and with the use', () => {
    const falling = apartmentDemand.filter(
      (row, n) => n > 0 && row.mostInAnHour >= (apartmentDemand[n - 1]?.mostInAnHour ?? 0),
    )
    expect(falling).toEqual([])
    const disordered = personPeakDemand.filter(
      (row, n) =>
        !(row.low < row.medium && row.medium < row.high && row.medium > (personPeakDemand[n - 1]?.medium ?? 0)),
    )
    expect(disordered).toEqual([])
    expect(personDayDemand.most.medium).toBeGreaterThan(personDayDemand.average.medium)
  })
})

describe('demand index', () => {
  // DIN 4708-2, standard dwelling of four rooms: 3.5 people and 5820 Wh, together 20 370 Wh; ten of them have the index 10.
  it('counts a standard dwelling as one', () => {
    const people = occupancy.find(({ rooms }) => rooms === standardDwelling.rooms)?.people ?? Number.NaN
    expect(people * draws.bathtub.energy).toBe(20370)
    expect((10 * people * draws.bathtub.energy) / (standardDwelling.people * standardDwelling.draw)).toBe(10)
  })

  it('keeps the energy of every draw near that of its litres heated by 35 K (1.163 Wh a litre and kelvin)', () => {
    const strayed = Object.values(draws).filter(
      ({ litres, energy }) => Math.abs(energy / (litres * 35 * 1.163) - 1) > 0.08,
    )
    expect(strayed).toEqual([])
  })
})

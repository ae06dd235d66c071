import { cite, citeFromMemory } from '../citation.ts'
import { ashraeServiceWater } from '../sources/ashrae-service-water.ts'

/** Building types of the table. */
export const demandBuildings = [
  'apartment house',
  'club',
  'gymnasium',
  'hospital',
  'hotel',
  'industrial plant',
  'office building',
  'private residence',
  'school',
  'hostel with gymnasium',
] as const

export type DemandBuilding = (typeof demandBuildings)[number]

/** Gallons per hour of water at 140 °F for one fixture; a pair is a range; null where the table has no figure. */
export type FixtureDemand = number | readonly [least: number, most: number] | null

type Row = readonly [
  apartmentHouse: FixtureDemand,
  club: FixtureDemand,
  gymnasium: FixtureDemand,
  hospital: FixtureDemand,
  hotel: FixtureDemand,
  industrialPlant: FixtureDemand,
  office: FixtureDemand,
  privateResidence: FixtureDemand,
  school: FixtureDemand,
  hostel: FixtureDemand,
]

// Cell positions merged from two reproductions and memory; one reproduction has 20 for the kitchen sink of a private
// residence and 50 to 210 for the dishwasher of a hotel. The figures predate low-flow fixtures and are mostly high.
export const fixtureDemandSource = citeFromMemory(
  ashraeServiceWater,
  'table of the hot-water demand per fixture, gal/h at 140 °F',
)

/** Gallons per hour by fixture, in the order of `demandBuildings`. */
export const fixtureDemandRows = {
  'private lavatory': [2, 2, 2, 2, 2, 2, 2, 2, 2, 2],
  'public lavatory': [4, 6, 8, 6, 8, 12, 6, null, 15, 8],
  bathtub: [20, 20, 30, 20, 20, null, null, 20, null, 30],
  dishwasher: [15, [50, 150], null, [50, 150], [50, 200], [20, 100], null, 15, [20, 100], [20, 100]],
  'foot basin': [3, 3, 12, 3, 3, 12, null, 3, 3, 12],
  'kitchen sink': [10, 20, null, 20, 30, 20, 20, 10, 20, 20],
  'laundry tub': [20, 28, null, 28, 28, null, null, 20, null, 28],
  'pantry sink': [5, 10, null, 10, 10, null, 10, 5, 10, 10],
  shower: [30, 150, 225, 75, 75, 225, 30, 30, 225, 225],
  'service sink': [20, 20, null, 20, 30, 20, 20, 15, 20, 20],
  'circular wash sink': [null, null, null, 20, 20, 30, 20, null, 30, null],
  'semicircular wash sink': [null, null, null, 10, 10, 15, 10, null, 15, null],
} as const satisfies Readonly<Record<string, Row>>

export type DemandFixture = keyof typeof fixtureDemandRows

/** Other names of a fixture in a spec. A lavatory not called public is a private one. */
export const fixtureAliases: Readonly<Record<string, DemandFixture>> = { lavatory: 'private lavatory' }

// The two rows of factors were read on a page.
export const demandFactorSource = cite(
  ashraeServiceWater,
  'table of the hot-water demand per fixture, demand factor and storage capacity factor',
)

/** Share of the demand of all fixtures that is drawn in the busiest hour. */
export const demandFactor: Readonly<Record<DemandBuilding, number>> = {
  'apartment house': 0.3,
  club: 0.3,
  gymnasium: 0.4,
  hospital: 0.25,
  hotel: 0.25,
  'industrial plant': 0.4,
  'office building': 0.3,
  'private residence': 0.3,
  school: 0.4,
  'hostel with gymnasium': 0.4,
}

/** Storage per probable demand of the busiest hour. */
export const storageFactor: Readonly<Record<DemandBuilding, number>> = {
  'apartment house': 1.25,
  club: 0.9,
  gymnasium: 1,
  hospital: 0.6,
  hotel: 0.8,
  'industrial plant': 1,
  'office building': 2,
  'private residence': 0.7,
  school: 1,
  'hostel with gymnasium': 1,
}

/** A fixture by its name or an alias of it. */
export const demandFixture = (name: string): DemandFixture | undefined => {
  const plain = name.trim().toLowerCase()
  if (Object.hasOwn(fixtureDemandRows, plain)) return plain as DemandFixture
  return Object.hasOwn(fixtureAliases, plain) ? fixtureAliases[plain] : undefined
}

/** Demand of one fixture in a building, gal/h at 140 °F; null where the table has no figure for the pair. */
export const fixtureDemand = (fixture: DemandFixture, building: DemandBuilding): FixtureDemand =>
  fixtureDemandRows[fixture][demandBuildings.indexOf(building)] ?? null

import { citeFromMemory } from '../citation.ts'
import { ashraeServiceWater } from '../sources/ashrae-service-water.ts'

export const apartmentDemandSource = citeFromMemory(
  ashraeServiceWater,
  'table of demands and use by type of building, apartment houses',
)

/** Gallons an apartment by the number of apartments. The first row holds for 20 or fewer, the last for 200 or more. */
export const apartmentDemand: readonly {
  readonly apartments: number
  readonly mostInAnHour: number
  readonly mostInADay: number
  readonly averageDay: number
}[] = [
  { apartments: 20, mostInAnHour: 12, mostInADay: 80, averageDay: 42 },
  { apartments: 50, mostInAnHour: 10, mostInADay: 73, averageDay: 40 },
  { apartments: 75, mostInAnHour: 8.5, mostInADay: 66, averageDay: 38 },
  { apartments: 100, mostInAnHour: 7, mostInADay: 60, averageDay: 37 },
  { apartments: 200, mostInAnHour: 5, mostInADay: 50, averageDay: 35 },
]

import { citeFromMemory } from '../citation.ts'
import { ashraeServiceWater } from '../sources/ashrae-service-water.ts'

export const personDemandSource = citeFromMemory(
  ashraeServiceWater,
  'table of low, medium and high guidelines per person, apartment houses',
)

/** Gallons a person at 140 °F drawn in a period, for people who use little, a usual amount and much. */
export interface PersonDemand {
  readonly low: number
  readonly medium: number
  readonly high: number
}

/** Largest draw in a period of so many minutes. */
export const personPeakDemand: readonly (PersonDemand & { readonly minutes: number })[] = [
  { minutes: 5, low: 0.4, medium: 0.7, high: 1.2 },
  { minutes: 15, low: 1, medium: 1.7, high: 3 },
  { minutes: 30, low: 1.7, medium: 2.9, high: 5.1 },
  { minutes: 60, low: 2.8, medium: 4.8, high: 8.5 },
  { minutes: 120, low: 4.5, medium: 8, high: 14.5 },
  { minutes: 180, low: 6.1, medium: 11, high: 19 },
]

export const personDayDemand: { readonly most: PersonDemand; readonly average: PersonDemand } = {
  most: { low: 20, medium: 49, high: 90 },
  average: { low: 14, medium: 30, high: 54 },
}

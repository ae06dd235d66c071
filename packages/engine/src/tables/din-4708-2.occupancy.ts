import { cite, citeFromMemory } from '../citation.ts'
import { din4708Part2 } from '../sources/din-4708-2.ts'

export const occupancySource = citeFromMemory(din4708Part2, 'table of the occupancy by number of rooms')

/** People in a dwelling by its number of rooms, kitchen and bath not counted. */
export const occupancy: readonly { readonly rooms: number; readonly people: number }[] = [
  { rooms: 1, people: 2 },
  { rooms: 2, people: 2 },
  { rooms: 2.5, people: 2.3 },
  { rooms: 3, people: 2.7 },
  { rooms: 3.5, people: 3.1 },
  { rooms: 4, people: 3.5 },
  { rooms: 4.5, people: 3.9 },
  { rooms: 5, people: 4.3 },
  { rooms: 6, people: 5 },
]

export const standardDwellingSource = cite(din4708Part2, 'standard dwelling')

/** The dwelling that counts as 1 in the demand index: people, and the energy of one draw of its bath in Wh. */
export const standardDwelling = { rooms: 4, people: 3.5, draw: 5820 } as const

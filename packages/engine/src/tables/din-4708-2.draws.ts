import { citeFromMemory } from '../citation.ts'
import { din4708Part2 } from '../sources/din-4708-2.ts'

export const drawSource = citeFromMemory(din4708Part2, 'table of the energy of a draw by fitting')

/** Litres and Wh of one draw by fitting. */
export const draws = {
  bathtub: { litres: 140, energy: 5820 },
  'large bathtub': { litres: 160, energy: 6510 },
  'small bathtub': { litres: 120, energy: 4890 },
  'very large bathtub': { litres: 200, energy: 8720 },
  'shower with saving head': { litres: 40, energy: 1630 },
  shower: { litres: 90, energy: 3660 },
  'large shower': { litres: 180, energy: 7320 },
  'wash basin': { litres: 17, energy: 700 },
  bidet: { litres: 20, energy: 810 },
  'hand basin': { litres: 9, energy: 350 },
  'kitchen sink': { litres: 30, energy: 1160 },
} as const

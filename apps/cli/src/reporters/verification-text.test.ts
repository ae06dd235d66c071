import { casesNotRun, verificationRows } from '@coldfill/engine'
import { describe, expect, it } from 'vitest'
import { verificationText } from './verification-text.ts'

const rows = verificationRows()
const text = verificationText(rows, casesNotRun)
const lines = text.split('\n')

describe('verification manual as text', () => {
  it('has a line for every figure and for every case that is not run', () => {
    const missing = rows.filter(
      ({ id, what }) => !lines.some((line) => line.startsWith(`${id} `) && line.includes(what)),
    )
    expect(missing.map(({ id }) => id)).toEqual([])
    expect(casesNotRun.filter(({ id }) => !lines.some((line) => line.startsWith(`${id}: `)))).toEqual([])
  })

  // ASHRAE HVAC Systems and Equipment, hydronic chapter, from memory: 578 gal of plain steel.
  it('shows expected beside computed in the unit that is printed', () => {
    const line = lines.find((each) => each.startsWith('H01 '))
    expect(line).toMatch(/578 gal\s+577\.8 gal\s+-0\.04 %\s+0\.30 %\s+from memory\s+holds/u)
  })

  it('gives the reason below a figure that is known to be wrong', () => {
    expect(lines.filter((line) => line.startsWith('Known wrong, S03: '))).toHaveLength(1)
  })

  it('ends with the count of each verdict', () => {
    expect(lines.at(-1)).toMatch(/^\d+ holds, \d+ known wrong, 0 fails$/u)
  })
})

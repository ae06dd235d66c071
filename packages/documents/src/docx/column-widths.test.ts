import { describe, expect, it } from 'vitest'
import { columnWidths } from './column-widths.ts'

const columns = [
  { heading: 'Mark', width: 10 },
  { heading: 'Serves', width: 60 },
  { heading: 'Required volume (gal)', width: 5, align: 'right' as const },
]

describe('widths of the columns of a table', () => {
  it('add up to the width of the table, in whole twips', () => {
    const widths = columnWidths(columns, [['ET-1', 'Heating water', '344']], 9841, 'schedule')
    expect(widths.reduce((sum, width) => sum + width, 0)).toBe(9841)
    expect(widths.every(Number.isInteger)).toBe(true)
  })

  it('give a narrow column room for its longest word', () => {
    const [, serves = 0, required = 0] = columnWidths(columns, [], 9840, 'schedule')
    // "Required" in bold 7 pt Arial is about 32 pt wide by its widths, 640 twips.
    expect(required).toBeGreaterThan(640)
    expect(serves).toBeGreaterThan(required)
  })

  it('let every column give way alike where there is not room for all words', () => {
    const widths = columnWidths(columns, [['x'.repeat(14), 'y'.repeat(14), 'z'.repeat(14)]], 2000, 'table')
    expect(widths.reduce((sum, width) => sum + width, 0)).toBe(2000)
    expect(Math.min(...widths)).toBeGreaterThan(500)
  })
})

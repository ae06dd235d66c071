import { describe, expect, it } from 'vitest'
import { lineWidth, longestWord } from './letter-widths.ts'
import { stackedParts } from './stacked-tables.ts'

const column = (heading: string) => ({ heading, width: 10 })

describe('a table too wide for its page', () => {
  it('stays whole where it fits', () => {
    expect(stackedParts(['Mark', 'Serves', 'Volume'].map(column), [['ET-1', 'Heating', '12']], 4000)).toEqual([
      { columns: [0, 1, 2], size: 'schedule' },
    ])
  })

  it('takes smaller type where that is enough', () => {
    const columns = Array.from({ length: 9 }, () => column('Requirement'))
    const sizes = new Set<string>()
    for (let width = 11_000; width > 6000; width -= 100) {
      const parts = stackedParts(columns, [], width)
      if (parts.length === 1) sizes.add(parts[0]?.size ?? '')
    }
    expect([...sizes]).toEqual(['schedule', 'small'])
  })

  it('parts where it may and repeats the first column', () => {
    const columns = ['Mark', 'Requirement', 'Temperature', 'Acceptance', 'Connection'].map(column)
    expect(stackedParts(columns, [], 3000, [3]).map((part) => part.columns)).toEqual([
      [0, 1, 2],
      [0, 3, 4],
    ])
  })

  it('parts evenly where nothing says where, and keeps every column once', () => {
    const columns = ['Mark', ...Array.from({ length: 9 }, () => 'Requirement')].map(column)
    const parts = stackedParts(columns, [], 4500)
    expect(parts.flatMap((part) => part.columns.slice(1))).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9])
    const lengths = parts.map((part) => part.columns.length)
    expect(Math.max(...lengths) - Math.min(...lengths)).toBeLessThanOrEqual(1)
  })
})

describe('widths of letters', () => {
  // The widths that the PostScript core fonts publish for Helvetica, which Arial follows: M 833, i 222, digits 556.
  it('are those of the family', () => {
    expect(lineWidth('Mi0')).toBeCloseTo(0.833 + 0.222 + 0.556, 9)
    expect(lineWidth('Mi0', true)).toBeCloseTo(0.833 + 0.278 + 0.556, 9)
  })

  it('take a mark for one word, and only a very long word for several', () => {
    expect(longestWord('ET-1 of')).toBeCloseTo(lineWidth('ET-1'), 9)
    expect(longestWord('an-extremely-long-word-of-a-user')).toBeCloseTo(lineWidth('extremely-'), 9)
  })
})

import { describe, expect, it } from 'vitest'
import { moveInGrid } from './grid-move.ts'

const size = { rows: 4, columns: 3 }
const move = (row: number, column: number, key: string, ctrl = false) => {
  const place = moveInGrid({ row, column }, { key, ctrl }, size)
  return place && [place.row, place.column]
}

describe('keys in a grid', () => {
  it('stops at the edges', () => {
    expect(move(0, 0, 'ArrowUp')).toEqual([0, 0])
    expect(move(3, 2, 'ArrowRight')).toEqual([3, 2])
    expect(move(2, 1, 'PageDown')).toEqual([3, 1])
  })
  it('goes to the ends of a row, and with Ctrl to the corners', () => {
    expect(move(2, 1, 'Home')).toEqual([2, 0])
    expect(move(2, 1, 'End')).toEqual([2, 2])
    expect(move(2, 1, 'Home', true)).toEqual([0, 0])
    expect(move(2, 1, 'End', true)).toEqual([3, 2])
  })
  it('leaves other keys alone', () => {
    expect(move(1, 1, 'Tab')).toBeNull()
  })
})

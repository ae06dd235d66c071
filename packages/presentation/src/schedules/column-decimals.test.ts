import { describe, expect, it } from 'vitest'
import { decimalsFor, fixedText } from './column-decimals.ts'

describe('decimals of a column', () => {
  it.each([
    { values: [343.853], decimals: 0 },
    { values: [343.853, 16.94], decimals: 1 },
    { values: [7.48, 120], decimals: 2 },
    { values: [50, 180, 40.00000000000001], decimals: 0 },
    { values: [0, 0.5], decimals: 3 },
    { values: [], decimals: 0 },
    { values: [0.0305, 4], decimals: 4 },
    { values: [1e-7], decimals: 5 },
  ])('give $values $decimals', ({ values, decimals }) => {
    expect(decimalsFor(values)).toBe(decimals)
  })

  it('never shows a negative zero', () => {
    expect(fixedText(-0.0001, 1)).toBe('0.0')
    expect(fixedText(-0.06, 1)).toBe('-0.1')
  })
})

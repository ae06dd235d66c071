import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { distance, nearest } from './nearest.ts'

describe('distance', () => {
  it.each([
    ['', '', 0],
    ['fill', 'fill', 0],
    ['fil', 'fill', 1],
    ['filll', 'fill', 1],
    ['fall', 'fill', 1],
    ['flil', 'fill', 1],
    ['kitten', 'sitting', 3],
  ])('from %s to %s is %i', (a, b, slips) => {
    expect(distance(a, b)).toBe(slips)
  })

  it('is the same both ways', () => {
    const word = fc.string({ maxLength: 8 })
    fc.assert(
      fc.property(word, word, (a, b) => {
        expect(distance(a, b)).toBe(distance(b, a))
      }),
    )
  })
})

describe('nearest', () => {
  const keys = ['static-height', 'top-margin', 'relief-valve', 'relief-margin', 'relief-height']
  it.each([
    ['static_height', 'static-height'],
    ['Static Height', 'static-height'],
    ['relief-valv', 'relief-valve'],
    ['relief-hieght', 'relief-height'],
    ['volume', undefined],
    ['x'.repeat(5000), undefined],
  ])('to %s is %s', (typed, key) => {
    expect(nearest(typed, keys)).toBe(key)
  })
})

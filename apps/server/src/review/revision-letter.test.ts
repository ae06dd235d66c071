import { describe, expect, it } from 'vitest'
import { revisionLetter } from './revision-letter.ts'

// The letters left out are those of the common drawing practice that shared terms follow: I O Q S X Z.
describe('revision letters', () => {
  it('has none for the first issue and A for the first revision', () => {
    expect([0, 1, 2].map(revisionLetter)).toEqual(['', 'A', 'B'])
  })

  it('skips I O Q S X Z', () => {
    const first = Array.from({ length: 20 }, (_, index) => revisionLetter(index + 1))
    expect(first.join('')).toBe('ABCDEFGHJKLMNPRTUVWY')
  })

  it('goes on with two letters and never gives one out twice', () => {
    expect([21, 22, 40, 41].map(revisionLetter)).toEqual(['AA', 'AB', 'AY', 'BA'])
    expect(new Set(Array.from({ length: 900 }, (_, index) => revisionLetter(index))).size).toBe(900)
  })
})

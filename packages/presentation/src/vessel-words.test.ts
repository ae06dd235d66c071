import { describe, expect, it } from 'vitest'
import { methodWords, numberRanges } from './vessel-words.ts'

describe('numbers of assumptions in a row', () => {
  it.each([
    [[3, 1, 2, 5], 'A1–A3, A5'],
    [[1, 2], 'A1, A2'],
    [[], ''],
  ])('of %j are %s', (numbers, words) => {
    expect(numberRanges(numbers)).toBe(words)
  })
})

it.each([
  ['ashrae', 'ASHRAE'],
  ['en 12828', 'EN 12828'],
  ['idae', 'IDAE'],
  ['ashrae fixture', 'ASHRAE fixture'],
  ['per apartment', 'Per apartment'],
])('the method %s is written %s', (method, words) => {
  expect(methodWords(method)).toBe(words)
})

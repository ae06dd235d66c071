import * as fc from 'fast-check'
import { expect, it } from 'vitest'
import { textDifference } from './text-difference.ts'

const applied = (was: string, { from, to, insert }: ReturnType<typeof textDifference>): string =>
  `${was.slice(0, from)}${insert}${was.slice(to)}`

it('the difference of two texts is only what differs', () => {
  expect(textDifference('high: 180 °F', 'high: 190 °F')).toEqual({ from: 7, to: 8, insert: '9' })
  expect(textDifference('same', 'same')).toEqual({ from: 4, to: 4, insert: '' })
  expect(textDifference('aa', 'aaa')).toEqual({ from: 2, to: 2, insert: 'a' })
})

it('the difference turns the one text into the other', () => {
  const text = fc.string({ unit: fc.constantFrom('a', 'b', '\n', ' ') })
  fc.assert(
    fc.property(text, text, (was, now) => {
      expect(applied(was, textDifference(was, now))).toBe(now)
    }),
  )
})

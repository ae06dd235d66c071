import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { indexLines } from './line-index.ts'

describe('indexLines', () => {
  it('counts lines and UTF-16 characters from zero', () => {
    const lines = indexLines('a: 1\r\nb: 50 °F 🛁\n')
    expect(lines.lines).toBe(3)
    expect(lines.position(0)).toEqual({ line: 0, character: 0 })
    expect(lines.position(6)).toEqual({ line: 1, character: 0 })
    expect(lines.position(18)).toEqual({ line: 2, character: 0 })
  })

  it('brings positions outside the text to its ends', () => {
    const lines = indexLines('a\nbc')
    expect(lines.offset({ line: -1, character: 5 })).toBe(0)
    expect(lines.offset({ line: 0, character: 99 })).toBe(1)
    expect(lines.offset({ line: 9, character: 0 })).toBe(4)
    expect(lines.position(99)).toEqual({ line: 1, character: 2 })
  })

  it('comes back to the offset it started from', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom('a', '\n', ' ', '°') }), fc.nat(), (text, at) => {
        const lines = indexLines(text)
        const offset = at % (text.length + 1)
        expect(lines.offset(lines.position(offset))).toBe(offset)
      }),
    )
  })
})

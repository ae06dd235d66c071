import { describe, expect, it } from 'vitest'
import { acceptance } from './accept-warning.ts'

describe('accepting a warning in the text', () => {
  it('stands above the line, indented like it, in one line', () => {
    const text = 'systems:\n  HWS:\n    pressure: {}\n'
    const range = { start: { line: 2, character: 4 }, end: { line: 2, character: 12 } }
    expect(acceptance(text, { code: 'CF-E021', range }, 'the owner\n wants it ')).toEqual({
      line: 2,
      insert: '    # coldfill: accept CF-E021 because the owner wants it\n',
    })
  })
})

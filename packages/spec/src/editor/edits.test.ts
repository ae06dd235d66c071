import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { applyEdits, canStandTogether, changedLines, editAt } from './edits.ts'

const text = 'one\ntwo\nthree\nfour\n'

describe('edits', () => {
  it('are made at once, whatever their order', () => {
    const edits = [editAt(text, 8, 13, 'drei'), editAt(text, 0, 3, 'eins'), editAt(text, 4, 4, '# ')]
    expect(applyEdits(text, edits)).toBe('eins\n# two\ndrei\nfour\n')
  })

  it('that touch the same characters cannot stand together', () => {
    expect(canStandTogether(text, [editAt(text, 0, 3, 'a'), editAt(text, 2, 5, 'b')])).toBe(false)
    expect(canStandTogether(text, [editAt(text, 0, 3, 'a'), editAt(text, 3, 5, 'b')])).toBe(true)
    expect(canStandTogether(text, [editAt(text, 3, 3, 'a'), editAt(text, 3, 3, 'b')])).toBe(false)
  })

  it('are previewed by the lines that they change', () => {
    expect(changedLines(text, [editAt(text, 5, 6, 'W'), editAt(text, 14, 18, 'x\ny')])).toEqual([
      { line: 1, was: ['two'], now: ['tWo'] },
      { line: 3, was: ['four'], now: ['x', 'y'] },
    ])
  })

  it('that put in or take out whole lines show these lines only', () => {
    expect(changedLines(text, [editAt(text, 4, 4, 'new\n')])).toEqual([{ line: 1, was: [], now: ['new'] }])
    expect(changedLines(text, [editAt(text, 4, 8, '')])).toEqual([{ line: 1, was: ['two'], now: [] }])
  })

  it('give in the preview what they give in the text', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom('a', 'b', '\n', ' '), { maxLength: 30 }).map((parts) => parts.join('')),
        fc.array(fc.tuple(fc.nat(30), fc.nat(5), fc.constantFrom('', 'x', 'y\n', '\n')), { maxLength: 4 }),
        (source, raw) => {
          const edits = raw.map(([start, length, put]) => {
            const from = Math.min(start, source.length)
            return editAt(source, from, Math.min(from + length, source.length), put)
          })
          fc.pre(canStandTogether(source, edits))
          const lines = source.split('\n')
          for (const { line, was, now } of changedLines(source, edits).toReversed()) {
            expect(lines.slice(line, line + was.length)).toEqual(was)
            lines.splice(line, was.length, ...now)
          }
          expect(lines.join('\n')).toBe(applyEdits(source, edits))
        },
      ),
      { numRuns: 500 },
    )
  })
})

import { describe, expect, it } from 'vitest'
import { diffLines, nearChanges } from './line-diff.ts'

const kinds = (left: string, right: string) => diffLines(left, right).map((row) => row.kind)

describe('comparing two texts by lines', () => {
  it('finds nothing in equal texts', () => {
    expect(kinds('a\nb', 'a\nb')).toEqual(['same', 'same'])
  })

  it('sets a replaced line beside its replacement', () => {
    const rows = diffLines('a\nrelief: 30\nb', 'a\nrelief: 50\nb')
    expect(rows[1]).toEqual({
      kind: 'changed',
      left: { line: 2, text: 'relief: 30' },
      right: { line: 2, text: 'relief: 50' },
    })
  })

  it('tells added and removed lines apart and keeps the line numbers of each side', () => {
    const rows = diffLines('a\nb\nc', 'a\nc\nd')
    expect(rows.map((row) => [row.kind, row.left?.line ?? null, row.right?.line ?? null])).toEqual([
      ['same', 1, 1],
      ['removed', 2, null],
      ['same', 3, 2],
      ['added', null, 3],
    ])
  })

  it.each([
    ['', 'a\nb'],
    ['a\nb\na\nb', 'b\na\nb\na'],
    ['x\ny\nz', ''],
    ['a\na\na', 'a\na'],
  ])('gives both texts back whole: %j and %j', (left, right) => {
    const rows = diffLines(left, right)
    expect(rows.flatMap((row) => (row.left ? [row.left.text] : [])).join('\n')).toBe(left)
    expect(rows.flatMap((row) => (row.right ? [row.right.text] : [])).join('\n')).toBe(right)
  })

  it('leaves out what is far from any change', () => {
    const left = Array.from({ length: 20 }, (_, line) => `line ${line}`)
    const right = left.with(10, 'other')
    const shown = nearChanges(diffLines(left.join('\n'), right.join('\n')), 1)
    expect(shown.map((row) => row?.left?.line ?? null)).toEqual([null, 10, 11, 12, null])
  })
})

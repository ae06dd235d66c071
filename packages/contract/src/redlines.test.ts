import { expect, it } from 'vitest'
import { Anchor, CreateRedlineRequest } from './redlines.ts'

it('tells anchors apart by their type and says what is missing of that one alone', () => {
  expect(Anchor.parse({ type: 'cell', mark: 'ET-1', column: 'precharge' })).toBeTruthy()
  const missing = Anchor.safeParse({ type: 'cell', mark: 'ET-1' })
  expect(missing.error?.issues.map(({ path }) => path)).toEqual([['column']])
  expect(Anchor.safeParse({ type: 'row', mark: 'ET-1', column: 'precharge' }).success).toBe(false)
  expect(Anchor.safeParse({ type: 'pixel', x: 1 }).success).toBe(false)
})

it('fills in what a short redline leaves out', () => {
  expect(CreateRedlineRequest.parse({ anchor: { type: 'row', mark: 'ET-1' }, text: ' Why? ' })).toEqual({
    anchor: { type: 'row', mark: 'ET-1' },
    quoted: '',
    text: 'Why?',
    mustAnswer: false,
    officeOnly: false,
    proposedValue: null,
  })
})

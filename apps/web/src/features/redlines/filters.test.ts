import type { Redline } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import { passes, redlinesByPlace } from './filters.ts'

const redline = (number: number, more: Partial<Redline> = {}): Redline => ({
  number,
  anchor: { type: 'cell', mark: 'ET-1', column: 'precharge' },
  anchorState: 'pinned',
  quoted: '12.0 psig',
  nowValue: '12.0 psig',
  revision: '',
  author: { id: 'r', name: 'R', initials: 'R' },
  createdAt: '2026-11-01T10:00:00Z',
  state: 'open',
  mustAnswer: false,
  officeOnly: false,
  proposedValue: null,
  waitingOn: 'consultant',
  waitingOnYou: false,
  messages: [],
  closedBy: null,
  carriedFrom: null,
  may: { edit: false, remove: false, reply: true, close: false, reopen: false },
  ...more,
})

describe('filters of redlines', () => {
  it('counts a pending redline among the open ones, and not among those that wait on you', () => {
    const pending = redline(1, { state: 'pending', waitingOnYou: true })
    expect(passes(pending, 'open')).toBe(true)
    expect(passes(pending, 'waiting')).toBe(false)
  })
  it('keeps an adrift redline findable when it is closed', () => {
    expect(passes(redline(1, { state: 'closed', anchorState: 'adrift' }), 'adrift')).toBe(true)
  })
})

describe('redlines by place', () => {
  it('gathers the threads of a cell and leaves out closed ones', () => {
    const places = redlinesByPlace([
      redline(1),
      redline(2),
      redline(3, { state: 'closed' }),
      redline(4, { anchor: { type: 'row', mark: 'ET-1' } }),
    ])
    expect(places.get('cell ET-1 precharge')?.map((one) => one.number)).toEqual([1, 2])
    expect(places.get('row ET-1')?.map((one) => one.number)).toEqual([4])
  })
})

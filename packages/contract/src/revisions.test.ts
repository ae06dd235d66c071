import { describe, expect, it } from 'vitest'
import {
  IssueForConstructionRequest,
  IssueForReviewRequest,
  ReviewRequest,
  revisionLabel,
  revisionSegment,
  revisionTitle,
  WithdrawRequest,
} from './revisions.ts'

describe('a review', () => {
  const review = (outcome: string, reason?: string) =>
    ReviewRequest.safeParse({ outcome, contentHash: 'c0ffee', ...(reason === undefined ? {} : { reason }) })

  it.each(['revise', 'rejected'])('needs a reason to say %s', (outcome) => {
    for (const reason of [undefined, '', '  \n'])
      expect(review(outcome, reason).error?.issues.map(({ path }) => path)).toEqual([['reason']])
    expect(review(outcome, 'The fill is too low.').success).toBe(true)
  })

  it.each(['accepted', 'accepted_noted', 'information'])('may say %s without one', (outcome) => {
    expect(review(outcome).data).toMatchObject({ outcome, reason: '' })
  })
})

it('takes nothing back without a reason', () => {
  expect(WithdrawRequest.safeParse({ reason: '   ' }).success).toBe(false)
})

it('writes the first issue as - in addresses and reads it back', () => {
  for (const label of ['', 'A', 'AA']) expect(revisionLabel(revisionSegment(label))).toBe(label)
  expect(revisionSegment('')).toBe('-')
  expect([revisionTitle(''), revisionTitle('B')]).toEqual(['First issue', 'Rev B'])
})

it('leaves the contents that were not chosen to the server, and refuses others', () => {
  expect(IssueForReviewRequest.parse({ purpose: 'review' })).toEqual({ purpose: 'review', note: '', contents: {} })
  expect(IssueForConstructionRequest.parse({ contents: { units: 'SI' } })).toEqual({ contents: { units: 'SI' } })
  expect(IssueForConstructionRequest.safeParse({ contents: { drawings: true } }).success).toBe(false)
})

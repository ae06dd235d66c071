import type { Verification, VerificationFigure } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import { countOf, deviationWords, filteredGroups, toleranceWords } from './verification-filter.ts'

const figure = (id: string, more: Partial<VerificationFigure> = {}): VerificationFigure => ({
  id,
  title: 'Closed tank',
  what: 'required volume',
  kind: 'volume',
  expected: '10 gal',
  computed: '10.0 gal',
  deviation: 0,
  tolerance: 0.01,
  because: 'Two digits.',
  verdict: 'holds',
  origin: 'published',
  ...more,
})
const groups: Verification['groups'] = [
  { part: 'published cases', source: 'A handbook', figures: [figure('H1'), figure('H2', { origin: 'from memory' })] },
  { part: 'published cases', source: 'A reprint', figures: [figure('R1', { verdict: 'known wrong' })] },
]
const idsOf = (found: Verification['groups']) => found.flatMap((group) => group.figures.map(({ id }) => id))

describe('the verification manual', () => {
  it('is filtered by verdict and by what is from memory', () => {
    expect(idsOf(filteredGroups(groups, 'all', ''))).toEqual(['H1', 'H2', 'R1'])
    expect(idsOf(filteredGroups(groups, 'known wrong', ''))).toEqual(['R1'])
    expect(idsOf(filteredGroups(groups, 'from memory', ''))).toEqual(['H2'])
    expect(filteredGroups(groups, 'fails', '')).toEqual([])
    expect(countOf(groups, 'holds')).toBe(2)
  })

  it('is searched by words of source, case and figure', () => {
    expect(idsOf(filteredGroups(groups, 'all', 'VOLUME reprint'))).toEqual(['R1'])
    expect(filteredGroups(groups, 'all', 'nowhere')).toEqual([])
  })

  it('writes deviations and tolerances in per cent', () => {
    expect([0, 0.00001, 0.0004, -0.0123, 9, null].map(deviationWords)).toEqual([
      '0.00 %',
      '0.00 %',
      '+0.04 %',
      '−1.23 %',
      '+900 %',
      '—',
    ])
    expect([0.003, 0.02, 5e-9].map(toleranceWords)).toEqual(['0.3 %', '2 %', '5e-7 %'])
  })
})

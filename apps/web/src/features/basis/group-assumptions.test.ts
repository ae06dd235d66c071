import { describe, expect, it } from 'vitest'
import type { UsedAssumption } from '#lib/sized-project.ts'
import { groupAssumptions } from './group-assumptions.ts'

const assumption = (id: string, number: string): UsedAssumption => ({
  id,
  number,
  name: id,
  value: '1',
  defaultValue: '1',
  overridden: false,
  source: { source: 's', locator: '' },
  because: '',
  path: '',
  usedBy: [],
})

describe('groups of the basis', () => {
  it('come from the topic of the id, in order of first use', () => {
    const groups = groupAssumptions([
      assumption('relief-margin.hydronic', 'A1'),
      assumption('top-margin.hydronic', 'A2'),
      assumption('relief-margin.domestic', 'A3'),
    ])
    expect(groups.map((group) => [group.title, group.assumptions.map((one) => one.number)])).toEqual([
      ['Relief margin', ['A1', 'A3']],
      ['Top margin', ['A2']],
    ])
  })
})

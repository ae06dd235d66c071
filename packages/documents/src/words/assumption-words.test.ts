import { expect, it } from 'vitest'
import { documentOptions } from '../testing/document-options.ts'
import { changedBy } from './assumption-words.ts'

const assumption = {
  id: 'relief-margin.hydronic',
  number: 'A1',
  name: 'margin below the relief valve',
  value: '15 %',
  defaultValue: '10 %',
  overridden: true,
  source: { source: 'common-practice', locator: '' },
  because: '',
  reason: 'our standard',
  path: 'assumptions.relief-margin.hydronic',
  usedBy: [],
}
const options = {
  ...documentOptions('US'),
  assumptionChanges: [{ assumption: 'relief-margin.hydronic', by: 'A. Rowan', date: '2026-11-18' }],
}

it('says who changed an assumption and when, and nothing where the default stands or nobody is known', () => {
  expect(changedBy(assumption, options)).toBe('A. Rowan, 2026-11-18')
  expect(changedBy({ ...assumption, overridden: false }, options)).toBe('')
  expect(changedBy({ ...assumption, id: 'elevation' }, options)).toBe('')
  expect(changedBy(assumption, documentOptions('US'))).toBe('')
})

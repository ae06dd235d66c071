import { sizeSpec } from '@coldfill/sizing'
import { expect, it } from 'vitest'
import { loopSpec } from '../testing/specs.ts'
import { changedResults } from './changed-results.ts'

const sized = (choices: Parameters<typeof loopSpec>[0] = {}) => sizeSpec(loopSpec(choices))

it('finds nothing between equal results, whatever else the text says', () => {
  expect(changedResults(sized(), sized({ title: 'Another title' }))).toEqual([])
})

it('gives each value before and after, at full precision', () => {
  const [was, now] = [sized(), sized({ relief: '40 psi' })]
  const changed = changedResults(was, now)
  const volume = changed.find(({ key }) => key === 'required-volume')
  expect(volume).toEqual({
    system: 'HWS',
    mark: 'ET-1',
    key: 'required-volume',
    name: was.vessels[0]?.results['required-volume']?.name,
    kind: 'volume',
    was: was.vessels[0]?.results['required-volume']?.value,
    now: now.vessels[0]?.results['required-volume']?.value,
  })
})

it('takes a value that is written in other units for the same', () => {
  // 2.0684271879504 bar are 30 psi to the last digit that is kept.
  expect(changedResults(sized(), sized({ relief: '2.0684271879504 bar' }))).toEqual([])
})

it('lists a vessel that is new, and one that is gone behind the others', () => {
  const changed = changedResults(sized({ marks: ['ET-1'] }), sized({ marks: ['ET-2'] }))
  const status = changed.filter(({ key }) => key === 'status')
  expect(status).toMatchObject([
    { mark: 'ET-2', was: null, now: 'sized' },
    { mark: 'ET-1', was: 'sized', now: null },
  ])
})

it('says when a vessel can no longer be sized', () => {
  const changed = changedResults(sized(), sized({ relief: '5 psi' }))
  expect(changed.find(({ key }) => key === 'status')).toMatchObject({ was: 'sized', now: 'infeasible' })
})

import type { ProjectResult } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import { resultChanges } from './result-changes.ts'

type Vessel = ProjectResult['vessels'][number]

const quantity = (kind: string, value: number, name: string) => ({ name, kind, value, authored: '' })

const vessel = (mark: string, results: Vessel['results'], status: Vessel['status'] = 'sized'): Vessel =>
  ({ system: 'HWS', mark, status, results, selected: null }) as unknown as Vessel

const content = (...vessels: readonly Vessel[]): ProjectResult => ({ vessels }) as unknown as ProjectResult

const volume = (litres: number) =>
  ({ 'required-volume': quantity('volume', litres / 1000, 'required volume') }) as unknown as Vessel['results']
const precharge = (bar: number) =>
  ({ precharge: quantity('gauge pressure', bar * 1e5, 'precharge') }) as unknown as Vessel['results']

describe('results that moved', () => {
  it('say by how much and by what part, the largest part first', () => {
    const was = content(vessel('ET-1', volume(100)), vessel('ET-2', volume(200)))
    const now = content(vessel('ET-1', volume(110)), vessel('ET-2', volume(150)))
    expect(resultChanges(was, now, 'SI').map(({ mark, moved, part }) => [mark, moved, part?.toFixed(3)])).toEqual([
      ['ET-2', '−50.0 L', '-0.250'],
      ['ET-1', '+10.0 L', '0.100'],
    ])
  })

  it('of a gauge pressure have no part, because its zero is that of the site', () => {
    const [only] = resultChanges(content(vessel('ET-1', precharge(1))), content(vessel('ET-1', precharge(1.5))), 'SI')
    expect(only).toMatchObject({ moved: '+50.0 kPa', part: null })
  })

  it('begin with vessels that came, went or are not sized any more', () => {
    const was = content(vessel('ET-1', volume(100)), vessel('ET-3', volume(5)))
    const now = content(vessel('ET-1', volume(300)), vessel('ET-2', {}, 'blocked'))
    expect(
      resultChanges(was, now, 'SI').map(({ mark, key, was: before, now: after }) => [mark, key, before, after]),
    ).toEqual([
      ['ET-2', 'status', null, 'blocked'],
      ['ET-3', 'status', 'sized', null],
      ['ET-1', 'required-volume', '100 L', '300 L'],
    ])
  })

  it('are none where only the last bit of a number differs', () => {
    const was = content(vessel('ET-1', volume(100)))
    expect(resultChanges(was, content(vessel('ET-1', volume(100 * (1 + 1e-13)))), 'SI')).toEqual([])
  })
})

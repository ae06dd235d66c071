import type { ProjectResult } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import { computedValues } from './computed-values.ts'

const citation = { source: 'x', locator: '1' }
const vessel = {
  mark: 'ET-1',
  path: 'systems.HWS.vessels.ET-1',
  status: 'sized',
  results: { 'required-volume': { kind: 'volume', value: 0.1, name: 'required volume', entry: 'ET-1/v' } },
  trace: [
    {
      title: 'Contents',
      entries: [
        {
          entry: 'input',
          id: 'ET-1/l',
          symbol: 'L_3',
          name: 'pipe, length',
          kind: 'length',
          value: 30.48,
          origin: { from: 'spec', path: 'systems.HWS.contents.2.length' },
        },
        {
          entry: 'step',
          id: 'ET-1/v3',
          symbol: 'V_3',
          name: 'pipe, content',
          kind: 'volume',
          value: 0.03785411784,
          formula: 'pi/4*d_3^2*L_3',
          source: citation,
          method: 'm',
        },
      ],
    },
  ],
}
const result = { vessels: [vessel] } as unknown as ProjectResult

describe('what was computed of a path', () => {
  it('at a mark is every result of the vessel', () => {
    expect(computedValues(result, vessel.path, 'SI')).toEqual(['required volume 100 L'])
  })

  it('at a value is the input that it became, and the first step that uses it', () => {
    // 30.48 m = 100 ft and 0.03785411784 m3 = 10 gal, exactly.
    expect(computedValues(result, 'systems.HWS.contents.2.length', 'US')).toEqual([
      'ET-1: pipe, length 100 ft → pipe, content 10.0 gal',
    ])
  })

  it('is nothing elsewhere and before the first sizing', () => {
    expect(computedValues(result, 'project.title', 'US')).toEqual([])
    expect(computedValues(null, vessel.path, 'US')).toEqual([])
  })

  it('of a vessel without a size is the reason', () => {
    const blocked = { ...vessel, status: 'blocked', reason: 'It needs a height.' }
    expect(computedValues({ vessels: [blocked] } as unknown as ProjectResult, vessel.path, 'US')).toEqual([
      'blocked: It needs a height.',
    ])
  })
})

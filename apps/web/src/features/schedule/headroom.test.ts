import { describe, expect, it } from 'vitest'
import { shownHeadroom } from './headroom.ts'

const GALLON = 231 * 0.0254 ** 3
const PSI = 6894.757293168361

describe('headroom as shown', () => {
  // By hand: 1 gal for 1 °F is 1.8 gal for 1 K, and 3.785 L × 1.8 = 6.814 L.
  it('changes a temperature by °F and by K, not by readings of a thermometer', () => {
    const row = {
      entry: 'ET-1/t-h',
      symbol: 't_h',
      name: 'highest temperature',
      kind: 'temperature' as const,
      value: 273.15 + 100,
      sensitivity: 1.8 * GALLON,
      limit: 273.15 + 110,
    }
    expect(shownHeadroom([row], 'US')).toMatchObject([{ now: '212 °F', change: '+1 gal per °F', limit: '230 °F' }])
    expect(shownHeadroom([row], 'SI')).toMatchObject([{ now: '100 °C', change: '+6.81 L per K', limit: '110 °C' }])
  })

  // By hand: 1 gal for 1 psi; 3.785 L for 6.895 kPa is 0.549 L for 1 kPa.
  it('changes a gauge pressure by psi and by kPa, and rounds the limit so that it is still enough', () => {
    const row = {
      entry: 'ET-1/p-f',
      symbol: 'p_f',
      name: 'fill pressure',
      kind: 'gauge pressure' as const,
      value: 12 * PSI,
      sensitivity: -GALLON / PSI,
      limit: 9.87654321 * PSI,
    }
    expect(shownHeadroom([row], 'US')).toMatchObject([{ change: '−1 gal per psi', limit: '9.877 psig' }])
    expect(shownHeadroom([row], 'SI')).toMatchObject([{ change: '−0.549 L per kPa' }])
    expect(shownHeadroom([{ ...row, limit: 14.56789 * PSI }], 'US')).toMatchObject([{ limit: '14.56 psig' }])
    expect(shownHeadroom([{ ...row, limit: null }], 'US')).toMatchObject([{ limit: null }])
  })
})

import { describe, expect, it } from 'vitest'
import { changesByPlace, changeWords } from './changes.ts'

const change = {
  system: 'HWS',
  mark: 'ET-1',
  key: 'precharge',
  name: 'Precharge',
  kind: 'gauge pressure',
  was: 100_000,
  now: 120_000,
}

describe('what changed since the last issue', () => {
  it('is found by row and result', () => {
    expect(changesByPlace([change]).get('HWS/ET-1')?.get('precharge')).toBe(change)
  })
  it('shows the value before with the decimals of the value now', () => {
    expect(changeWords(change, 'SI', '120')).toBe('100')
    // 100 kPa is 14.5038 psi: 1 psi = 6.894757 kPa, NIST SP 811 appendix B.
    expect(changeWords(change, 'US', '17.4')).toBe('14.5')
  })
  it('says a word as it was, and a dash for what was not there', () => {
    expect(changeWords({ ...change, kind: 'words', was: 'blocked' }, 'SI', 'sized')).toBe('blocked')
    expect(changeWords({ ...change, was: null }, 'SI', '120')).toBe('—')
  })
})

import { expect, it } from 'vitest'
import { findingWords } from './finding-words.ts'

const PSI = 6894.757293168361

it('says what was worked out in other units and leaves what was written as it is', () => {
  const finding = {
    message: 'ET-1 is charged to 12.0 psig, but the fill pressure is 22.0 psig; the spec says 12 psi.',
    hint: 'Charge it to 22.0 psig.',
    quantities: [
      { text: '12.0 psig', kind: 'gauge pressure' as const, value: 12 * PSI },
      { text: '22.0 psig', kind: 'gauge pressure' as const, value: 22 * PSI },
    ],
  }
  expect(findingWords(finding, 'US')).toEqual({ message: finding.message, hint: finding.hint })
  // 1 psi = 6.894757 kPa: 82.7 and 151.7 kPa, to the whole kPa.
  expect(findingWords(finding, 'SI')).toEqual({
    message: 'ET-1 is charged to 83 kPa, but the fill pressure is 152 kPa; the spec says 12 psi.',
    hint: 'Charge it to 152 kPa.',
  })
})

it('leaves a finding without quantities alone', () => {
  expect(findingWords({ message: 'No vessel.', hint: '' }, 'SI')).toEqual({ message: 'No vessel.', hint: '' })
})

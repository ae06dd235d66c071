import { parseQuantity } from '@coldfill/units'
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import { type Action, actionsAt } from './actions.ts'
import { applyEdits } from './edits.ts'

const within = (from: string, to: string, text = baseSpec): string => {
  if (!text.includes(from)) throw new Error(`the text has no "${from}"`)
  return text.replace(from, () => to)
}

/** Actions where `words` stand in the text, one character in. */
const actions = (text: string, words: string): readonly Action[] =>
  actionsAt(text, text.indexOf(words) + 1, readSpec(text, testVocabulary).findings, testVocabulary)

const titles = (text: string, words: string, sort?: Action['sort']): string[] =>
  actions(text, words)
    .filter((action) => sort === undefined || action.sort === sort)
    .map(({ title }) => title)

const after = (text: string, words: string, title: string): string => {
  const action = actions(text, words).find((each) => each.title === title)
  if (!action) throw new Error(`"${title}" is not offered; offered: ${titles(text, words).join(', ')}`)
  return applyEdits(text, action.edits)
}

describe('a quantity in another unit', () => {
  // Exact factors: 1 psi = 6.894757 kPa, 1 ft = 0.3048 m, 1 in = 25.4 mm; °C = (°F − 32)/1.8.
  it.each([
    ['180 °F', ['82.2 °C']],
    ['30 psi', ['2.07 bar', '207 kPa']],
    ['42 ft', ['12.8 m']],
    ['24 gal', ['90.8 L', '0.0908 m3']],
    ['10 min', ['600 s', '0.1667 h']],
    ['50 gpm', ['3.155 L/s', '11.36 m3/h']],
  ])('%s', (typed, expected) => {
    expect(titles(baseSpec, typed, 'convert').map((title) => title.replace('Write ', ''))).toEqual(expected)
  })

  it('leaves a value in it that is the same to the last digit typed', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 99_999 }),
        fc.integer({ min: 0, max: 3 }),
        fc.constantFrom('°F', '°C'),
        (digits, decimals, unit) => {
          const typed = (digits / 10 ** decimals).toFixed(decimals)
          const text = within('high: 180 °F', `high: ${typed} ${unit}`)
          for (const { edits } of actions(text, `${typed} ${unit}`).filter(({ sort }) => sort === 'convert')) {
            const before = parseQuantity(`${typed} ${unit}`, ['temperature'])
            const now = parseQuantity(edits[0]?.text ?? '', ['temperature'])
            if (!before.ok || !now.ok) throw new Error('not a temperature')
            const step = 10 ** -decimals * (unit === '°F' ? 5 / 9 : 1)
            expect(Math.abs(before.quantity.value - now.quantity.value)).toBeLessThanOrEqual(0.051 * step)
          }
        },
      ),
      { numRuns: 100 },
    )
  })

  it('of an absolute pressure stays absolute, of a margin stays a difference', () => {
    expect(titles(within('relief-valve: 30 psi', 'relief-valve: 44.7 psia'), '44.7 psia', 'convert')).toEqual([
      'Write 3.082 bar abs',
      'Write 308.2 kPa abs',
    ])
    expect(titles(within('relief-margin: 10 %', 'relief-margin: 3 psi'), '3 psi', 'convert')).toEqual([
      'Write 0.207 bar',
      'Write 20.7 kPa',
    ])
  })

  it('of an override has the kind of its assumption', () => {
    const text = within('value: 10 %', 'value: 3 psi')
    expect(titles(text, '3 psi', 'convert')).toEqual(['Write 0.207 bar', 'Write 20.7 kPa'])
  })

  it('is not offered for what has one unit or none, nor for a value that is not read', () => {
    for (const words of ['10 %', 'copper type L', 'quantity: 1'.slice(10), '30 % vol'])
      expect(titles(baseSpec, words, 'convert')).toEqual([])
    expect(titles(within('42 ft', '42 furlongs'), '42 furlongs', 'convert')).toEqual([])
  })
})

describe('what mends a finding', () => {
  it('is offered on the value, and on its line where nothing is under the cursor', () => {
    const text = within('construction: bladder', 'construction: blader')
    expect(titles(text, 'blader', 'fix')).toEqual(['Write bladder'])
    expect(after(text, 'construction: blader', 'Write bladder')).toBe(baseSpec)
  })

  it('puts a key in with a placeholder, which is a finding and no value', () => {
    const text = within('      relief-valve: 30 psi\n', '')
    const put = after(text, 'pressure:', 'Put in `relief-valve: …`')
    expect(put).toContain('    pressure:\n      relief-valve: …\n')
    const reading = readSpec(put, testVocabulary)
    expect(reading.findings.map(({ code }) => code)).toEqual(['CF-S019'])
    expect(reading.model?.systems[0]?.sound).toBe(false)
  })

  it('mends all findings of a code at once', () => {
    const text = within('construction: bladder', 'construction: blader', within('units: US', 'units: Us'))
    expect(after(text, 'blader', 'Mend all 2 findings of CF-S007')).toBe(baseSpec)
  })

  it('puts a line with a tab below the key that opens its block, however far in that stands', () => {
    const text = 'coldfill: 1\nsystems:\n  A:\n    service: steam\n    vessels:\n\tV-1: { kind: flash tank }\n'
    expect(after(text, '\tV-1', 'Write spaces for tabs')).toContain('    vessels:\n      V-1: { kind: flash tank }\n')
  })

  it('writes spaces for every tab in the indentation', () => {
    const text = within(
      '      static-height: 42 ft\n      top-margin',
      '\t\t\tstatic-height: 42 ft # a\tb\n    \ttop-margin',
    )
    expect(after(text, '\t\t\tstatic', 'Write spaces for tabs in every line')).toBe(
      within('static-height: 42 ft', 'static-height: 42 ft # a\tb'),
    )
  })

  it('accepts a warning', () => {
    const text = within(
      'service: domestic cold water\n    pressure: {',
      'service: domestic cold water\n    pressure: { static-height: 9 m,',
    )
    expect(titles(text, 'static-height: 9 m', 'accept')).toEqual(['Accept with a reason'])
  })

  it('is not offered for what is accepted', () => {
    const { findings } = readSpec(within('units: US', 'units: Us'), testVocabulary)
    const accepted = findings.map((finding) => ({ ...finding, accepted: 'so it is' }))
    const text = within('units: US', 'units: Us')
    expect(actionsAt(text, text.indexOf('Us'), accepted, testVocabulary)).toEqual([])
  })
})

it('no action throws at any offset, and each changes the text', () => {
  fc.assert(
    fc.property(fc.nat(baseSpec.length), fc.nat(12), fc.constantFrom('', '{', '"', '\t', ',', '…'), (at, cut, put) => {
      const text = baseSpec.slice(0, at) + put + baseSpec.slice(at + cut)
      const { findings } = readSpec(text, testVocabulary)
      for (const { edits } of actionsAt(text, Math.min(at, text.length), findings, testVocabulary))
        expect(applyEdits(text, edits)).not.toBe(text)
    }),
    { numRuns: 200 },
  )
})

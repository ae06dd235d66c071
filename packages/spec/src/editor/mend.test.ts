import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { seededMistakes } from '../corpus/seeded-mistakes.ts'
import type { Finding } from '../finding.ts'
import { readSpec } from '../read-spec.ts'
import { marked, testVocabulary } from '../testing.ts'
import { editAt } from './edits.ts'
import { fixAll, mend } from './mend.ts'

const find = (text: string): readonly Finding[] => readSpec(text, testVocabulary).findings

const errors = ({ severity }: Finding): boolean => severity === 'error'

const seeded = (...pairs: readonly (readonly [string, string])[]): string =>
  pairs.reduce((text, [from, to]) => text.replace(from, () => to), baseSpec)

describe('mend', () => {
  it('makes first fixes until nothing changes, and tells each', () => {
    const text = seeded(
      ['construction: bladder', 'construction: blader'],
      ['units: US', 'units: Us'],
      ['low: 50 °F,', 'low:50 °F,'],
      ['120 gal', '1,200 gal'],
    )
    const { text: after, mended, left } = mend(text, find, errors)
    expect(after).toBe(seeded(['120 gal', '1200 gal']))
    expect(left).toEqual([])
    expect(mended.map(({ finding }) => finding.code).toSorted()).toEqual(['CF-S007', 'CF-S007', 'CF-S012', 'CF-Y019'])
    expect(mended.find(({ finding }) => finding.code === 'CF-S012')?.changes).toEqual([
      { line: 36, was: ['      - volume: 1,200 gal'], now: ['      - volume: 1200 gal'] },
    ])
  })

  it('chooses no unit, no pipe size and no value', () => {
    const text = seeded(
      ['static-height: 42 ft', 'static-height: 42'],
      ['size: 2 in', 'size: 7 in'],
      ['pump-head: 45 ft', 'pump-head:'],
    )
    const { text: after, mended, left } = mend(text, find, errors)
    expect(after).toBe(text)
    expect(mended).toEqual([])
    expect(left.map(({ code }) => code)).toEqual(['CF-S008', 'CF-S006', 'CF-S041'])
  })

  it('puts in a missing key to be filled in, once', () => {
    const { text, left } = mend(seeded(['      relief-valve: 30 psi\n', '']), find, errors)
    expect(text).toContain('relief-valve: …')
    expect(left.map(({ code }) => code)).toEqual(['CF-S019'])
    expect(mend(text, find, errors).text).toBe(text)
  })

  it('leaves warnings alone where errors are wanted', () => {
    const text = seeded(['cut-in: 40 psi,', 'static-height: 9 m, cut-in: 40 psi,'])
    expect(mend(text, find, errors).text).toBe(text)
  })

  it('ends where one fix undoes the other', () => {
    const swap = (text: string): Finding[] => [
      {
        code: 'CF-S007',
        severity: 'error',
        message: '',
        hint: '',
        path: '',
        range: { start: { line: 0, character: 0 }, end: { line: 0, character: 1 } },
        related: [],
        fixes: [{ title: '', edits: [editAt(text, 0, 1, text === 'a' ? 'b' : 'a')] }],
      },
    ]
    expect(mend('a', swap, errors).mended.length).toBeLessThan(3)
  })

  it('ends for every mistake of the corpus, and twice is as good as once', () => {
    for (const { from, to } of seededMistakes) {
      const { text } = marked(baseSpec.replace(from, () => to))
      const once = mend(text, find, errors)
      expect(mend(once.text, find, errors).text).toBe(once.text)
    }
  })

  it('ends for several mistakes of the corpus together', () => {
    fc.assert(
      fc.property(fc.subarray([...seededMistakes], { minLength: 2, maxLength: 6 }), (mistakes) => {
        const text = mistakes.reduce(
          (whole, { from, to }) => whole.replace(from, () => to.replace('‹|', '').replace('|›', '')),
          baseSpec,
        )
        const once = mend(text, find, errors)
        expect(mend(once.text, find, errors).text).toBe(once.text)
      }),
      { numRuns: 30 },
    )
  })
})

describe('fixAll', () => {
  it('mends the findings of one code and no other', () => {
    const text = seeded(
      ['construction: bladder', 'construction: blader'],
      ['units: US', 'units: Us'],
      ['120 gal', '1,200 gal'],
    )
    const { text: after, mended } = fixAll(text, 'CF-S007', testVocabulary)
    expect(after).toBe(seeded(['120 gal', '1,200 gal']))
    expect(mended).toHaveLength(2)
  })
})

describe('a fix that does not mend', () => {
  // Each put in one more colon for ever.
  it.each([
    ['two colons behind a key', ['temperature-band: 20 °F', 'temperature-band:: 20 °F']],
    ['a sign that begins a folded text', ['selection: auto', '>']],
  ] as const)('%s', (_, pair) => {
    const { text, mended } = mend(seeded(pair), find, errors)
    expect(text.length - baseSpec.length).toBeLessThan(10)
    expect(mended.length).toBeLessThan(6)
  })
})

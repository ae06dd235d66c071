import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { seededMistakes } from '../corpus/seeded-mistakes.ts'
import { parseSpec } from '../parse/parse-spec.ts'
import { dedent, testVocabulary } from '../testing.ts'
import { readSpec } from '../read-spec.ts'
import { formatSpec } from './format-spec.ts'

/** The base spec with four spaces for each level; a key behind a dash stays two columns behind it. */
const wideSpec = baseSpec
  .replace(/^ +/gmu, (indent) => ' '.repeat(indent.length * 2))
  .replace(/^ {16}(?=(?:volume|count|material|size|length|output|note):)/gmu, ' '.repeat(14))

const comments = (text: string): string[] => parseSpec(text).comments.map((comment) => comment.text.trim())

describe('formatSpec', () => {
  it('leaves a tidy spec as it is', () => {
    expect(formatSpec(baseSpec)).toBe(baseSpec)
  })

  it('brings four spaces for each level to two', () => {
    expect(wideSpec).not.toBe(baseSpec)
    expect(formatSpec(wideSpec)).toBe(baseSpec)
  })

  it('tidies indentation and spacing, and keeps comments, blank lines and long lines', () => {
    const untidy = dedent(`
      # a comment at the head
      coldfill:   1

      project:
         title :  Bramble Row   
         # about the units
         units: US      # as the owner wants
         codes: {plumbing:   UPC 2024,mechanical: IMC 2021  }
      systems:


          HWS:
                service: heating water
                contents:
                - equipment: Boilers
                  volume: 24 gal
                -   pipe: copper type L
                    size: 2 in
                    length: 640 ft
                # the last line
                - {volume: 120 gal,note: 'a, b: c'}
                vessels:
                      ET-1:  { kind: expansion tank,  method: ashrae }
    `)
    expect(formatSpec(untidy)).toBe(
      dedent(`
        # a comment at the head
        coldfill: 1

        project:
          title: Bramble Row
          # about the units
          units: US      # as the owner wants
          codes: { plumbing: UPC 2024, mechanical: IMC 2021 }
        systems:


          HWS:
            service: heating water
            contents:
              - equipment: Boilers
                volume: 24 gal
              - pipe: copper type L
                size: 2 in
                length: 640 ft
              # the last line
              - { volume: 120 gal, note: 'a, b: c' }
            vessels:
              ET-1: { kind: expansion tank, method: ashrae }
      `),
    )
  })

  it.each([
    [
      'texts over several lines',
      'a:\n    b: |\n        one\n          two\n    c: 1\n',
      'a:\n  b: |\n      one\n        two\n  c: 1\n',
    ],
    ['braces over several lines', 'a:\n    b: { c: 1,\n         d: 2 }\n', 'a:\n  b: { c: 1,\n       d: 2 }\n'],
    ['quoted keys and colons in texts', '"a b" :  "c: d"  # e\n', '"a b": "c: d"  # e\n'],
    ['Windows line ends', 'a:\r\n    b:  1\r\n', 'a:\r\n  b: 1\r\n'],
    ['no line end at the end', 'a:   1', 'a: 1'],
  ])('keeps %s', (_, text, formatted) => {
    expect(formatSpec(text)).toBe(formatted)
  })

  it('leaves text that cannot be read as it is', () => {
    expect(formatSpec('a:   [1\n')).toBe('a:   [1\n')
  })

  it('changes no finding of the corpus and formats once for all', () => {
    for (const { from, to } of seededMistakes) {
      const text = baseSpec.replace(from, () => to.replace('‹|', '').replace('|›', ''))
      const formatted = formatSpec(text)
      expect(formatSpec(formatted)).toBe(formatted)
      expect(readSpec(formatted, testVocabulary).findings.map(({ code }) => code)).toEqual(
        readSpec(text, testVocabulary).findings.map(({ code }) => code),
      )
    }
  })

  it('is idempotent and keeps values, comments and the number of lines', () => {
    const spaces = fc.nat(3).map((count) => ' '.repeat(count))
    const change = fc.record({
      at: fc.nat(baseSpec.length),
      put: fc.oneof(spaces, fc.constantFrom('\n', '\n# note\n', ' # note', "'", ' - ', ',')),
    })
    fc.assert(
      fc.property(fc.array(change, { maxLength: 8 }), fc.constantFrom(1, 2), (changes, wider) => {
        const spaced = wider === 1 ? baseSpec : wideSpec
        const text = changes.reduce((spec, { at, put }) => spec.slice(0, at) + put + spec.slice(at), spaced)
        const formatted = formatSpec(text)
        expect(formatSpec(formatted)).toBe(formatted)
        expect(comments(formatted)).toEqual(comments(text))
        expect(formatted.split('\n').length).toBe(text.split('\n').length)
      }),
      { numRuns: 150 },
    )
  })
})

it('leaves a text alone that would not come to rest', () => {
  const text = 'coldfill: 1\nproject:\n  number: BR-7. name }\n  : Bramble Row\n  units:   US\n'
  expect(formatSpec(formatSpec(text))).toBe(formatSpec(text))
})

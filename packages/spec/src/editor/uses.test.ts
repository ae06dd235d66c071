import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { textIn } from '../spec-path.ts'
import { testVocabulary } from '../testing.ts'
import { definitionAt, usesOf } from './uses.ts'

/** Offset of the nth time that the words stand in the text, one character in. */
const at = (text: string, words: string, nth = 1): number => {
  let found = -1
  for (let time = 0; time < nth; time++) found = text.indexOf(words, found + 1)
  if (found < 0) throw new Error(`"${words}" does not stand ${nth} times in the text`)
  return found + 1
}

const uses = (text: string, words: string, nth = 1): string[] =>
  (usesOf(text, at(text, words, nth), testVocabulary)?.uses ?? []).map(
    ({ role, path, range }) => `${role} ${path || 'comment'}: ${textIn(text, range)}`,
  )

const definition = (text: string, words: string, nth = 1): string => {
  const found = definitionAt(text, at(text, words, nth), testVocabulary)
  if (!found) return 'nothing'
  const { name, declared } = found
  return `${name.sort} ${name.name}, ${declared ? `${declared.path} on line ${declared.range.start.line + 1}` : 'not in the spec'}`
}

const commented = baseSpec
  .replace(
    '      ET-1:\n',
    '      # coldfill: accept CF-E021 because ET-1 and systems.HWS.vessels.BT-1 share a base\n      ET-1:\n',
  )
  .replace('title: Bramble Row', 'title: Bramble Row # HWS comes first')

describe('a fluid', () => {
  it('is gone to from the system that it fills', () => {
    expect(definition(baseSpec, 'glycol-30', 2)).toBe('fluid glycol-30, fluids.glycol-30 on line 10')
  })
  it('has its declaration and the systems as uses', () => {
    expect(uses(baseSpec, 'glycol-30')).toEqual([
      'declaration fluids.glycol-30: glycol-30',
      'reference systems.HWS.fluid: glycol-30',
    ])
  })
  it('that the spec does not give has no place to go to', () => {
    const text = baseSpec.replace('fluid: glycol-30', 'fluid: water')
    const found = definitionAt(text, at(text, 'fluid: water') + 8, testVocabulary)
    expect(found).toMatchObject({ name: { sort: 'word', name: 'water' }, declared: null })
    expect(definition(text, 'fluid: water')).toBe('nothing')
  })
})

describe('a mark', () => {
  it('is gone to from the reason of an acceptance', () => {
    expect(definition(commented, 'ET-1 and')).toMatch(/^vessel ET-1, systems\.HWS\.vessels\.ET-1 on line/u)
    expect(definition(commented, 'BT-1 share')).toMatch(/^vessel BT-1, systems\.HWS\.vessels\.BT-1 on line/u)
  })
  it('is found in comments and at its declaration', () => {
    expect(uses(commented, 'ET-1 and')).toEqual(['mention comment: ET-1', 'declaration systems.HWS.vessels.ET-1: ET-1'])
  })
  it('is not found inside a longer word', () => {
    const text = baseSpec.replace('note: coils', 'note: beside TET-1 and ET-10')
    expect(uses(text, 'ET-1:')).toEqual(['declaration systems.HWS.vessels.ET-1: ET-1'])
    expect(uses(text, 'TET-1 and')).toEqual([
      'mention systems.HWS.contents.3.note: TET-1',
      'declaration systems.DHW.vessels.TET-1: TET-1',
    ])
  })
})

describe('a system', () => {
  it('is found by its id and in paths', () => {
    expect(uses(commented, 'HWS:')).toEqual([
      'mention comment: HWS',
      'declaration systems.HWS: HWS',
      'mention comment: HWS',
    ])
  })
  it('whose id is an ordinary word is told by its path only', () => {
    const text = baseSpec.replace('  CWB:\n', '  Cold:\n').replace('note: coils', 'note: Cold coils, see systems.Cold')
    expect(uses(text, 'Cold:')).toEqual(['mention systems.HWS.contents.3.note: Cold', 'declaration systems.Cold: Cold'])
  })
})

describe('a word of the language', () => {
  it('has as uses the same word behind the same key', () => {
    const text = baseSpec.replace(
      '      - estimate: convectors\n',
      '      - { pipe: copper type L, size: 3 in, length: 1 ft }\n      - estimate: convectors\n',
    )
    expect(uses(text, 'copper type L')).toEqual([
      'reference systems.HWS.contents.1.pipe: copper type L',
      'reference systems.HWS.contents.2.pipe: copper type L',
    ])
    expect(definition(text, 'copper type L')).toBe('word copper type L, not in the spec')
  })
  it('an assumption is declared where the spec replaces it', () => {
    expect(definition(baseSpec, 'relief-margin.hydronic')).toBe(
      'assumption relief-margin.hydronic, assumptions.relief-margin.hydronic on line 12',
    )
  })
})

describe('where no name stands', () => {
  it.each([
    ['a key of the language', 'static-height'],
    ['a number', '42 ft'],
    ['a title', 'Bramble Row'],
  ])('%s', (_, words) => {
    expect(definition(baseSpec, words)).toBe('nothing')
  })
  it('a text that cannot be read at all', () => {
    expect(usesOf('\u0000', 0, testVocabulary)).toBeNull()
  })
})

it('uses are found while the text has mistakes', () => {
  const broken = baseSpec.replace('title: Bramble Row', 'title: "Bramble Row" x')
  expect(uses(broken, 'glycol-30')).toHaveLength(2)
})

import { describe, expect, it } from 'vitest'
import { baseSpec } from './corpus/base-spec.ts'
import { readSpec } from './read-spec.ts'
import { testVocabulary } from './testing.ts'

/** Systems and vessels that are not sound after one part of the base spec is replaced. */
const unsound = (from: string, to: string): string[] => {
  const { model } = readSpec(
    baseSpec.replace(from, () => to),
    testVocabulary,
  )
  return (model?.systems ?? []).flatMap(({ id, sound, vessels }) => [
    ...(sound ? [] : [id]),
    ...vessels.filter((vessel) => !vessel.sound).map(({ mark }) => mark),
  ])
}

describe('an error blocks what leans on it and nothing else', () => {
  it.each([
    ['in a vessel', 'construction: bladder', 'construction: blader', ['ET-1']],
    ['in a reading of a system', 'static-height: 42 ft', 'static-height: 42', ['HWS']],
    ['in a line of contents', 'length: 640 ft', 'length: 640 psi', ['HWS']],
    ['in a fluid', '30 % vol', '30 %', ['HWS']],
    ['a reading that one vessel needs', 'relief-valve: 30 psi\n', '\n', ['ET-1']],
    ['a reading that no vessel could be sized without', 'elevation: 5200 ft', 'elevation: 5200', ['HWS', 'DHW', 'CWB']],
    ['in an assumption', 'value: 10 %', 'value: 10 °F', ['HWS', 'DHW', 'CWB']],
    ['in the title block', 'units: US', 'units: metric', []],
    ['a method that is not offered', 'method: ashrae\n', 'method: bs 7074\n', ['ET-1']],
  ])('%s', (_, from, to, blocked) => {
    expect(unsound(from, to)).toEqual(blocked)
  })

  it('a vessel of a kind that is not sized is left out, with a warning only', () => {
    const text = baseSpec.replace(
      '      PT-1:',
      '      BK-1: { kind: break tank, peak-flow: 60 gpm, holding-time: 30 min }\n      PT-1:',
    )
    const { model, findings } = readSpec(text, testVocabulary)
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([['CF-S021', 'warning']])
    expect(model?.systems[2]?.vessels.map(({ mark }) => mark)).toEqual(['PT-1'])
    expect(unsound('nothing', 'nothing')).toEqual([])
  })

  it('a spec without vessels reads, with a note', () => {
    const { model, findings } = readSpec('coldfill: 1\nproject: { title: Empty }\n', testVocabulary)
    expect(model?.systems).toEqual([])
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([['CF-S062', 'note']])
  })

  it('there is no model of another version and none of text that cannot be read', () => {
    expect(readSpec('coldfill: 2\n', testVocabulary).model).toBeNull()
    expect(readSpec('project: {}\n', testVocabulary).model).toBeNull()
    expect(readSpec('coldfill: 1\nsystems: [\n', testVocabulary).model).toBeNull()
  })
})

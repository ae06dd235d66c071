import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { testVocabulary } from '../testing.ts'
import { completionsAt } from './completion.ts'

/** Labels offered where `‸` stands in the text. */
const offered = (source: string): string[] => {
  const offset = source.indexOf('‸')
  const text = source.replace('‸', '')
  return (completionsAt(text, offset, testVocabulary)?.options ?? []).map(({ label }) => label)
}

/** The text after the option of that label is taken. */
const taken = (source: string, label: string): string => {
  const offset = source.indexOf('‸')
  const text = source.replace('‸', '')
  const completions = completionsAt(text, offset, testVocabulary)
  const option = completions?.options.find((each) => each.label === label)
  if (!completions || !option) throw new Error(`${label} is not offered`)
  return text.slice(0, completions.span.start) + option.insert + text.slice(completions.span.end)
}

const within = (from: string, to: string): string => {
  if (!baseSpec.includes(from)) throw new Error(`the base spec has no "${from}"`)
  return baseSpec.replace(from, () => to)
}

describe('keys', () => {
  it('of the spec, at the beginning of a line', () => {
    expect(offered('coldfill: 1\n‸\n')).toEqual(['project', 'fluids', 'assumptions', 'systems'])
  })

  it('of the block only, without those that are there', () => {
    const keys = offered(within('      pump-head: 45 ft\n', '      ‸\n'))
    expect(keys).toEqual(['relief-height', 'pump-head', 'fill', 'maximum'])
  })

  it('while a word is typed', () => {
    expect(offered(within('      pump-head: 45 ft\n', '      pum‸\n'))).toContain('pump-head')
  })

  it('in a key that has its colon already', () => {
    expect(taken(within('pump-head: 45 ft', 'pu‸: 45 ft'), 'pump-head')).toBe(baseSpec)
  })

  it('that the service of the system uses', () => {
    expect(offered(within('{ cold: 45 °F, storage: 140 °F }', '{ ‸ }'))).toEqual(['cold', 'storage'])
  })

  it('of the kind of the vessel', () => {
    const keys = offered(within('        temperature-band: 20 °F\n', '        temperature-band: 20 °F\n        ‸\n'))
    expect(keys).toContain('credit')
    expect(keys).not.toContain('construction')
  })

  it('of a vessel without a kind: the kind', () => {
    expect(
      offered('coldfill: 1\nsystems:\n  A:\n    service: heating water\n    vessels:\n      ET-1:\n        ‸\n'),
    ).toEqual(['kind'])
  })

  it('that begin a line of contents', () => {
    expect(offered(within('      - volume: 120 gal\n        note: coils\n', '      - ‸\n'))).toEqual([
      'equipment',
      'pipe',
      'estimate',
      'volume',
    ])
  })

  it('of a line of contents', () => {
    expect(offered(within('        count: 2\n        material: steel\n', '        ‸\n'))).toEqual([
      'count',
      'material',
      'note',
    ])
  })

  it('that name fixtures and assumptions', () => {
    expect(offered(within('{ lavatory: 60, shower: 30 }', '{ lavatory: 60, ‸ }'))).toEqual([
      'bathtub',
      'shower',
      'kitchen sink',
      'laundry tub',
      'dishwasher',
    ])
    expect(offered(within('  material: { value: copper, reason: all piping is copper }\n', '  ‸\n'))).toEqual([
      'top-margin',
      'material',
    ])
  })

  it('as whole vessels that fit the system, with a fresh mark', () => {
    expect(offered(within('      PT-1: {', '      ‸\n      PT-1: {'))).toEqual(['PT-2: pressure tank'])
    expect(
      taken(within('      ST-1: { kind: storage tank, method: ashrae fixture }\n', '      ‸\n'), 'ST-1: storage tank'),
    ).toBe(baseSpec)
  })

  it('put the colon and open the block', () => {
    expect(taken('coldfill: 1\nsy‸\n', 'systems')).toBe('coldfill: 1\nsystems:\n  \n')
    expect(taken(within('{ cold: 45 °F, storage: 140 °F }', '{ cold: 45 °F, st‸ }'), 'storage')).toBe(
      within('{ cold: 45 °F, storage: 140 °F }', '{ cold: 45 °F, storage:  }'),
    )
  })
})

describe('values', () => {
  it.each([
    ['service: heating water', 'service: ‸', 'snow melting'],
    ['construction: bladder', 'construction: bl‸', 'bladder'],
    ['kind: buffer tank', 'kind: ‸', 'expansion tank'],
    ['method: ashrae\n', 'method: ‸\n', 'code minimum'],
    ['backflow-preventer: yes', 'backflow-preventer: ‸', 'no'],
    ['fluid: glycol-30', 'fluid: ‸', 'glycol-30'],
    ['pipe: copper type L', 'pipe: ‸', 'steel schedule 40'],
    ['size: 2 in', 'size: ‸', '1-1/2 in'],
    ['estimate: convectors', 'estimate: ‸', 'panel radiators'],
    ['building: apartment house', 'building: ‸', 'hospital'],
    ['units: US', 'units: ‸', 'SI'],
    ['selection: auto', 'selection: ‸', '{ maker: Northbeck, model: NB-400 }'],
  ])('of %s', (from, to, label) => {
    expect(offered(within(from, to))).toContain(label)
  })

  it('are kinds that fit the service and that are sized', () => {
    expect(offered(within('kind: buffer tank', 'kind: ‸'))).toEqual(['expansion tank', 'buffer tank'])
  })

  it('are the number with each unit that fits', () => {
    expect(offered(within('top-margin: 4 psi', 'top-margin: 4‸'))).toEqual(['4 psi', '4 bar', '4 kPa'])
    expect(taken(within('top-margin: 4 psi', 'top-margin: 4‸'), '4 psi')).toBe(baseSpec)
  })

  it('are an example where no number is typed', () => {
    expect(offered(within('relief-margin: 10 %', 'relief-margin: ‸'))).toEqual(['10 %'])
  })

  it('put the space behind the colon', () => {
    expect(taken(within('units: US', 'units:‸'), 'US')).toBe(baseSpec)
  })
})

describe('nothing is offered', () => {
  it.each([
    ['in a comment', within('units: US', 'units: US # so‸')],
    ['behind a key with a free text', within('title: Bramble Row', 'title: ‸')],
    ['in a block that the language does not know', 'coldfill: 1\nother:\n  ‸\n'],
  ])('%s', (_, source) => {
    expect(offered(source)).toEqual([])
  })
})

describe('while something else in the text is broken', () => {
  it('keys are offered all the same', () => {
    const source = within('      pump-head: 45 ft\n', '      ‸\n')
      .replace('title: Bramble Row', 'title: "Bramble Row')
      .replace('title: "Bramble Row', 'title: Bramble: Row')
    expect(offered(source)).toContain('pump-head')
  })

  it('nothing throws at any offset of any text', () => {
    fc.assert(
      fc.property(
        fc.nat(baseSpec.length),
        fc.nat(20),
        fc.constantFrom('', '{', '[', '"', ':', '- ', '\n', '\t', '#', '&'),
        (at, remove, put) => {
          const text = baseSpec.slice(0, at) + put + baseSpec.slice(at + remove)
          const completions = completionsAt(text, Math.min(at + put.length, text.length), testVocabulary)
          expect(completions === null || completions.options.length > 0).toBe(true)
        },
      ),
      { numRuns: 200 },
    )
  })
})

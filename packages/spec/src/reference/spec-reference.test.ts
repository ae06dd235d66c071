import { describe, expect, it } from 'vitest'
import type { Shape } from '../model/shape.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import { vesselKindNames, vesselKinds } from '../model/vessel.ts'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import { findingPages } from './finding-pages.ts'
import { specReference } from './spec-reference.ts'

const everything: Vocabulary = {
  ...testVocabulary,
  kinds: vesselKindNames,
  methods: Object.fromEntries(
    vesselKindNames.map((kind) => {
      const { method } = vesselKinds[kind].fields
      return [kind, method.field === 'choice' ? method.choices : {}]
    }),
  ),
}

const reference = specReference(everything)
const section = (id: string) => {
  const found = reference.sections.find((each) => each.id === id)
  if (!found) throw new Error(`no section ${id}`)
  return found
}

/** Every key of the language, wherever it stands. */
const keysIn = (shape: Shape): string[] => {
  if (shape.shape === 'field') return []
  if (shape.shape === 'block') return Object.entries(shape.keys).flatMap(([key, each]) => [key, ...keysIn(each)])
  if (shape.shape === 'map') return [...Object.keys(shape.names ?? {}), ...keysIn(shape.of)]
  if (shape.shape === 'list') return keysIn(shape.of)
  if (shape.shape === 'either') return keysIn(shape.block)
  return Object.values(shape.branches).flatMap(keysIn)
}

describe('the reference', () => {
  it('has every key of the language', () => {
    const described = new Set(reference.sections.flatMap(({ keys }) => keys.map(({ key }) => key)))
    expect([...new Set(keysIn(specShape(everything)))].filter((key) => !described.has(key))).toEqual([])
  })

  it('has ids that stand once, and goes to sections that are there', () => {
    const ids = reference.sections.map(({ id }) => id)
    expect(new Set(ids).size).toBe(ids.length)
    const targets = reference.sections.flatMap(({ keys }) => keys.flatMap(({ section: to }) => to ?? []))
    expect([...targets, ...reference.kinds.map((kind) => kind.section)].filter((id) => !ids.includes(id))).toEqual([])
  })

  it('says of a key what it means, takes and falls back on', () => {
    expect(section('systems-pressure').keys.find(({ key }) => key === 'top-margin')).toMatchObject({
      takes: 'a gauge pressure',
      units: ['psi', 'bar', 'kPa'],
      example: '4 psi',
      required: false,
      fallback: '4 psi, or 0.3 bar under an EN, DIN or BS method, and then an assumption',
      services: expect.not.arrayContaining(['steam']) as string[],
    })
    expect(section('systems').keys.find(({ key }) => key === 'service')).toMatchObject({
      takes: 'one of the words below',
      required: true,
      choices: expect.arrayContaining([{ name: 'heating water', doc: 'closed loop that heats' }]) as unknown[],
    })
    expect(section('systems').keys.find(({ key }) => key === 'pressure')?.section).toBe('systems-pressure')
    expect(section('systems-vessels-buffer-tank').path).toEqual(['systems', '…', 'vessels', '…'])
    expect(section('systems').named).toBe('HWS')
  })

  it('says of each key what it is and shows it', () => {
    const bare = reference.sections.flatMap(({ id, keys }) =>
      keys
        .filter(({ doc, example, takes }) => doc === '' || example === '' || takes === '')
        .map(({ key }) => `${id} ${key}`),
    )
    expect(bare).toEqual([])
  })
})

describe.each(reference.kinds)('the example of $kind', ({ kind, example }) => {
  it('is a whole spec that reads without a finding', () => {
    const { findings, model } = readSpec(example, everything)
    expect(findings).toEqual([])
    expect(model?.systems[0]?.vessels.map((vessel) => vessel.kind)).toEqual([kind])
  })

  it('says nothing that can be left out of its system', () => {
    const lines = example.split('\n')
    const readings = lines.flatMap((line, at) => (/^ {6}[a-z-]+: /u.test(line) ? [at] : []))
    const idle = readings.filter((at) => {
      const text = lines.filter((_, index) => index !== at).join('\n')
      return !/temperatures/u.test(example) && readSpec(text, everything).findings.length === 0
    })
    expect(idle.map((at) => lines[at])).toEqual([])
  })
})

describe('the pages of the codes', () => {
  const pages = findingPages()

  it('show a mistake and what stands there instead for nearly every code', () => {
    const without = pages.filter(({ example }) => !example).map(({ code }) => code)
    expect(without).toEqual(['CF-Y013', 'CF-Y021', 'CF-Y022', 'CF-Y023', 'CF-S062'])
  })

  it('underline a part of the mistake, or its end', () => {
    for (const { code, example } of pages)
      if (example) {
        const { wrong, underlined, right } = example
        expect({ code, inside: underlined.end <= wrong.length && underlined.start <= underlined.end }).toEqual({
          code,
          inside: true,
        })
        expect(wrong).not.toBe(right)
      }
  })
})

it('lists the kinds once, where vessels are described', () => {
  expect(section('systems-vessels').keys.map(({ key, choices }) => [key, choices.length])).toEqual([
    ['kind', vesselKindNames.length],
  ])
  expect(section('systems-vessels-buffer-tank').keys[0]).toMatchObject({
    key: 'kind',
    example: 'buffer tank',
    choices: [],
  })
})

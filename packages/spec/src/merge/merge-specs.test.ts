import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { specChanges } from '../compare/spec-changes.ts'
import { baseSpec } from '../corpus/base-spec.ts'
import { mergeSpecs } from './merge-specs.ts'

type Change = readonly [string, string]

const change = (...pairs: readonly Change[]): string =>
  pairs.reduce((text, [from, to]) => {
    if (!text.includes(from)) throw new Error(`the text has no "${from}"`)
    return text.replace(from, () => to)
  }, baseSpec)

const merged = (mine: string, theirs: string) => {
  const merge = mergeSpecs(baseSpec, mine, theirs)
  if (!merge.ok) throw new Error(`${merge.unreadable} cannot be read`)
  return merge
}

const HIGH: Change = ['high: 180 °F', 'high: 190 °F']
const TITLE: Change = ['title: Bramble Row', 'title: Bramble Court # as the client writes it']
const GONE: Change = ['      TET-1: { kind: thermal expansion tank }\n', '']
const NEW_VESSEL: Change = [
  '      BT-1:\n',
  '      ET-2: # for the annex\n        kind: expansion tank\n        material: none\n      BT-1:\n',
]
const NEW_LINE: Change = [
  '      - estimate: convectors\n',
  '      - volume: 3 gal\n        note: strainer\n      - estimate: convectors\n',
]
const LENGTH: Change = ['length: 640 ft', 'length: 650 ft']
const IN_BRACES: Change = ['{ cut-in: 40 psi, cut-out: 60 psi }', '{ cut-in: 40 psi, cut-out: 60 psi, supply: 30 psi }']
const FLUID: Change = ['fluid: glycol-30', 'fluid: { base: ethylene glycol, strength: 35 % mass }']

describe('changes in different places', () => {
  it.each([
    ['a value', TITLE, HIGH],
    ['a vessel taken out', TITLE, GONE],
    ['a new vessel', HIGH, NEW_VESSEL],
    ['a new line of contents beside a changed one', LENGTH, NEW_LINE],
    ['a changed line of contents beside a new one', NEW_LINE, LENGTH],
    ['a key in braces', HIGH, IN_BRACES],
    ['a value that becomes a block', HIGH, FLUID],
    ['one key of a block in braces', ['low: 50 °F', 'low: 45 °F'] as Change, HIGH],
  ])('%s: both are in the merged text', (_, mine, theirs) => {
    const { text, taken, conflicts } = merged(change(mine), change(theirs))
    expect(conflicts).toEqual([])
    expect(taken).toHaveLength(1)
    expect(specChanges(text, change(mine, theirs))).toEqual([])
    expect(text).toContain(mine[1].split('#')[0]?.trim())
  })

  it('my comments stay, and those of a block that they put in come along', () => {
    const { text } = merged(change(TITLE), change(NEW_VESSEL))
    expect(text).toBe(change(TITLE, NEW_VESSEL))
  })

  it('what they put in takes my indentation', () => {
    const mine = baseSpec.replace(
      /(?<=vessels:\n)(?: {6}.*\n)+/gu,
      (block) => block.replace(/^/gmu, '  ').trimEnd() + '\n',
    )
    const { text, conflicts } = merged(mine, change(NEW_VESSEL))
    expect(conflicts).toEqual([])
    expect(text).toContain('\n        ET-2: # for the annex\n          kind: expansion tank\n')
  })
})

describe('changes in the same place', () => {
  it('are a conflict, and my text stands', () => {
    const mine = change(['high: 180 °F', 'high: 170 °F'])
    const { text, taken, conflicts } = merged(mine, change(HIGH))
    expect(text).toBe(mine)
    expect(taken).toEqual([])
    expect(conflicts).toEqual([
      {
        change: 'changed',
        path: 'systems.HWS.temperatures.high',
        base: '180 °F',
        mine: '170 °F',
        theirs: '190 °F',
      },
    ])
  })

  it('are taken where theirs is chosen', () => {
    const merge = mergeSpecs(baseSpec, change(['high: 180 °F', 'high: 170 °F'], TITLE), change(HIGH), () => 'theirs')
    expect(merge).toMatchObject({ ok: true, conflicts: [], text: change(HIGH, TITLE) })
  })

  it('are taken one by one, and what I put back elsewhere stays as I want it', () => {
    const mine = change(['high: 180 °F', 'high: 170 °F'])
    const theirs = change(HIGH, TITLE)
    const merge = mergeSpecs(baseSpec, mine, theirs, (path) =>
      path === 'systems.HWS.temperatures.high' ? 'theirs' : 'mine',
    )
    expect(merge).toMatchObject({ ok: true, conflicts: [], text: change(HIGH) })
  })

  it('are none where both did the same', () => {
    const { text, taken, conflicts } = merged(change(HIGH), change(HIGH, GONE))
    expect([taken.length, conflicts.length]).toEqual([1, 0])
    expect(text).toBe(change(HIGH, GONE))
  })

  it('are a conflict where I changed what they took out', () => {
    const mine = change([
      'TET-1: { kind: thermal expansion tank }',
      'TET-1: { kind: thermal expansion tank, quantity: 2 }',
    ])
    const { text, conflicts } = merged(mine, change(GONE))
    expect(text).toBe(mine)
    expect(conflicts).toMatchObject([{ change: 'removed', path: 'systems.DHW.vessels.TET-1', theirs: null }])
  })

  it('are a conflict where I took out what they changed', () => {
    const { conflicts } = merged(
      change(GONE),
      change(['TET-1: { kind: thermal expansion tank }', 'TET-1: { kind: thermal expansion tank, quantity: 2 }']),
    )
    expect(conflicts).toMatchObject([{ change: 'added', mine: null, theirs: '2' }])
  })
})

it('a text that cannot be read is not merged', () => {
  expect(mergeSpecs(baseSpec, 'a: [', baseSpec)).toEqual({ ok: false, unreadable: 'mine' })
  expect(mergeSpecs(baseSpec, baseSpec, 'a: [')).toEqual({ ok: false, unreadable: 'theirs' })
  expect(mergeSpecs('', baseSpec, baseSpec)).toEqual({ ok: false, unreadable: 'base' })
})

it('whatever both change, what I changed stays and every change of theirs is taken or told', () => {
  const all: readonly Change[] = [HIGH, TITLE, GONE, NEW_VESSEL, NEW_LINE, LENGTH, IN_BRACES, FLUID]
  fc.assert(
    fc.property(fc.subarray([...all]), fc.subarray([...all]), (mine, theirs) => {
      const [own, other] = [change(...mine), change(...theirs)]
      const { text, taken, conflicts } = merged(own, other)
      expect(specChanges(own, text)).toHaveLength(taken.length)
      const both = mine.filter((each) => theirs.includes(each)).length
      const theirChanges = specChanges(baseSpec, other)?.length ?? 0
      expect(taken.length + conflicts.length + both).toBe(theirChanges)
      expect(conflicts).toEqual([])
    }),
    { numRuns: 150 },
  )
})

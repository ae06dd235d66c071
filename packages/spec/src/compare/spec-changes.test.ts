import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { formatSpec } from '../format/format-spec.ts'
import { specChanges } from './spec-changes.ts'

const change = (...pairs: readonly (readonly [string, string])[]): string =>
  pairs.reduce((text, [from, to]) => {
    if (!text.includes(from)) throw new Error(`the text has no "${from}"`)
    return text.replace(from, () => to)
  }, baseSpec)

const told = (now: string, was = baseSpec): string[] =>
  (specChanges(was, now) ?? []).map(
    ({ change: sort, path, was: before, now: after }) => `${sort} ${path}: ${before ?? '-'} → ${after ?? '-'}`,
  )

describe('differences between two specs', () => {
  it('are told by path', () => {
    expect(told(change(['high: 180 °F', 'high: 190 °F'], ['title: Bramble Row', 'title: Bramble Court']))).toEqual([
      'changed project.title: Bramble Row → Bramble Court',
      'changed systems.HWS.temperatures.high: 180 °F → 190 °F',
    ])
  })

  it('are told once for a block that comes or goes', () => {
    expect(told(change(['      TET-1: { kind: thermal expansion tank }\n', '']))).toEqual([
      'removed systems.DHW.vessels.TET-1: { kind: thermal expansion tank } → -',
    ])
    expect(
      told(
        change(['      PT-1: {', '      PT-2:\n        kind: pressure tank\n        drawdown: 25 gal\n      PT-1: {']),
      ),
    ).toEqual(['added systems.CWB.vessels.PT-2: - → { kind: pressure tank, drawdown: 25 gal }'])
  })

  it('of a list are told by the line, wherever it stands now', () => {
    expect(
      told(
        change(
          ['      - equipment: Boilers', '      - volume: 3 gal\n      - equipment: Boilers'],
          ['length: 640 ft', 'length: 650 ft'],
        ),
      ),
    ).toEqual([
      'added systems.HWS.contents.0: - → { volume: 3 gal }',
      'changed systems.HWS.contents.2.length: 640 ft → 650 ft',
    ])
    expect(told(change(['      - estimate: convectors\n        output: 400 MBH\n', '']))).toEqual([
      'removed systems.HWS.contents.2: { estimate: convectors, output: 400 MBH } → -',
    ])
    expect(told(change(['- volume: 120 gal', '- volume: 130 gal']))).toEqual([
      'changed systems.HWS.contents.3.volume: 120 gal → 130 gal',
    ])
  })

  it('of a value that becomes a block are one change', () => {
    expect(told(change(['fluid: glycol-30', 'fluid: { base: ethylene glycol, strength: 35 % mass }']))).toEqual([
      'changed systems.HWS.fluid: glycol-30 → { base: ethylene glycol, strength: 35 % mass }',
    ])
  })

  it('leave out comments, spacing, quotation marks and the order of keys', () => {
    const now = change(
      ['title: Bramble Row', '# a comment\n  title: "Bramble Row"'],
      ['{ cut-in: 40 psi, cut-out: 60 psi }', '{ cut-out: 60 psi,   cut-in: 40 psi }'],
    )
    expect(told(now)).toEqual([])
    expect(told(formatSpec(now))).toEqual([])
  })

  it('say where the value stands in both texts', () => {
    const [found] = specChanges(baseSpec, change(['title: Bramble Row', 'client: Bramble\n  title: Row'])) ?? []
    expect(found?.wasRange).toBeNull()
    expect(found?.nowRange).toEqual({ start: { line: 3, character: 10 }, end: { line: 3, character: 17 } })
  })

  it('are not told of a text that cannot be read', () => {
    expect(specChanges(baseSpec, 'systems: [')).toBeNull()
    expect(specChanges('', baseSpec)).toBeNull()
  })

  it('turn round with the texts: what was added is removed', () => {
    const lines = baseSpec.split('\n')
    fc.assert(
      fc.property(fc.nat(lines.length - 1), fc.nat(3), (at, count) => {
        const now = [...lines.slice(0, at), ...lines.slice(at + count)].join('\n')
        const there = specChanges(baseSpec, now)
        const back = specChanges(now, baseSpec)
        const turn = { added: 'removed', removed: 'added', changed: 'changed' } as const
        const sorted = (list: typeof there, turned: boolean): string[] | undefined =>
          list?.map((each) => (turned ? turn[each.change] : each.change)).toSorted()
        expect(sorted(there, false)).toEqual(sorted(back, true))
      }),
      { numRuns: 100 },
    )
  })
})

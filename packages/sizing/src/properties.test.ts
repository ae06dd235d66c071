import { KINDS, unitOf, fromSi } from '@coldfill/units'
import { compile, formulaTree } from '@coldfill/formula'
import { fluid as fluidOf } from '@coldfill/engine'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { ProjectResult } from './result.ts'
import { sizeSpec } from './size-spec.ts'

interface Job {
  readonly volume: number
  readonly low: number
  readonly high: number
  readonly fill: number
  readonly relief: number
  readonly elevation: number
  readonly method: string
  readonly construction: string
  readonly fluid: string
}

const gasCharged = ['ashrae', 'en 12828', 'din 4807', 'une 100155', 'bs 7074', 'code minimum']

/** Each method with the constructions that it has a form for. */
const forms: readonly (readonly [method: string, construction: string])[] = [
  ...gasCharged.flatMap((method) => [[method, 'bladder'] as const, [method, 'diaphragm'] as const]),
  ['ashrae', 'plain steel'],
  ['ashrae', 'open'],
  ['code minimum', 'plain steel'],
]

/** Litres, °C, bar and metres, or the same job in US units; every number is written with all its digits. */
const spec = (job: Job, system: 'SI' | 'US' = 'SI'): string => {
  const q = (value: number, si: string, us: string, toUs: (v: number) => number) =>
    system === 'SI' ? `${value} ${si}` : `${toUs(value)} ${us}`
  const degrees = (t: number) => q(t, '°C', '°F', (v) => v * 1.8 + 32)
  const bar = (p: number) => q(p, 'bar', 'psi', (v) => v / 0.0689475729316836)
  return `coldfill: 1
project:
  number: P
  elevation: ${q(job.elevation, 'm', 'ft', (v) => v / 0.3048)}
systems:
  S:
    service: heating water
    fluid: ${job.fluid}
    temperatures: { low: ${degrees(job.low)}, high: ${degrees(job.high)} }
    pressure: { fill: ${bar(job.fill)}, relief-valve: ${bar(job.relief)} }
    contents:
      - volume: ${q(job.volume, 'L', 'gal', (v) => v / 3.785411784)}
    vessels:
      ET: { kind: expansion tank, method: ${job.method}, construction: ${job.construction} }
`
}

const conditions = fc.record({
  volume: fc.double({ min: 50, max: 50_000, noNaN: true }),
  low: fc.double({ min: 5, max: 30, noNaN: true }),
  high: fc.double({ min: 45, max: 98, noNaN: true }),
  fill: fc.double({ min: 0.8, max: 2, noNaN: true }),
  relief: fc.double({ min: 3.2, max: 8, noNaN: true }),
  elevation: fc.double({ min: 0, max: 3000, noNaN: true }),
  fluid: fc.constantFrom(
    'water',
    '{ base: propylene glycol, strength: 30 % vol }',
    '{ base: ethylene glycol, strength: 25 % mass }',
  ),
})

const job: fc.Arbitrary<Job> = fc
  .tuple(conditions, fc.constantFrom(...forms))
  .map(([made, [method, construction]]) => ({ ...made, method, construction }))

const required = (text: string): number => {
  const [vessel] = sizeSpec(text).vessels
  return vessel?.results['required-volume']?.value ?? Number.NaN
}

const runs = { numRuns: 250 }

/** Rounding of the chain of steps, far below any size step. */
const SLACK = 1e-11

const larger = (change: (job: Job) => Job) => {
  let compared = 0
  fc.assert(
    fc.property(job, (made) => {
      const before = required(spec(made))
      const after = required(spec(change(made)))
      // A change may leave no room at all, and the code minimum has no size for lukewarm water; no size is not a smaller one.
      if (Number.isNaN(before) || Number.isNaN(after)) return
      compared += 1
      expect(after).toBeGreaterThanOrEqual(before * (1 - SLACK))
    }),
    runs,
  )
  expect(compared).toBeGreaterThan(runs.numRuns * 0.8)
}

describe('laws of any expansion tank', () => {
  it('more water never gives a smaller tank', () => larger((j) => ({ ...j, volume: j.volume * 1.07 })))
  it('hotter water never gives a smaller tank', () => larger((j) => ({ ...j, high: j.high + 1.5 })))
  it('a lower relief valve never gives a smaller tank', () => larger((j) => ({ ...j, relief: j.relief - 0.15 })))
  it('a higher fill never gives a smaller tank', () => larger((j) => ({ ...j, fill: j.fill + 0.1 })))

  it('the result is the same in US and SI units to 1e-12', () => {
    fc.assert(
      fc.property(job, (made) => {
        const si = sizeSpec(spec(made, 'SI')).vessels[0]
        const us = sizeSpec(spec(made, 'US')).vessels[0]
        expect(us?.status).toBe(si?.status)
        for (const [name, { value }] of Object.entries(si?.results ?? {})) {
          const other = us?.results[name]?.value ?? Number.NaN
          expect(Math.abs(other / value - 1)).toBeLessThanOrEqual(1e-12)
        }
      }),
      runs,
    )
  })
})

const numbersOf = (result: ProjectResult): readonly number[] =>
  result.vessels.flatMap((vessel) => [
    ...Object.values(vessel.results).map(({ value }) => value),
    ...vessel.trace.flatMap(({ entries }) => entries.map(({ value }) => value)),
    ...vessel.headroom.map(({ sensitivity }) => sensitivity),
  ])

describe('any job', () => {
  it('has no number that is not finite where a vessel is sized, and sizing twice is byte-identical', () => {
    fc.assert(
      fc.property(job, (made) => {
        const text = spec({ ...made, fill: made.fill * 2 })
        const result = sizeSpec(text)
        for (const vessel of result.vessels)
          if (vessel.status === 'sized')
            for (const number of numbersOf({ ...result, vessels: [vessel] })) expect(Number.isFinite(number)).toBe(true)
        expect(JSON.stringify(sizeSpec(text))).toBe(JSON.stringify(result))
      }),
      runs,
    )
  })

  it('recomputes every step from the numbers shown with it', () => {
    fc.assert(
      fc.property(job, (made) => {
        const [vessel] = sizeSpec(spec(made)).vessels
        const glycol = made.fluid.startsWith('{')
          ? fluidOf(
              made.fluid.includes('ethylene') ? 'ethylene glycol' : 'propylene glycol',
              made.fluid.includes('30') ? { value: 0.3, by: 'volume' } : { value: 0.25, by: 'mass' },
            )
          : fluidOf('water')
        if (!vessel || !glycol.ok) throw new Error('not sized')
        const entries = vessel.trace.flatMap((section) => section.entries)
        // What the JSON of the command shows: SI display units, converted back.
        const values = Object.fromEntries(
          entries.map(({ symbol, kind, value }) => {
            const unit = unitOf(kind, KINDS[kind].metric)
            return [symbol, fromSi(value, unit) * unit.factor + unit.offset]
          }),
        )
        for (const entry of entries) {
          if (entry.entry === 'input') continue
          const again = compile(formulaTree(entry.formula), glycol.fluid.functions)(values)
          expect(Math.abs(again - entry.value)).toBeLessThanOrEqual(1e-9 * Math.max(Math.abs(entry.value), 1e-12))
        }
      }),
      runs,
    )
  })

  it('never throws for a spec with random words put in', () => {
    const base = spec({
      volume: 1000,
      low: 10,
      high: 80,
      fill: 1,
      relief: 3,
      elevation: 0,
      method: 'ashrae',
      construction: 'bladder',
      fluid: 'water',
    })
    const lines = base.split('\n')
    fc.assert(
      fc.property(fc.nat(lines.length - 1), fc.string({ maxLength: 12 }), fc.nat(60), (line, word, at) => {
        const changed = lines
          .map((text, n) => (n === line ? `${text.slice(0, at)}${word}${text.slice(at)}` : text))
          .join('\n')
        expect(() => sizeSpec(changed)).not.toThrow()
      }),
      { numRuns: 600 },
    )
  })
})

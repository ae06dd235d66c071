import {
  type Field,
  type Fields,
  pressureFields,
  serviceKeys,
  temperatureFields,
  type VesselKind,
  vesselKindNames,
  vesselKinds,
} from '@coldfill/spec'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { resultJson } from './result-json.ts'
import { sizeSpec } from './size-spec.ts'

/** A value for a field as a person would write it: a choice at random, else its example. */
const valueOf = (field: Field): fc.Arbitrary<string> =>
  field.field === 'choice' ? fc.constantFrom(...Object.keys(field.choices)) : fc.constant(field.example)

/** Some of the fields of a table, each with a value. */
const someOf = (fields: Fields): fc.Arbitrary<readonly string[]> =>
  fc
    .tuple(
      ...Object.entries(fields).map(([key, field]) =>
        fc.option(
          valueOf(field).map((value) => `${key}: ${value}`),
          { nil: undefined, freq: 2 },
        ),
      ),
    )
    .map((lines) => lines.filter((line) => line !== undefined))

const keysOf = (fields: Fields, keys: readonly string[]): Fields =>
  Object.fromEntries(Object.entries(fields).filter(([key]) => keys.includes(key)))

const contentLines = [
  'equipment: Boiler\n        volume: 24 gal\n        count: 2\n        material: steel',
  'pipe: copper type L\n        size: 2 in\n        length: 120 ft',
  'estimate: convectors\n        output: 40 MBH',
  'volume: 60 gal',
]

const block = (name: string, lines: readonly string[]): string =>
  lines.length === 0 ? '' : `    ${name}:\n${lines.map((line) => `      ${line}\n`).join('')}`

const spec = fc.constantFrom(...vesselKindNames).chain((kind: VesselKind) =>
  fc.constantFrom(...vesselKinds[kind].services).chain((service) => {
    const keys = serviceKeys[service]
    return fc
      .record({
        fluid: fc.constantFrom('', '    fluid: { base: propylene glycol, strength: 35 % vol }\n'),
        codes: fc.constantFrom('', ', codes: { plumbing: UPC 2024, mechanical: IMC 2021 }, elevation: 5200 ft'),
        temperatures: someOf(keysOf(temperatureFields, keys.temperatures)),
        pressure: someOf(keysOf(pressureFields, keys.pressure)),
        contents: fc.subarray(contentLines),
        demand: fc.constantFrom(
          '',
          '    demand: { building: apartment house, fixtures: { lavatory: 6, shower: 3 }, people: 40, apartments: 12 }\n',
        ),
        fields: someOf(vesselKinds[kind].fields),
      })
      .map(
        (s) => `coldfill: 1
project: { number: R${s.codes} }
systems:
  S:
    service: ${service}
${s.fluid}${block('temperatures', s.temperatures)}${block('pressure', s.pressure)}${block(
          'contents',
          s.contents.map((line) => `- ${line}`),
        )}${s.demand}    vessels:
      V:
        kind: ${kind}
${s.fields.map((line) => `        ${line}\n`).join('')}`,
      )
  }),
)

describe('any spec made of the keys and examples of the language', () => {
  it('never throws, gives no number that is not finite, and says why where there is no size', () => {
    const seen = new Set<string>()
    fc.assert(
      fc.property(spec, (text) => {
        const result = sizeSpec(text)
        for (const vessel of result.vessels) {
          seen.add(`${vessel.methodId} ${vessel.status}`)
          if (vessel.status === 'sized') {
            expect(Object.keys(vessel.results).length).toBeGreaterThan(0)
            for (const { value } of Object.values(vessel.results)) expect(Number.isFinite(value)).toBe(true)
            for (const { entries } of vessel.trace)
              for (const { value } of entries) expect(Number.isFinite(value)).toBe(true)
          } else {
            expect(vessel.reason?.length ?? 0).toBeGreaterThan(0)
            expect(result.findings.some(({ severity }) => severity === 'error')).toBe(true)
          }
        }
        expect(JSON.stringify(resultJson(result))).not.toMatch(/NaN|Infinity/u)
      }),
      { numRuns: 1500 },
    )
    // The generator is of no use if it never reaches a size.
    expect([...seen].filter((state) => state.endsWith(' sized')).length).toBeGreaterThan(20)
  })
})

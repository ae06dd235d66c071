import { describe, expect, it } from 'vitest'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import type { ChoiceField, Field } from './field.ts'
import type { Vocabulary } from './spec-model.ts'
import { pressureFields, serviceKeys, temperatureFields } from './system.ts'
import { type VesselKindDefinition, vesselKindNames, vesselKinds } from './vessel.ts'

/** Sizes every kind by every method that the model knows. */
const everything: Vocabulary = {
  ...testVocabulary,
  kinds: vesselKindNames,
  methods: Object.fromEntries(
    vesselKindNames.map((kind) => [kind, (vesselKinds[kind].fields.method as ChoiceField).choices]),
  ),
}

/** A system of the service with every reading that such a system has, each as its example. */
const systemWith = (kind: (typeof vesselKindNames)[number], vessel: string): string => {
  const { services }: VesselKindDefinition = vesselKinds[kind]
  const [service] = services
  if (!service) throw new Error(`${kind} fits no service`)
  const { temperatures, pressure } = serviceKeys[service]
  return [
    'coldfill: 1',
    'systems:',
    '  A:',
    `    service: ${service}`,
    ...(temperatures.length > 0 ? ['    temperatures:'] : []),
    ...temperatures.map((key) => `      ${key}: ${temperatureFields[key].example}`),
    '    pressure:',
    ...pressure.map((key) => `      ${key}: ${pressureFields[key].example}`),
    '    contents: [{ volume: 120 gal }]',
    ...(service.startsWith('domestic')
      ? ['    demand: { building: hotel, fixtures: { shower: 30 }, people: 120, apartments: 60 }']
      : []),
    '    vessels:',
    `      V-1: ${vessel}`,
    '',
  ].join('\n')
}

const codes = (text: string): string[] =>
  readSpec(text, everything).findings.map(({ code, message }) => `${code} ${message}`)

describe.each(vesselKindNames)('%s', (kind) => {
  const { example, fields }: VesselKindDefinition = vesselKinds[kind]

  it('reads its example without a finding', () => {
    expect(codes(systemWith(kind, example))).toEqual([])
  })

  it('reads the example of each key', () => {
    const lines = Object.entries(fields).map(([key, field]: [string, Field]) => `        ${key}: ${field.example}`)
    const vessel = `\n        kind: ${kind}\n${lines.join('\n')}`
    expect(codes(systemWith(kind, vessel))).toEqual([])
  })

  it('is read under each method that it has', () => {
    const method = fields['method'] as ChoiceField
    const others = Object.entries(fields).filter(([key]) => key !== 'method')
    const lines = others.map(([key, field]: [string, Field]) => `        ${key}: ${field.example}`)
    for (const name of Object.keys(method.choices))
      expect(codes(systemWith(kind, `\n        kind: ${kind}\n        method: ${name}\n${lines.join('\n')}`))).toEqual(
        [],
      )
  })

  it('says once that it is not sized, where it is not', () => {
    const text = systemWith(kind, example)
    const without = { ...everything, kinds: vesselKindNames.filter((each) => each !== kind) }
    const { findings, model } = readSpec(text, without)
    expect(findings.map(({ code }) => code)).toEqual(['CF-S021'])
    expect(model?.systems[0]?.vessels).toEqual([])
  })
})

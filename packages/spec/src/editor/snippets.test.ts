import { describe, expect, it } from 'vitest'
import { type Service, serviceField } from '../model/system.ts'
import { type VesselKind, vesselKindNames, vesselKinds } from '../model/vessel.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import { completionsAt } from './completion.ts'
import { freshName } from './snippets.ts'

const everything: Vocabulary = {
  ...testVocabulary,
  kinds: vesselKindNames,
  methods: Object.fromEntries(
    vesselKindNames.map((kind: VesselKind) => {
      const { method } = vesselKinds[kind].fields
      return [kind, method.field === 'choice' ? method.choices : {}]
    }),
  ),
}

const offered = (source: string) => {
  const offset = source.indexOf('‸')
  const text = source.replace('‸', '')
  const completions = completionsAt(text, offset, everything)
  return (completions?.options ?? []).map((option) => ({
    ...option,
    after:
      text.slice(0, completions?.span.start ?? 0) + option.insert + text.slice(completions?.span.end ?? text.length),
  }))
}

describe('a whole system', () => {
  const options = offered('coldfill: 1\nsystems:\n  ‸\n')

  it('is offered for every service', () => {
    expect(options.map(({ label }) => label.replace(/^.*: /u, ''))).toEqual(Object.keys(serviceField.choices))
  })

  it.each(options.map(({ label, after }) => ({ label, after })))(
    '$label lacks nothing but the values that are to be filled in',
    ({ after }) => {
      const { findings, model } = readSpec(after, everything)
      expect(new Set(findings.map(({ code }) => code))).toEqual(new Set(['CF-S019']))
      expect(model?.systems[0]?.vessels).toHaveLength(1)
    },
  )

  it('has an id and a mark that are not taken', () => {
    const text =
      'coldfill: 1\nsystems:\n  HWS:\n    service: heating water\n    vessels:\n      ET-1: { kind: expansion tank }\n  ‸\n'
    const [first] = offered(text)
    expect(first?.label).toBe('HWS-2: heating water')
    expect(first?.insert).toContain('ET-2: { kind: expansion tank')
  })

  it('is a name alone in braces', () => {
    expect(offered('coldfill: 1\nsystems: { ‸ }\n').map(({ insert }) => insert)).toEqual(['HWS: {  }'])
  })
})

describe('a whole vessel', () => {
  const services = Object.keys(serviceField.choices) as Service[]

  it.each(services)('of %s holds choices and placeholders, never a number', (service) => {
    const options = offered(`coldfill: 1\nsystems:\n  A:\n    service: ${service}\n    vessels:\n      ‸\n`)
    expect(options.length).toBeGreaterThan(0)
    for (const { insert, after } of options) {
      expect(insert.replace(/^[^:]*: /u, '')).not.toMatch(/: \d/u)
      const own = readSpec(after, everything).findings.filter(({ path }) => path.startsWith('systems.A.vessels.'))
      // What the system lacks is said beside it.
      expect(own.filter(({ code }) => code !== 'CF-S019' && code !== 'CF-S004')).toEqual([])
    }
  })
})

describe('fresh names', () => {
  it('count on from the example', () => {
    expect(freshName('ET-1', new Set())).toBe('ET-1')
    expect(freshName('ET-1', new Set(['ET-1', 'ET-2']))).toBe('ET-3')
    expect(freshName('HWS', new Set(['HWS']))).toBe('HWS-2')
  })
})

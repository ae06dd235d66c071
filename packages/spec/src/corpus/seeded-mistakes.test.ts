import { describe, expect, it } from 'vitest'
import { type FindingCode, findingCodes } from '../diagnostics.ts'
import { readSpec } from '../read-spec.ts'
import { expectDiagnostic, fixed, testVocabulary } from '../testing.ts'
import { baseSpec } from './base-spec.ts'
import { type SeededMistake, seededMistakes } from './seeded-mistakes.ts'

const seed = ({ from, to }: SeededMistake): string => {
  if (baseSpec.split(from).length !== 2) throw new Error(`"${from}" must stand once in the base spec`)
  return baseSpec.replace(from, () => to)
}

describe('the base spec of the corpus', () => {
  it('has no findings', () => {
    expect(readSpec(baseSpec, testVocabulary).findings).toEqual([])
  })
})

describe.each(seededMistakes)('$code $name', (mistake) => {
  it('is found at its place, and nothing beside it', () => {
    const { finding } = expectDiagnostic(seed(mistake), mistake)
    expect(finding.message).not.toBe('')
    expect(finding.hint).not.toBe('')
  })
})

describe.each(seededMistakes.filter(({ mended }) => mended !== undefined))('$code $name', (mistake) => {
  it('is mended by its first fix', () => {
    const { text, finding, reading } = expectDiagnostic(seed(mistake), mistake)
    expect(fixed(text, finding, reading)).toBe(baseSpec.replace(mistake.from, () => mistake.mended ?? ''))
  })
})

describe('the table of codes', () => {
  /** Raised for texts that are not one mistake in a spec; they have tests of their own. */
  const elsewhere: readonly FindingCode[] = ['CF-Y013', 'CF-Y021', 'CF-Y022', 'CF-Y023', 'CF-S062']

  it('has a seeded mistake for every code', () => {
    const seeded = new Set<string>([...seededMistakes.map(({ code }) => code), ...elsewhere])
    expect(Object.keys(findingCodes).filter((code) => !seeded.has(code))).toEqual([])
  })
})

import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import { applyEdits } from './edits.ts'
import { renameAt, renameRefusal } from './rename.ts'

const renamed = (text: string, words: string, to: string): string => {
  const renaming = renameAt(text, text.indexOf(words) + 1, to, testVocabulary)
  if (!renaming.ok) return renaming.message
  return applyEdits(text, renaming.edits)
}

describe('rename', () => {
  it('gives a fluid another id, also where systems name it', () => {
    expect(renamed(baseSpec, 'glycol-30:', 'PG-30')).toBe(baseSpec.replaceAll('glycol-30', 'PG-30'))
  })

  it('from the system that names the fluid', () => {
    expect(renamed(baseSpec, 'fluid: glycol-30'.slice(7), 'PG-30')).toBe(baseSpec.replaceAll('glycol-30', 'PG-30'))
  })

  it('gives a vessel another mark, also in comments and free texts, and leaves longer marks alone', () => {
    const text = baseSpec
      .replace('      ET-1:\n', '      # coldfill: accept CF-E021 because ET-1 stands outside\n      ET-1:\n')
      .replace('note: coils', 'note: coils beside ET-1')
    const after = renamed(text, 'ET-1:\n', 'ET-9')
    expect(after).toContain('because ET-9 stands outside')
    expect(after).toContain('note: coils beside ET-9')
    expect(after).toContain('TET-1:')
    expect(after).not.toMatch(/(?<!T)ET-1/u)
  })

  it('gives a system another id', () => {
    expect(renamed(baseSpec, 'HWS:', 'HTG')).toBe(baseSpec.replace('HWS', 'HTG'))
  })

  it('keeps quotation marks out of the new name', () => {
    const text = baseSpec.replace('  HWS:\n', "  'HWS':\n")
    expect(renamed(text, "'HWS'", 'HTG')).toBe(baseSpec.replace('HWS', 'HTG'))
  })

  it.each([
    ['that another vessel has, in whatever system', 'ET-1:\n', 'PT-1', '`PT-1` is taken'],
    ['that another system has', 'HWS:\n', 'DHW', '`DHW` is taken'],
    ['with a space', 'ET-1:\n', 'ET 1', '`ET 1` cannot be'],
    ['with a dot', 'HWS:\n', 'H.1', '`H.1` cannot be'],
    ['that is too long', 'ET-1:\n', 'E'.repeat(41), 'at most 40'],
    ['that is empty', 'ET-1:\n', '', 'cannot be the mark'],
    ['that is the same', 'ET-1:\n', 'ET-1', 'called `ET-1` already'],
    ['that a fluid of the language has', 'glycol-30:', 'water', 'without an additive'],
    ['for a word of the language', 'copper type L', 'tube', 'keeps its name'],
    ['for an assumption', 'relief-margin.hydronic', 'margin', 'keeps its name'],
    ['where no name stands', 'static-height', 'x', 'No mark, system or fluid'],
  ])('refuses a name %s', (_, words, to, message) => {
    expect(renamed(baseSpec, words, to)).toContain(message)
  })

  it('refuses while the text cannot be read', () => {
    expect(renamed(`${baseSpec}  x\n`, 'ET-1:\n', 'ET-9')).toContain('cannot be read')
  })

  it('says beforehand what it would refuse', () => {
    expect(renameRefusal(baseSpec, baseSpec.indexOf('ET-1:') + 1, testVocabulary)).toBeNull()
    expect(renameRefusal(baseSpec, baseSpec.indexOf('copper type L') + 1, testVocabulary)).toContain('keeps its name')
  })

  it('leaves a spec that reads as before, whatever the name', () => {
    const names = ['glycol-30:', 'HWS:', 'ET-1:', 'PT-1:', 'DHW:']
    fc.assert(
      fc.property(
        fc.constantFrom(...names),
        fc.stringMatching(/^[A-Za-z0-9][A-Za-z0-9_-]{0,12}[A-Za-z0-9]$/u),
        (words, to) => {
          const renaming = renameAt(baseSpec, baseSpec.indexOf(words) + 1, to, testVocabulary)
          fc.pre(renaming.ok)
          if (!renaming.ok) return
          const after = readSpec(applyEdits(baseSpec, renaming.edits), testVocabulary)
          expect(after.findings).toEqual([])
          const marks = (model = after.model) =>
            model?.systems.flatMap(({ vessels }) => vessels.map(({ mark }) => mark))
          expect(marks()).toHaveLength(5)
        },
      ),
      { numRuns: 100 },
    )
  })
})

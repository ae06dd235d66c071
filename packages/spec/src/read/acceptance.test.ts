import { describe, expect, it } from 'vitest'
import { readSpec } from '../read-spec.ts'
import { dedent, testVocabulary } from '../testing.ts'

const acceptances = (text: string) =>
  readSpec(dedent(text), testVocabulary).acceptances.map(({ code, reason, path }) => ({ code, reason, path }))

const spec = (vessel: string, pressure = '{ cut-in: 40 psi, cut-out: 60 psi }') => `
  coldfill: 1
  systems:
    CWB:
      service: domestic cold water
      pressure: ${pressure}
      vessels:
        ${vessel}
`

describe('accepted warnings', () => {
  it.each([
    [
      'on the line of the mark',
      'PT-1: # coldfill: accept CF-E021 because the owner wants it\n          kind: pressure tank',
    ],
    [
      'on the line of a key of the vessel',
      'PT-1:\n          kind: pressure tank # coldfill: accept CF-E021 because the owner wants it',
    ],
    [
      'on a line of its own in the vessel',
      'PT-1:\n          # coldfill: accept CF-E021 because the owner wants it\n          kind: pressure tank',
    ],
    [
      'on the line above the mark',
      '# coldfill: accept CF-E021 because the owner wants it\n        PT-1:\n          kind: pressure tank',
    ],
    [
      'behind a vessel in braces',
      'PT-1: { kind: pressure tank } # coldfill: accept CF-E021 because the owner wants it',
    ],
  ])('hold for the vessel %s', (_, vessel) => {
    expect(acceptances(spec(vessel))).toEqual([
      { code: 'CF-E021', reason: 'the owner wants it', path: 'systems.CWB.vessels.PT-1' },
    ])
  })

  it('hold for the key outside of vessels', () => {
    expect(
      acceptances(
        spec(
          'PT-1: { kind: pressure tank }',
          '{ cut-in: 40 psi } # coldfill: accept CF-S024 because it stays for later',
        ),
      ),
    ).toEqual([{ code: 'CF-S024', reason: 'it stays for later', path: 'systems.CWB.pressure' }])
  })

  it('keep the place of the comment', () => {
    const reading = readSpec('coldfill: 1 # coldfill: accept CF-E001 because of the site\n', testVocabulary)
    expect(reading.acceptances[0]?.range).toEqual({
      start: { line: 0, character: 12 },
      end: { line: 0, character: 58 },
    })
  })

  it('leave other comments alone', () => {
    expect(readSpec('coldfill: 1 # coldfill accepts nothing\n# accept CF-E021\n', testVocabulary)).toMatchObject({
      acceptances: [],
    })
  })
})

import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { readSpec } from '../read-spec.ts'
import { fixed, testVocabulary } from '../testing.ts'
import { acceptFix, reasonPlaceholder } from './accept-fix.ts'

const text = baseSpec.replace('regulator: 60 psi', 'regulator: 60 psi\n      static-height: 12 ft')
const reading = readSpec(text, testVocabulary)
const [warning] = reading.findings

describe('acceptFix', () => {
  it('writes a comment that accepts the warning at its place', () => {
    if (!warning) throw new Error('the spec has no warning')
    const fix = acceptFix(text, warning, 'it is kept for the next stage')
    const accepted = fix && fixed(text, { ...warning, fixes: [fix] }, reading)
    expect(accepted).toContain(
      '      # coldfill: accept CF-S024 because it is kept for the next stage\n      static-height: 12 ft\n',
    )
    expect(readSpec(accepted ?? '', testVocabulary).acceptances).toMatchObject([
      { code: 'CF-S024', reason: 'it is kept for the next stage', path: 'systems.DHW.pressure.static-height' },
    ])
  })

  it('accepts nothing while the reason is not written', () => {
    if (!warning) throw new Error('the spec has no warning')
    const fix = acceptFix(text, warning)
    expect(fix?.edits[0]?.text).toContain(reasonPlaceholder)
    const open = fix ? fixed(text, { ...warning, fixes: [fix] }, reading) : ''
    expect(readSpec(open, testVocabulary)).toMatchObject({ acceptances: [] })
    expect(readSpec(open, testVocabulary).findings.map(({ code }) => code)).toContain('CF-S070')
  })

  it('accepts no error', () => {
    if (!warning) throw new Error('the spec has no warning')
    expect(acceptFix(text, { ...warning, severity: 'error' })).toBeNull()
  })
})

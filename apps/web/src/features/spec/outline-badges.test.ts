import { outlineOf } from '@coldfill/spec'
import { describe, expect, it } from 'vitest'
import type { Finding } from '#lib/sized-project.ts'
import { badgesOf } from './outline-badges.ts'

const text = `coldfill: 1
project: { title: Test }
systems:
  HWS:
    service: heating water
    vessels:
      ET-1:
        kind: expansion tank
      ET-2: { kind: expansion tank }
`
const outline = outlineOf(text)
if (!outline) throw new Error('no outline')

const finding = (line: number, character: number, severity: Finding['severity'], accepted?: string): Finding => ({
  code: 'CF-S007',
  severity,
  message: '',
  hint: '',
  path: '',
  range: { start: { line, character }, end: { line, character: character + 1 } },
  related: [],
  fixes: [],
  ...(accepted !== undefined && { accepted }),
})

describe('badges', () => {
  it('count each finding once, at the innermost part, with the worst severity', () => {
    const badges = badgesOf(outline, [
      finding(7, 14, 'note'),
      finding(7, 14, 'error'),
      finding(8, 14, 'warning'),
      finding(4, 4, 'note'),
      finding(1, 12, 'note'),
    ])
    expect(Object.fromEntries(badges)).toEqual({
      'systems.HWS.vessels.ET-1': { severity: 'error', count: 2 },
      'systems.HWS.vessels.ET-2': { severity: 'warning', count: 1 },
      'systems.HWS': { severity: 'note', count: 1 },
      project: { severity: 'note', count: 1 },
    })
  })

  it('leave out what is accepted', () => {
    expect(badgesOf(outline, [finding(7, 14, 'warning', 'it has to be')]).size).toBe(0)
  })
})

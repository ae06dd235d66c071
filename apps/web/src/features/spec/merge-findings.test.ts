import type { ProjectResult } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import type { Finding } from '#lib/sized-project.ts'
import { mergeFindings } from './merge-findings.ts'

const at = (line: number) => ({ start: { line, character: 0 }, end: { line, character: 4 } })
const finding = (code: string, path: string, line: number): Finding => ({
  code,
  severity: 'warning',
  message: '',
  hint: '',
  path,
  range: at(line),
  related: [],
  fixes: [{ title: 'x', edits: [] }],
})
const sized = (text: string, findings: readonly Finding[]) => ({
  text,
  result: { vessels: [], findings } as unknown as ProjectResult,
})

describe('findings while typing', () => {
  it('are those of the sizing when it is of the same text', () => {
    const all = [finding('CF-S010', 'a', 1), finding('CF-E021', 'b', 2)]
    expect(mergeFindings([finding('CF-S010', 'a', 1)], sized('t', all), 't', () => null)).toBe(all)
  })
  it('follow their keys while the text is newer than the sizing', () => {
    const merged = mergeFindings(
      [finding('CF-S010', 'z', 5)],
      sized('old', [finding('CF-S099', 'gone', 0), finding('CF-E021', 'b', 2)]),
      'new',
      () => at(3),
    )
    expect(merged.map((one) => [one.code, one.range.start.line])).toEqual([
      ['CF-E021', 3],
      ['CF-S010', 5],
    ])
  })
  it('offer no fix made for another text', () => {
    expect(mergeFindings([], sized('old', [finding('CF-E021', 'b', 2)]), 'new', () => at(3))[0]?.fixes).toEqual([])
  })
  it('go with the key they were about', () => {
    expect(mergeFindings([], sized('old', [finding('CF-E021', 'b', 2)]), 'new', () => null)).toEqual([])
  })
})

import { describe, expect, it } from 'vitest'
import { casesNotRun, verificationCases, verificationRows } from './index.ts'

const rows = verificationRows()

describe('verification manual', () => {
  it('holds on every figure, or lists it as a known mistake of the publication', () => {
    const failing = rows
      .filter(({ verdict }) => verdict === 'fails')
      .map(({ id, shown, deviation }) => `${id}: ${shown.expected}, computed ${shown.computed}, ${deviation}`)
    expect(failing).toEqual([])
  })

  it('has an id for each figure and a case for each id', () => {
    expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length)
    const run = new Set(verificationCases.map(({ id }) => id))
    expect(casesNotRun.filter(({ id }) => run.has(id))).toEqual([])
  })

  it('shows every known mistake with its reason, and no other', () => {
    const wrong = rows.filter(({ verdict }) => verdict === 'known wrong').map(({ id }) => id)
    expect(new Set(wrong.map((id) => id.replace(/\.\d$/u, '')))).toEqual(
      new Set([
        'S03',
        'D06_ymca',
        'D19',
        'aspe-method-2',
        'N06_names',
        'H33_130',
        'S18_100',
        'S05_e',
        'chilled-sheet',
        'V01_5_8',
        'V01_4',
      ]),
    )
    for (const row of rows) expect(row.reason === undefined).toBe(row.verdict !== 'known wrong')
  })

  it('gives the same twice', () => {
    expect(verificationRows()).toEqual(rows)
  })

  it('says of every figure where it comes from and why the tolerance is what it is', () => {
    const silent = rows.filter(
      ({ source, because, tolerance, expected }) =>
        source === '' || (expected !== null && (because === '' || !(tolerance > 0))),
    )
    expect(silent).toEqual([])
  })
})

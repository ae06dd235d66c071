import { water } from '@coldfill/engine'
import { writeSchedule } from '@coldfill/documents'
import { clinicProject, documentOptions } from '@coldfill/documents/testing'
import { describe, expect, it } from 'vitest'
import { hasOffice, leftOut } from './office.ts'
import { formulaResults, readWorkbook, recalculated } from './recalculate.ts'

/** Relative, as the workbook promises it. */
const TOLERANCE = 1e-9

const off = (found: unknown, expected: unknown): boolean =>
  typeof found !== 'number' ||
  typeof expected !== 'number' ||
  Math.abs(found - expected) > TOLERANCE * Math.max(Math.abs(expected), 1e-30)

describe.skipIf(!hasOffice)(`the workbook recalculated by LibreOffice${leftOut}`, () => {
  it.each(['US', 'SI'] as const)('gives the value of the engine in every formula cell, in %s units', async (units) => {
    const bytes = await writeSchedule(clinicProject(water.functions), documentOptions(units))
    const expected = formulaResults(await readWorkbook(bytes))
    const found = formulaResults(await recalculated(bytes))
    expect(expected.size).toBeGreaterThan(90)
    expect(found.size).toBe(expected.size)
    const wrong = [...expected].filter(([cell, value]) => off(found.get(cell), value))
    expect(wrong.map(([cell, value]) => `${cell}: ${String(found.get(cell))}, not ${String(value)}`)).toEqual([])
  })
})

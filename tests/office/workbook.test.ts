import { readFileSync } from 'node:fs'
import { scheduleKinds, scheduleTable, writeSchedule } from '@coldfill/documents'
import { documentOptions, everyVessel } from '@coldfill/documents/testing'
import { sizeSpec } from '@coldfill/sizing'
import ExcelJS from 'exceljs'
import { describe, expect, it } from 'vitest'
import { hasOffice, leftOut } from './office.ts'
import { formulaResults, readWorkbook, recalculated } from './recalculate.ts'

/** Relative, as the workbook promises it. */
const TOLERANCE = 1e-9

const off = (found: unknown, expected: unknown): boolean =>
  typeof expected === 'number' ? offNumber(found, expected) : found !== expected

const offNumber = (found: unknown, expected: unknown): boolean =>
  typeof found !== 'number' ||
  typeof expected !== 'number' ||
  !(Math.abs(found - expected) <= TOLERANCE * Math.max(Math.abs(expected), 1e-30))

const EVERY = 'a vessel of every kind'

const spec = (building: string): string =>
  building === EVERY
    ? everyVessel
    : readFileSync(new URL(`../../examples/${building}/spec.yaml`, import.meta.url), 'utf8')

/** Types a number into the cell of a key of the spec: the outlined one, which holds a number and no formula. */
const type = (workbook: ExcelJS.Workbook, key: string, value: number): void => {
  const cells = workbook.worksheets.flatMap((sheet) => {
    const found: ExcelJS.Cell[] = []
    sheet.eachRow((row) => {
      const source = row.getCell(6).text
      if (source.replace(/ \(.*\)$/, '') === `spec: ${key}` && typeof row.getCell(3).value === 'number') {
        found.push(row.getCell(3))
      }
    })
    return found
  })
  expect({ key, cells: cells.length }).toEqual({ key, cells: 1 })
  const [cell] = cells
  if (cell) cell.value = value
}

/** Numbers of every schedule as the sheets hold them, by kind, mark and column. */
const scheduled = (
  workbook: ExcelJS.Workbook,
  kinds: readonly { kind: string; title: string; keys: readonly string[] }[],
) => {
  const numbers = new Map<string, unknown>()
  for (const { title, keys } of kinds) {
    workbook.getWorksheet(title)?.eachRow((row) => {
      const mark = row.getCell(1).value
      if (typeof mark !== 'string') return
      keys.forEach((key, index) => {
        const cell = row.getCell(index + 1)
        numbers.set(`${mark} ${key}`, cell.type === ExcelJS.ValueType.Formula ? cell.result : cell.value)
      })
    })
  }
  return numbers
}

it.skipIf(!hasOffice)(`the workbook refuses a temperature at which the engine has no value${leftOut}`, async () => {
  const workbook = await readWorkbook(await writeSchedule(sizeSpec(everyVessel), documentOptions('US')))
  // 400 °F is above 200 °C, where the equations of liquid water end for the engine.
  type(workbook, 'HWS / temperatures / high', 400)
  const found = await recalculated(new Uint8Array(await workbook.xlsx.writeBuffer()))
  const schedule = found.getWorksheet('Expansion tanks')
  const column = scheduleTable(sizeSpec(everyVessel), 'expansion tank', 'US').columns.findIndex(
    ({ key }) => key === 'required-volume',
  )
  const rows = schedule?.getRows(1, schedule.rowCount) ?? []
  const cell = rows.find((row) => row.getCell(1).value === 'ET-1')?.getCell(column + 1)
  expect(cell?.result).toEqual({ error: '#N/A' })
})

describe.skipIf(!hasOffice)(`the workbook recalculated by LibreOffice${leftOut}`, () => {
  describe.each(['fernhollow', 'alder-court', EVERY])('%s', (building) => {
    it.each(['US', 'SI'] as const)(
      'gives the value of the engine in every formula cell, in %s units',
      async (units) => {
        const bytes = await writeSchedule(sizeSpec(spec(building)), documentOptions(units))
        const expected = formulaResults(await readWorkbook(bytes))
        const found = formulaResults(await recalculated(bytes))
        expect(expected.size).toBeGreaterThan(60)
        expect(found.size).toBe(expected.size)
        const wrong = [...expected].filter(([cell, value]) => off(found.get(cell), value))
        expect(wrong.map(([cell, value]) => `${cell}: ${String(found.get(cell))}, not ${String(value)}`)).toEqual([])
      },
    )
  })

  it.each([
    {
      building: 'fernhollow',
      units: 'US',
      edits: [
        ['high: 180 °F', 'high: 205 °F', 'HWS / temperatures / high', 205],
        ['static-height: 42 ft', 'static-height: 50 ft', 'HWS / pressure / static-height', 50],
        ['elevation: 5200 ft', 'elevation: 900 ft', 'project / elevation', 900],
        ['high: 165 °F', 'high: 175 °F', 'PHG / temperatures / high', 175],
        ['low: 20 °F', 'low: 31 °F', 'PHG / temperatures / low', 31],
        ['storage: 140 °F', 'storage: 160 °F', 'DHW / temperatures / storage', 160],
        ['regulator: 60 psi', 'regulator: 55 psi', 'DHW / pressure / regulator', 55],
      ],
    },
    {
      building: 'alder-court',
      units: 'SI',
      edits: [
        ['high: 75 °C', 'high: 88 °C', 'HTG / temperatures / high', 88],
        ['static-height: 11.5 m', 'static-height: 14 m', 'HTG / pressure / static-height', 14],
        ['relief-valve: 3 bar', 'relief-valve: 6 bar', 'HTG / pressure / relief-valve', 600],
      ],
    },
    {
      building: EVERY,
      units: 'US',
      edits: [
        ['elevation: 820 ft', 'elevation: 4100 ft', 'project / elevation', 4100],
        ['low: 55 °F, high: 180 °F', 'low: 48 °F, high: 180 °F', 'HWS / temperatures / low', 48],
        ['low: 48 °F, high: 180 °F', 'low: 48 °F, high: 195 °F', 'HWS / temperatures / high', 195],
        ['low: 20 °F, high: 165 °F', 'low: 20 °F, high: 158 °F', 'GLY / temperatures / high', 158],
        ['storage: 140 °F }', 'storage: 150 °F }', 'DHW / temperatures / storage', 150],
        ['precharge: 30 psi, quantity: 2', 'precharge: 30 psi, quantity: 3', 'HWS / ET-2 / quantity', 3],
        ['apartments: 35', 'apartments: 41', 'DHW / demand / apartments', 41],
        ['cut-in: 40 psi', 'cut-in: 42 psi', 'CWB / pressure / cut-in', 42],
        ['condensate-pressure: 100 psi', 'condensate-pressure: 145 psi', 'LPS / FT-1 / condensate-pressure', 145],
        ['flash-pressure: 5 psi', 'flash-pressure: 12 psi', 'LPS / FT-1 / flash-pressure', 12],
        ['60 ft2, boiler-pressure: 100', '60 ft2, boiler-pressure: 125', 'LPS / BS-1 / boiler-pressure', 125],
        ['blown-volume: 60 gal', 'blown-volume: 85 gal', 'LPS / BS-2 / blown-volume', 85],
        ['steaming-rate: 3450 lb/h', 'steaming-rate: 2990 lb/h', 'LPS / CR-2 / steaming-rate', 2990],
      ],
    },
  ] as const)(
    'follows what is typed into its input cells as the engine follows the spec: $building',
    async (example) => {
      const { building, units, edits } = example
      const text = spec(building)
      let changedText = text
      for (const [from, to] of edits) {
        expect(changedText.split(from)).toHaveLength(2)
        changedText = changedText.replace(from, to)
      }
      const before = sizeSpec(text)
      const after = sizeSpec(changedText)

      const workbook = await readWorkbook(await writeSchedule(before, documentOptions(units)))
      for (const [, , key, value] of edits) type(workbook, key, value)
      const found = await recalculated(new Uint8Array(await workbook.xlsx.writeBuffer()))

      const tables = scheduleKinds(after).map((kind) => scheduleTable(after, kind, units))
      const kinds = tables.map((table) => ({ ...table, keys: table.columns.map((column) => column.key) }))
      const numbers = scheduled(found, kinds)
      const expected = tables.flatMap((table) =>
        table.rows.flatMap((row) =>
          Object.entries(row.cells).flatMap(([key, cell]) =>
            // The relief setting stands in the schedule as a number of the system, outside any calculation.
            cell.entry === null ? [] : [[`${row.mark} ${key}`, cell.value] as const],
          ),
        ),
      )
      expect(expected.length).toBeGreaterThan(15)
      const wrong = expected.filter(([cell, value]) => off(numbers.get(cell), value))
      expect(wrong.map(([cell, value]) => `${cell}: ${String(numbers.get(cell))}, not ${String(value)}`)).toEqual([])
      // The edits must have moved every size, or the comparison above says little.
      const size = (result: typeof before) => result.vessels.map((vessel) => vessel.results['required-volume']?.value)
      const moved = size(after).filter((value, index) => value !== size(before)[index])
      expect(moved.length).toBeGreaterThanOrEqual(building === EVERY ? 30 : building === 'fernhollow' ? 3 : 1)
    },
  )
})

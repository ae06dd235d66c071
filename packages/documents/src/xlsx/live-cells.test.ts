import { methods } from '@coldfill/engine'
import { layout, symbolsIn, toPlainText, formulaTree } from '@coldfill/formula'
import { sizeSpec } from '@coldfill/sizing'
import ExcelJS from 'exceljs'
import { describe, expect, it } from 'vitest'
import { scheduleKinds, scheduleTable } from '@coldfill/presentation'
import { documentOptions, everyVessel } from '../testing/index.ts'
import { writeSchedule } from './write-schedule.ts'

const result = sizeSpec(everyVessel)

const read = async (units: 'US' | 'SI'): Promise<ExcelJS.Workbook> => {
  const workbook = new ExcelJS.Workbook()
  await workbook.xlsx.load((await writeSchedule(result, documentOptions(units))) as never)
  return workbook
}

const shown = (symbol: string): string =>
  toPlainText(layout({ type: 'symbol', name: symbol, at: { start: 0, end: 0 } }))

/** Formula of a cell, or null where it holds a number or a word. */
const formula = (cell: ExcelJS.Cell): string | null => (cell.type === ExcelJS.ValueType.Formula ? cell.formula : null)

/**
 * Numbers of a schedule that are not of a calculation, so that no cell of one can move them; each with the reason.
 */
const FIXED: Readonly<Record<string, string>> = {
  quantity: 'a single vessel has no step that its number goes into',
  'relief-set': 'the valve is scheduled beside a vessel that is sized without it, as an open tank',
}

describe('the workbook of every kind of vessel', () => {
  it('has a vessel by every method that a spec can choose', () => {
    const used = new Set(result.vessels.map(({ methodId }) => methodId))
    const choosable = Object.values(methods).filter(({ vessel }) => vessel)
    expect(choosable.filter(({ id }) => !used.has(id)).map(({ id }) => id)).toEqual([])
    expect(result.vessels.filter(({ status }) => status !== 'sized').map(({ mark }) => mark)).toEqual([])
  })

  it.each(['US', 'SI'] as const)('has a live formula for every step, in %s units', async (units) => {
    const workbook = await read(units)
    const fixed: string[] = []
    let steps = 0
    for (const { mark, trace } of result.vessels) {
      const cells = new Map<string, ExcelJS.Cell>()
      workbook.getWorksheet(mark)?.eachRow((row) => {
        const symbol = row.getCell(1).text
        // Fluid properties stand below the steps and may have the symbol of one.
        if (!cells.has(symbol)) cells.set(symbol, row.getCell(3))
      })
      for (const entry of trace.flatMap(({ entries }) => entries)) {
        if (entry.entry !== 'step') continue
        steps += 1
        const cell = cells.get(shown(entry.symbol))
        const text = cell && formula(cell)
        const refers = symbolsIn(formulaTree(entry.formula)).length === 0 || /\$C\$\d+/.test(text ?? '')
        if (!text || !refers) fixed.push(`${mark} ${entry.symbol} = ${entry.formula}`)
      }
    }
    expect(fixed).toEqual([])
    expect(steps).toBeGreaterThan(500)
  })

  it('refers to a calculation in every number of a schedule', async () => {
    const workbook = await read('US')
    const fixed = new Map<string, string[]>()
    let live = 0
    for (const kind of scheduleKinds(result)) {
      const table = scheduleTable(result, kind, 'US')
      const rows = new Map<string, ExcelJS.Row>()
      workbook.getWorksheet(table.title)?.eachRow((row) => rows.set(row.getCell(1).text, row))
      for (const { mark, cells } of table.rows) {
        table.columns.forEach(({ key }, index) => {
          if (typeof cells[key]?.value !== 'number') return
          const cell = rows.get(mark)?.getCell(index + 1)
          if (cell && formula(cell)) live += 1
          else fixed.set(key, [...(fixed.get(key) ?? []), mark])
        })
      }
    }
    expect([...fixed.keys()].filter((key) => !Object.hasOwn(FIXED, key))).toEqual([])
    // ET-2 stands for two tanks, whose number goes into the volume of each.
    expect(fixed.get('quantity')).not.toContain('ET-2')
    expect(fixed.get('relief-set')).toEqual(['ET-4'])
    expect(live).toBeGreaterThan(300)
  })
})

import ExcelJS from 'exceljs'
import { describe, expect, it } from 'vitest'
import { putCell, type CellContent } from './put-cell.ts'

const cell = (): ExcelJS.Cell => new ExcelJS.Workbook().addWorksheet('s').getCell('A1')
const put = (content: CellContent) => {
  const target = cell()
  putCell(target, content)
  return target
}

describe('the gate in front of every cell', () => {
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '=HYPERLINK("http://x")', '\t=1'])('keeps %j as text', (text) => {
    expect(put({ text }).type).toBe(ExcelJS.ValueType.String)
  })

  it('takes out what a spreadsheet would not show or would decode into something else', () => {
    expect(put({ text: 'a\u0007b\u0000c' }).value).toBe('abc')
    expect(put({ text: 'tank \ud800 one' }).value).toBe('tank \ufffd one')
    expect(put({ text: '_x0041_ and _x0041' }).value).toBe('_x005F_x0041_ and _x0041')
    expect(put({ text: 'x'.repeat(40_000) }).value).toHaveLength(32_767)
  })

  it.each([Number.NaN, Infinity, -Infinity])('refuses the number %d', (number) => {
    expect(() => put({ number, format: '0' })).toThrow(String(number))
  })

  it('refuses a formula with an equals sign in front, which would be written twice', () => {
    expect(() => put({ formula: '=A1', result: 1 })).toThrow('=A1')
  })

  it('shows an error until it is recalculated where the engine has no finite value', () => {
    expect(put({ formula: '1/0', result: Number.NaN }).result).toEqual({ error: '#NUM!' })
  })
})

import ExcelJS from 'exceljs'
import { strFromU8, strToU8, unzipSync, zipSync } from 'fflate'
import { convert } from './office.ts'

/**
 * Takes the cached result from every formula cell. LibreOffice trusts the results of files of this stamp, so that a
 * wrong formula would come back with the right number.
 */
export const withoutResults = (bytes: Uint8Array): Uint8Array => {
  const parts = unzipSync(bytes)
  for (const [name, part] of Object.entries(parts)) {
    if (!/^xl\/worksheets\/sheet\d+\.xml$/.test(name)) continue
    parts[name] = strToU8(strFromU8(part).replace(/(<f>[^<]*<\/f>)<v>[^<]*<\/v>/g, '$1'))
  }
  return zipSync(parts)
}

export const readWorkbook = async (bytes: Uint8Array): Promise<ExcelJS.Workbook> => {
  const workbook = new ExcelJS.Workbook()
  await workbook.xlsx.load(bytes as never)
  return workbook
}

/** Formula cells of a workbook with the results stored in it, by `sheet!address`. */
export const formulaResults = (workbook: ExcelJS.Workbook): Map<string, unknown> => {
  const found = new Map<string, unknown>()
  for (const sheet of workbook.worksheets) {
    sheet.eachRow((row) => {
      row.eachCell((cell) => {
        if (cell.type === ExcelJS.ValueType.Formula) found.set(`${sheet.name}!${cell.address}`, cell.result)
      })
    })
  }
  return found
}

/** Every formula cell as LibreOffice computes it anew. */
export const recalculated = async (bytes: Uint8Array): Promise<ExcelJS.Workbook> =>
  readWorkbook(convert('schedule.xlsx', withoutResults(bytes), 'xlsx'))

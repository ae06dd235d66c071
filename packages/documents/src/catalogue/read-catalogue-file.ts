import { Readable } from 'node:stream'
import { type CatalogueReading, readCatalogue } from '@coldfill/sizing'
import ExcelJS from 'exceljs'
import { Unzip, UnzipInflate } from 'fflate'

/** Largest catalogue that is read. */
export const maxCatalogueBytes = 2_000_000
/** Largest sum of the parts of a workbook, unpacked: a small archive can hold a thousand times its size. */
const maxUnpackedBytes = 40_000_000
const maxRows = 20_000
const maxColumns = 64
const PIECE = 16_384

const refused = (message: string): CatalogueReading => ({ rows: [], problems: [{ line: 1, column: '', message }] })

const cellText = (value: ExcelJS.CellValue): string => {
  if (value === null || value === undefined) return ''
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (value instanceof Date) return value.toISOString().slice(0, 10)
  if (typeof value === 'object') {
    if ('richText' in value) return value.richText.map((part) => part.text).join('')
    if ('result' in value) return cellText(value.result ?? null)
    if ('text' in value) return value.text
    return ''
  }
  return String(value)
}

const tableOf = (sheet: ExcelJS.Worksheet): string[][] => {
  const width = Math.min(sheet.columnCount, maxColumns)
  return Array.from({ length: Math.min(sheet.rowCount, maxRows) }, (_, row) =>
    Array.from({ length: width }, (__, column) => cellText(sheet.getCell(row + 1, column + 1).value)),
  )
}

/** Whether the parts stay within the limit. Counts what comes out piece by piece: the sizes that an archive tells may be wrong. */
const unpacksSmall = (bytes: Uint8Array): boolean => {
  let unpacked = 0
  const archive = new Unzip((part) => {
    part.ondata = (error, chunk) => {
      if (error) throw error
      unpacked += chunk.length
    }
    part.start()
  })
  archive.register(UnzipInflate)
  for (let at = 0; at < bytes.length; at += PIECE) {
    archive.push(bytes.subarray(at, at + PIECE), at + PIECE >= bytes.length)
    if (unpacked > maxUnpackedBytes) return false
  }
  return true
}

const isWorkbook = (bytes: Uint8Array): boolean => bytes[0] === 0x50 && bytes[1] === 0x4b

/**
 * Reads a vessel catalogue from the bytes of a CSV file (comma, semicolon or tab) or of the first sheet of a workbook.
 * What is wrong comes back as problems; nothing throws for bad bytes.
 */
export const readCatalogueFile = async (bytes: Uint8Array): Promise<CatalogueReading> => {
  if (bytes.length > maxCatalogueBytes)
    return refused(`The catalogue has ${bytes.length} bytes; ${maxCatalogueBytes} are read at most.`)
  const workbook = new ExcelJS.Workbook()
  try {
    if (isWorkbook(bytes)) {
      if (!unpacksSmall(bytes))
        return refused(`The workbook unpacks to more than ${maxUnpackedBytes / 1e6} MB. Save the sheet as CSV.`)
      await workbook.xlsx.load(bytes.slice().buffer)
      const [sheet] = workbook.worksheets
      return sheet ? readCatalogue(tableOf(sheet)) : refused('The workbook has no sheet.')
    }
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes).replace(/^\uFEFF/u, '')
    const head = text.split(/\r?\n/u, 1)[0] ?? ''
    const delimiter = [',', ';', '\t'].toSorted((a, b) => head.split(b).length - head.split(a).length)[0] ?? ','
    const sheet = await workbook.csv.read(Readable.from([text]), {
      parserOptions: { delimiter },
      // Cells stay text: the catalogue reader decides what is a number.
      map: (value: unknown) => value,
    })
    return readCatalogue(tableOf(sheet))
  } catch (error) {
    return refused(
      `The catalogue cannot be read as CSV (UTF-8) or as a workbook: ${error instanceof Error ? error.message : String(error)}`,
    )
  }
}

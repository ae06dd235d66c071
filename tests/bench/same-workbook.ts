// The library on its own: writes the cells of a finished workbook again, values and looks alike.
import ExcelJS from 'exceljs'

type Cells = readonly {
  readonly name: string
  readonly widths: readonly number[]
  readonly cells: readonly { row: number; column: number; value: ExcelJS.CellValue; style: Partial<ExcelJS.Style> }[]
}[]

export const readCells = async (bytes: Uint8Array): Promise<Cells> => {
  const workbook = new ExcelJS.Workbook()
  await workbook.xlsx.load(bytes as never)
  return workbook.worksheets.map((sheet) => {
    const cells: { row: number; column: number; value: ExcelJS.CellValue; style: Partial<ExcelJS.Style> }[] = []
    sheet.eachRow((row) => {
      row.eachCell({ includeEmpty: true }, (cell) => {
        cells.push({ row: Number(cell.row), column: Number(cell.col), value: cell.value, style: cell.style })
      })
    })
    return { name: sheet.name, widths: sheet.columns.map((column) => column.width ?? 10), cells }
  })
}

export const writeSameCells = async (sheets: Cells): Promise<Uint8Array> => {
  const workbook = new ExcelJS.Workbook()
  for (const { name, widths, cells } of sheets) {
    const sheet = workbook.addWorksheet(name)
    widths.forEach((width, index) => {
      sheet.getColumn(index + 1).width = width
    })
    for (const { row, column, value, style } of cells) {
      const cell = sheet.getCell(row, column)
      cell.value = value
      cell.style = style
    }
  }
  return new Uint8Array(await workbook.xlsx.writeBuffer())
}

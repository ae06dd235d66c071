import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import { sheetReference } from './put-cell.ts'
import type { VesselCells } from './schedule-sheet.ts'

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[^A-Za-z0-9]+/g, '_')
    .replace(/^_+|_+$/g, '')

/** True where a spreadsheet would read the name as the address of a cell. */
const isAddress = (name: string): boolean => /^([A-Za-z]{1,3}\d+|[Rr]\d*([Cc]\d*)?|[Cc]\d*)$/.test(name)

/** Name of the cell of an input or result of a vessel: `ET_1_precharge` of the mark ET-1. */
export const cellName = (...parts: readonly string[]): string => {
  const name = parts
    .map(plain)
    .filter((part) => part !== '')
    .join('_')
    .slice(0, 200)
  return name === '' || /^\d/.test(name) || isAddress(name) ? `_${name}` : name
}

/** Names the cells of all inputs and results by mark and key; where two systems use one mark, by system too. */
export const nameCells = (
  workbook: Workbook,
  result: ProjectResult,
  vessels: ReadonlyMap<string, VesselCells>,
): void => {
  const taken = new Set<string>()
  const marks = new Map<string, number>()
  for (const { mark } of result.vessels) marks.set(plain(mark), (marks.get(plain(mark)) ?? 0) + 1)
  for (const vessel of result.vessels) {
    const found = vessels.get(`${vessel.system}/${vessel.mark}`)
    if (!found) continue
    const owner = (marks.get(plain(vessel.mark)) ?? 0) > 1 ? [vessel.system, vessel.mark] : [vessel.mark]
    const keyed = [
      ...Object.entries(vessel.results).map(([key, { entry }]) => [key, entry] as const),
      ...vessel.trace
        .flatMap((section) => section.entries)
        .flatMap((entry) =>
          entry.entry === 'input' ? [[entry.id.slice(entry.id.lastIndexOf('/') + 1), entry.id]] : [],
        ),
    ]
    for (const [key = '', entry = ''] of keyed) {
      const address = found.cells.get(entry)
      const name = cellName(...owner, key)
      if (address === undefined || taken.has(name.toLowerCase())) continue
      taken.add(name.toLowerCase())
      workbook.definedNames.add(`${sheetReference(found.sheet)}!${address}`, name)
    }
  }
}

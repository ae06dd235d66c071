import type { ProjectResult } from '@coldfill/sizing'
import { sheetReference } from './put-cell.ts'
import type { VesselCells } from './schedule-sheet.ts'

const plain = (text: string): string =>
  (/^[ -~]*$/.test(text) ? text : text.normalize('NFKD').replace(/[\u0300-\u036f]/g, ''))
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

/**
 * Names of the cells of all inputs and results by mark and key, with the addresses they stand for; where two systems use one
 * mark, by system too.
 */
export const namedCells = (
  result: ProjectResult,
  vessels: ReadonlyMap<string, VesselCells>,
): ReadonlyMap<string, string> => {
  const names = new Map<string, string>()
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
      names.set(name, `${sheetReference(found.sheet)}!${address}`)
    }
  }
  return names
}

/** The workbook part with these names added. Names and addresses hold nothing that has to be escaped but the quotes of sheets. */
export const withNames = (workbookXml: string, names: ReadonlyMap<string, string>): string => {
  const added = [...names]
    .map(([name, address]) => `<definedName name="${name}">${address.replaceAll("'", '&apos;')}</definedName>`)
    .join('')
  return workbookXml.includes('</definedNames>')
    ? workbookXml.replace('</definedNames>', () => `${added}</definedNames>`)
    : workbookXml.replace('</sheets>', () => `</sheets>${added === '' ? '' : `<definedNames>${added}</definedNames>`}`)
}

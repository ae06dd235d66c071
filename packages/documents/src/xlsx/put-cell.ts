import type { Cell } from 'exceljs'
import { cellText } from './plain-text.ts'

/** What a cell may hold. Text is never read as a formula, whatever it begins with. */
export type CellContent =
  | { readonly text: string }
  | { readonly number: number; readonly format: string }
  /** A formula without `=`, and the value that viewers show before they recalculate; one that is not finite shows as an error. */
  | { readonly formula: string; readonly result: number | string; readonly format?: string }
  /** A jump to a cell of this workbook. */
  | { readonly text: string; readonly sheet: string }

const finite = (value: number, cell: Cell): number => {
  if (!Number.isFinite(value)) throw new Error(`${cell.fullAddress.sheetName}!${cell.address} is given ${value}`)
  return value
}

const cached = (result: number | string): number | string | { error: '#NUM!' } => {
  if (typeof result === 'string') return cellText(result)
  return Number.isFinite(result) ? result : { error: '#NUM!' }
}

/** The one way into a cell. A number that is not finite or a formula with `=` in front is a programmer's mistake and throws. */
export const putCell = (cell: Cell, content: CellContent): void => {
  if ('number' in content) {
    cell.value = finite(content.number, cell)
    cell.numFmt = content.format
    return
  }
  if ('formula' in content) {
    // oxlint-disable-next-line no-control-regex
    if (/^=|[\u0000-\u001f]/.test(content.formula)) throw new Error(`not a formula for a cell: ${content.formula}`)
    cell.value = { formula: content.formula, result: cached(content.result), date1904: false }
    if (content.format !== undefined) cell.numFmt = content.format
    return
  }
  if ('sheet' in content) {
    cell.value = { text: cellText(content.text), hyperlink: `#${sheetReference(content.sheet)}!A1` }
    return
  }
  // An empty cell stays empty, so that it counts as blank for whoever fills it in.
  if (content.text !== '') cell.value = cellText(content.text)
}

/** A sheet's name as formulas and links write it. Only names made by `SheetNames` get here. */
export const sheetReference = (name: string): string => {
  if (!/^[A-Za-z0-9 .()_-]{1,31}$/.test(name)) throw new Error(`unsafe sheet name: ${name}`)
  return `'${name}'`
}

/** Words inside a formula. */
export const formulaText = (text: string): string => `"${cellText(text).replaceAll('"', '""')}"`

/** Number format of a fixed number of decimals. */
export const decimalsFormat = (decimals: number): string => (decimals === 0 ? '0' : `0.${'0'.repeat(decimals)}`)

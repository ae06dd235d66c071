import {
  glycols,
  if97Region1,
  if97Region1Reducing,
  if97Region4,
  vapourDensity,
  type PolynomialTable,
} from '@coldfill/engine'
import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook, Worksheet } from 'exceljs'
import type { DocumentOptions } from '../document-options.ts'
import { PENCIL } from '../look.ts'
import { putCell, sheetReference } from './put-cell.ts'
import { addSheet, font, HEAD_BORDERS, ROW_BORDERS, WELL_FILL, wrapped, writeTitle } from './sheet.ts'

export type GlycolBase = keyof typeof glycols

/** Addresses of the IF97 coefficients, for formulas on other sheets. */
export interface WaterCells {
  readonly i: string
  readonly j: string
  readonly n: string
  /** n1 to n10 of region 4. */
  readonly saturation: readonly string[]
  readonly pressure: string
  readonly temperature: string
  readonly gasConstant: string
  readonly pi: string
  readonly tau: string
}

/** Addresses of the equation for the density of saturated steam. */
export interface SteamCells {
  readonly n: string
  /** Exponents in sixths. */
  readonly sixths: string
  readonly temperature: string
  readonly density: string
}

/** Addresses of one polynomial in strength (per cent by mass) and temperature (°C). */
export interface PolynomialCells {
  readonly i: string
  readonly j: string
  readonly c: string
  readonly strength: string
  readonly temperature: string
}

export interface FluidCells {
  readonly water: WaterCells
  /** Only where a calculation asks for steam. */
  readonly steam: SteamCells | null
  readonly glycols: ReadonlyMap<
    GlycolBase,
    { readonly density: PolynomialCells; readonly specificHeat: PolynomialCells }
  >
}

const WIDTHS = [30, 10, 10, 26]

/** Writes blocks of coefficients one under the other and hands out the addresses of their numbers. */
class Blocks {
  readonly sheet: Worksheet
  row: number

  constructor(sheet: Worksheet, row: number) {
    this.sheet = sheet
    this.row = row
  }

  title(text: string): void {
    const cell = this.sheet.getCell(this.row, 1)
    putCell(cell, { text })
    cell.font = font(11, { bold: true })
    this.row += 1
  }

  source(text: string): void {
    const cell = this.sheet.getCell(this.row, 1)
    putCell(cell, { text })
    cell.font = font(9, {}, PENCIL)
    this.row += 1
  }

  head(texts: readonly string[]): void {
    texts.forEach((text, index) => {
      const cell = this.sheet.getCell(this.row, 1 + index)
      putCell(cell, { text })
      cell.font = font(9, { bold: true })
      cell.fill = WELL_FILL
      cell.border = HEAD_BORDERS
      cell.alignment = wrapped(index === 0 ? 'left' : 'right', 'bottom')
    })
    this.row += 1
  }

  /** One row of a label and numbers, in as many digits as each number has. Returns its row. */
  put(label: string, ...numbers: readonly (number | null)[]): number {
    const { row } = this
    const first = this.sheet.getCell(row, 1)
    putCell(first, { text: label })
    first.font = font(9)
    first.border = ROW_BORDERS
    first.alignment = wrapped('left')
    numbers.forEach((number, index) => {
      const cell = this.sheet.getCell(row, 2 + index)
      if (number !== null) putCell(cell, { number, format: 'General' })
      cell.font = font(9)
      cell.border = ROW_BORDERS
      cell.alignment = { horizontal: 'right' }
    })
    this.row += 1
    return row
  }

  at(column: string, row: number): string {
    return `${sheetReference(this.sheet.name)}!$${column}$${row}`
  }

  range(column: string, first: number, last: number): string {
    return `${this.at(column, first)}:$${column}$${last}`
  }
}

const writeWater = (blocks: Blocks): WaterCells => {
  const value = (label: string, number: number) => blocks.at('D', blocks.put(label, null, null, number))
  blocks.title('Water')
  blocks.source('IAPWS R7-97(2012): region 1, compressed liquid, taken at the saturation pressure of region 4')
  blocks.head(['Constant', '', '', 'Value'])
  const pressure = value('reducing pressure, MPa', if97Region1Reducing.pressure / 1e6)
  const temperature = value('reducing temperature, K', if97Region1Reducing.temperature)
  const gasConstant = value('gas constant, J/(kg·K)', if97Region1Reducing.gasConstant)
  const pi = value('base of the reduced pressure', if97Region1Reducing.pi)
  const tau = value('base of the inverse reduced temperature', if97Region1Reducing.tau)
  blocks.row += 1
  blocks.head(['Region 4, coefficient', '', '', 'n'])
  const saturation = if97Region4.map((n, index) => value(`n${index + 1}`, n))
  blocks.row += 1
  blocks.head(['Region 1, term', 'I', 'J', 'n'])
  const first = blocks.row
  if97Region1.forEach(([i, j, n], index) => blocks.put(String(index + 1), i, j, n))
  const last = blocks.row - 1
  return {
    i: blocks.range('B', first, last),
    j: blocks.range('C', first, last),
    n: blocks.range('D', first, last),
    saturation,
    pressure,
    temperature,
    gasConstant,
    pi,
    tau,
  }
}

const writeSteam = (blocks: Blocks): SteamCells => {
  const { criticalTemperature, criticalDensity, terms } = vapourDensity
  blocks.row += 1
  blocks.title('Saturated steam')
  blocks.source(
    'IAPWS SR1-86(1992), equation 3: density = critical density · exp(sum of n · (1 - T / critical)^(k / 6))',
  )
  blocks.head(['Constant', '', '', 'Value'])
  const temperature = blocks.at('D', blocks.put('critical temperature, K', null, null, criticalTemperature))
  const density = blocks.at('D', blocks.put('critical density, kg/m³', null, null, criticalDensity))
  blocks.row += 1
  blocks.head(['Term', '', 'k', 'n'])
  const first = blocks.row
  terms.forEach(([n, sixths], index) => blocks.put(String(index + 1), null, sixths, n))
  const last = blocks.row - 1
  return { n: blocks.range('D', first, last), sixths: blocks.range('C', first, last), temperature, density }
}

const writePolynomial = (blocks: Blocks, property: string, { base, terms }: PolynomialTable): PolynomialCells => {
  blocks.row += 1
  blocks.head([property, 'i', 'j', 'c'])
  const strength = blocks.at('D', blocks.put('base of the strength, % mass', null, null, base.strength))
  const temperature = blocks.at('D', blocks.put('base of the temperature, °C', null, null, base.temperature))
  const first = blocks.row
  terms.forEach(([i, j, c], index) => blocks.put(`term ${index + 1}`, i, j, c))
  const last = blocks.row - 1
  return {
    i: blocks.range('B', first, last),
    j: blocks.range('C', first, last),
    c: blocks.range('D', first, last),
    strength,
    temperature,
  }
}

/** The coefficients of the fluid equations, so that the workbook computes fluid properties by itself. */
export const writeFluidData = (
  workbook: Workbook,
  name: string,
  project: ProjectResult['project'],
  options: DocumentOptions,
  { bases, steam }: { readonly bases: readonly GlycolBase[]; readonly steam: boolean },
): FluidCells => {
  const sheet = addSheet(workbook, name, project, options, { orientation: 'portrait', widths: WIDTHS })
  const at = writeTitle(
    sheet,
    'Fluid data',
    'Coefficients of the equations for fluid properties. The calculation sheets sum over them.',
    options,
  )
  const blocks = new Blocks(sheet, at)
  const water = writeWater(blocks)
  const steamCells = steam ? writeSteam(blocks) : null
  const written = bases.map((base) => {
    blocks.row += 1
    blocks.title(`Aqueous ${base}`)
    blocks.source(
      'Melinder, Properties of Secondary Working Fluids, 2nd ed. 2010: sum of c · (strength - base)^i · (temperature - base)^j',
    )
    const density = writePolynomial(blocks, 'Density, kg/m³', glycols[base].density)
    const specificHeat = writePolynomial(blocks, 'Specific heat, J/(kg·K)', glycols[base].specificHeat)
    return [base, { density, specificHeat }] as const
  })
  sheet.pageSetup.printArea = `A1:D${blocks.row}`
  return { water, steam: steamCells, glycols: new Map(written) }
}

import {
  if97Region1Reducing,
  if97Region4,
  saturationPressure,
  type Fluid,
  type FluidFunctionName,
} from '@coldfill/engine'
import type { FluidCells, GlycolBase } from './fluid-data-sheet.ts'

/** One row of the fluid properties on a calculation sheet. The formula holds for the SI unit beside it. */
export interface FluidRow {
  readonly symbol: string
  readonly name: string
  readonly unit: string
  readonly formula: string
  /** Shown until a program recalculates. */
  readonly value: number
  readonly source: string
}

interface Draft extends Omit<FluidRow, 'formula'> {
  /** Formula over addresses of earlier rows of the same block. */
  readonly formula: (address: (symbol: string) => string) => string
}

const IF97 = 'IAPWS-IF97'
const ZERO = 273.15

const waterRows = (name: FluidFunctionName, kelvin: string, T: number, fluid: Fluid, cells: FluidCells): Draft[] => {
  const { water } = cells
  const n = (index: number) => water.saturation[index - 1] ?? ''
  const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = if97Region4
  const theta = T + n9 / (T - n10)
  const p = saturationPressure(T) / 1e6
  const tau = if97Region1Reducing.temperature / T
  const pi = p / (if97Region1Reducing.pressure / 1e6)
  const v = fluid.functions.v_sat.evaluate(T)
  const R = if97Region1Reducing.gasConstant
  const quadratic = (first: number | null, second: number, third: number) => (a: (symbol: string) => string) =>
    `${first === null ? '' : `${n(first)}*`}(${a('θ')}^2)+${n(second)}*${a('θ')}+${n(third)}`
  const rows: Draft[] = [
    { symbol: 'T', name: 'temperature', unit: 'K', value: T, source: 'definition', formula: () => kelvin },
    {
      symbol: 'θ',
      name: 'reduced temperature of the saturation line',
      unit: '',
      value: theta,
      source: `${IF97}, region 4`,
      formula: (a) => `${a('T')}+${n(9)}/(${a('T')}-${n(10)})`,
    },
    {
      symbol: 'A',
      name: 'coefficient A',
      unit: '',
      value: theta ** 2 + n1 * theta + n2,
      source: `${IF97}, region 4`,
      formula: quadratic(null, 1, 2),
    },
    {
      symbol: 'B',
      name: 'coefficient B',
      unit: '',
      value: n3 * theta ** 2 + n4 * theta + n5,
      source: `${IF97}, region 4`,
      formula: quadratic(3, 4, 5),
    },
    {
      symbol: 'C',
      name: 'coefficient C',
      unit: '',
      value: n6 * theta ** 2 + n7 * theta + n8,
      source: `${IF97}, region 4`,
      formula: quadratic(6, 7, 8),
    },
    {
      symbol: 'p_sat',
      name: 'saturation pressure',
      unit: 'MPa abs',
      value: p,
      source: `${IF97}, region 4`,
      formula: (a) => `((2*${a('C')}/(SQRT((${a('B')}^2)-4*${a('A')}*${a('C')})-${a('B')}))^4)`,
    },
    {
      symbol: 'π',
      name: 'reduced pressure',
      unit: '',
      value: pi,
      source: `${IF97}, region 1`,
      formula: (a) => `${a('p_sat')}/${water.pressure}`,
    },
    {
      symbol: 'τ',
      name: 'inverse reduced temperature',
      unit: '',
      value: tau,
      source: `${IF97}, region 1`,
      formula: (a) => `${water.temperature}/${a('T')}`,
    },
  ]
  const x = (a: (symbol: string) => string) => `(${water.pi}-${a('π')})`
  const y = (a: (symbol: string) => string) => `(${a('τ')}-${water.tau})`
  if (name === 'c_p') {
    const cp = fluid.functions.c_p.evaluate(T)
    return [
      ...rows,
      {
        symbol: 'γ_ττ',
        name: 'second derivative of the Gibbs energy by τ',
        unit: '',
        value: -cp / (R * tau ** 2),
        source: `${IF97}, region 1`,
        formula: (a) =>
          `SUMPRODUCT(${water.n}*${water.j}*(${water.j}-1)*(${x(a)}^${water.i})*(${y(a)}^(${water.j}-2)))`,
      },
      {
        symbol: 'c_p',
        name: 'specific heat',
        unit: 'J/(kg·K)',
        value: cp,
        source: `${IF97}, region 1`,
        formula: (a) => `(-${water.gasConstant})*(${a('τ')}^2)*${a('γ_ττ')}`,
      },
    ]
  }
  rows.push(
    {
      symbol: 'γ_π',
      name: 'derivative of the Gibbs energy by π',
      unit: '',
      value: (v * if97Region1Reducing.pressure) / (R * T),
      source: `${IF97}, region 1`,
      formula: (a) => `SUMPRODUCT((-${water.n})*${water.i}*(${x(a)}^(${water.i}-1))*(${y(a)}^${water.j}))`,
    },
    {
      symbol: 'v',
      name: 'specific volume of the saturated liquid',
      unit: 'm³/kg',
      value: v,
      source: `${IF97}, region 1`,
      formula: (a) => `${water.gasConstant}*${a('T')}*${a('γ_π')}/(${water.pressure}*1000000)`,
    },
  )
  return name === 'v_sat' ? rows : [...rows, densityFromVolume(fluid.functions.rho.evaluate(T))]
}

const densityFromVolume = (value: number): Draft => ({
  symbol: 'ρ',
  name: 'density',
  unit: 'kg/m³',
  value,
  source: 'definition',
  formula: (a) => `1/${a('v')}`,
})

const glycolRows = (name: FluidFunctionName, kelvin: string, T: number, fluid: Fluid, cells: FluidCells): Draft[] => {
  const data = cells.glycols.get(fluid.base as GlycolBase)
  if (!data) throw new Error(`no coefficients of ${fluid.base} in the workbook`)
  const { i, j, c, strength, temperature } = name === 'c_p' ? data.specificHeat : data.density
  const source = 'Melinder 2010'
  const percent = fluid.massFraction * 100
  // A power with base and exponent zero is an error in some programs; a base of 1E-300 gives 1 and 0 as it should.
  const notZero = (difference: string) => `IF(${difference}=0,1E-300,${difference})`
  const rows: Draft[] = [
    { symbol: 'T', name: 'temperature', unit: 'K', value: T, source: 'definition', formula: () => kelvin },
    {
      symbol: 'x',
      name: `strength of the ${fluid.base}`,
      unit: '% mass',
      value: percent,
      source: fluid.label,
      formula: () => String(percent),
    },
  ]
  const sum = (a: (symbol: string) => string) =>
    `SUMPRODUCT(${c}*(${notZero(`(${a('x')}-${strength})`)}^${i})*(${notZero(`(${a('T')}-${ZERO}-${temperature})`)}^${j}))`
  if (name === 'c_p') {
    return [
      ...rows,
      {
        symbol: 'c_p',
        name: 'specific heat',
        unit: 'J/(kg·K)',
        value: fluid.functions.c_p.evaluate(T),
        source,
        formula: sum,
      },
    ]
  }
  rows.push({
    symbol: 'ρ',
    name: 'density',
    unit: 'kg/m³',
    value: fluid.functions.rho.evaluate(T),
    source,
    formula: sum,
  })
  if (name === 'rho') return rows
  return [
    ...rows,
    {
      symbol: 'v',
      name: 'specific volume',
      unit: 'm³/kg',
      value: fluid.functions.v_sat.evaluate(T),
      source: 'definition',
      formula: (a) => `1/${a('ρ')}`,
    },
  ]
}

/**
 * The rows that compute one fluid property from a temperature, the last of them the property, all in SI units.
 * `kelvin` is the formula of the temperature in K and `T` its value; `addressOf` gives the cell of the row by its number.
 */
export const fluidRows = (
  name: FluidFunctionName,
  kelvin: string,
  T: number,
  fluid: Fluid,
  cells: FluidCells,
  addressOf: (index: number) => string,
): FluidRow[] => {
  const drafts = (fluid.massFraction === 0 ? waterRows : glycolRows)(name, kelvin, T, fluid, cells)
  const address = (symbol: string): string => addressOf(drafts.findIndex((draft) => draft.symbol === symbol))
  return drafts.map((draft) => ({ ...draft, formula: draft.formula(address) }))
}

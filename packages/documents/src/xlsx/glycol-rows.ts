import type { Fluid } from '@coldfill/engine'
import type { FluidCells, GlycolBase, PolynomialCells } from './fluid-data-sheet.ts'
import type { PropertyRow } from './property-row.ts'

const ZERO = 273.15
const SOURCE = 'Melinder 2010'

/** A power with base and exponent zero is an error in some programs; a base of 1E-300 gives 1 and 0 as it should. */
const notZero = (difference: string): string => `IF(${difference}=0,1E-300,${difference})`

/** A glycol mixture by the temperature `T`: polynomials in strength and temperature. */
export const glycolRows = (fluid: Fluid, cells: FluidCells): readonly PropertyRow[] => {
  const data = cells.glycols.get(fluid.base as GlycolBase)
  if (!data) throw new Error(`no coefficients of ${fluid.base} in the workbook`)
  const percent = fluid.massFraction * 100
  const sum =
    ({ i, j, c, strength, temperature }: PolynomialCells) =>
    (at: (symbol: string) => string) =>
      `SUMPRODUCT(${c}*(${notZero(`(${at('x')}-${strength})`)}^${i})*(${notZero(`(${at('T')}-${ZERO}-${temperature})`)}^${j}))`
  return [
    {
      symbol: 'x',
      name: `strength of the ${fluid.base}`,
      unit: '% mass',
      source: fluid.label,
      formula: () => String(percent),
      value: () => percent,
    },
    {
      symbol: 'ρ',
      name: 'density',
      unit: 'kg/m³',
      source: SOURCE,
      formula: sum(data.density),
      value: (of) => fluid.functions.rho.evaluate(of('T')),
    },
    {
      symbol: 'v',
      name: 'specific volume',
      unit: 'm³/kg',
      source: 'definition',
      formula: (at) => `1/${at('ρ')}`,
      value: (of) => fluid.functions.v_sat.evaluate(of('T')),
    },
    {
      symbol: 'c_p',
      name: 'specific heat',
      unit: 'J/(kg·K)',
      source: SOURCE,
      formula: sum(data.specificHeat),
      value: (of) => fluid.functions.c_p.evaluate(of('T')),
    },
  ]
}

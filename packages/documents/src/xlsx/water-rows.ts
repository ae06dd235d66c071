import {
  if97Region1Reducing as reducing,
  if97Region4,
  saturationPressure,
  specificVolume,
  water as waterFluid,
} from '@coldfill/engine'
import type { WaterCells } from './fluid-data-sheet.ts'
import type { PropertyRow } from './property-row.ts'

const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = if97Region4
const REGION_1 = 'IAPWS-IF97, region 1'
const REGION_4 = 'IAPWS-IF97, region 4'
const MEGA = 1e6

/** Saturated liquid water by the temperature `T`: regions 4 and 1 of IAPWS-IF97, each term of its equations a row. */
export const waterRows = (water: WaterCells): readonly PropertyRow[] => {
  const n = (index: number) => water.saturation[index - 1] ?? ''
  const row = (
    symbol: string,
    name: string,
    unit: string,
    source: string,
    formula: PropertyRow['formula'],
    value: PropertyRow['value'],
  ): PropertyRow => ({ symbol, name, unit, source, formula, value })
  type At = (symbol: string) => string
  const x = (at: At) => `(${water.pi}-${at('π')})`
  const y = (at: At) => `(${at('τ')}-${water.tau})`
  const volume = (T: number) => specificVolume(T, saturationPressure(T))
  const specificHeat = (T: number) => waterFluid.functions.c_p.evaluate(T)

  return [
    row(
      'θ',
      'reduced temperature of the saturation line',
      '',
      REGION_4,
      (at) => `${at('T')}+${n(9)}/(${at('T')}-${n(10)})`,
      (of) => of('T') + n9 / (of('T') - n10),
    ),
    row(
      'A',
      'coefficient A',
      '',
      REGION_4,
      (at) => `(${at('θ')}^2)+${n(1)}*${at('θ')}+${n(2)}`,
      (of) => of('θ') ** 2 + n1 * of('θ') + n2,
    ),
    row(
      'B',
      'coefficient B',
      '',
      REGION_4,
      (at) => `${n(3)}*(${at('θ')}^2)+${n(4)}*${at('θ')}+${n(5)}`,
      (of) => n3 * of('θ') ** 2 + n4 * of('θ') + n5,
    ),
    row(
      'C',
      'coefficient C',
      '',
      REGION_4,
      (at) => `${n(6)}*(${at('θ')}^2)+${n(7)}*${at('θ')}+${n(8)}`,
      (of) => n6 * of('θ') ** 2 + n7 * of('θ') + n8,
    ),
    row(
      'p_sat',
      'saturation pressure',
      'MPa abs',
      REGION_4,
      (at) => `((2*${at('C')}/(SQRT((${at('B')}^2)-4*${at('A')}*${at('C')})-${at('B')}))^4)`,
      (of) => saturationPressure(of('T')) / MEGA,
    ),
    row(
      'π',
      'reduced pressure',
      '',
      REGION_1,
      (at) => `${at('p_sat')}/${water.pressure}`,
      (of) => of('p_sat') / (reducing.pressure / MEGA),
    ),
    row(
      'τ',
      'inverse reduced temperature',
      '',
      REGION_1,
      (at) => `${water.temperature}/${at('T')}`,
      (of) => reducing.temperature / of('T'),
    ),
    row(
      'γ_ττ',
      'second derivative of the Gibbs energy by τ',
      '',
      REGION_1,
      (at) => `SUMPRODUCT(${water.n}*${water.j}*(${water.j}-1)*(${x(at)}^${water.i})*(${y(at)}^(${water.j}-2)))`,
      (of) => -specificHeat(of('T')) / (reducing.gasConstant * of('τ') ** 2),
    ),
    row(
      'c_p',
      'specific heat',
      'J/(kg·K)',
      REGION_1,
      (at) => `(-${water.gasConstant})*(${at('τ')}^2)*${at('γ_ττ')}`,
      (of) => specificHeat(of('T')),
    ),
    row(
      'γ_π',
      'derivative of the Gibbs energy by π',
      '',
      REGION_1,
      (at) => `SUMPRODUCT((-${water.n})*${water.i}*(${x(at)}^(${water.i}-1))*(${y(at)}^${water.j}))`,
      (of) => (volume(of('T')) * reducing.pressure) / (reducing.gasConstant * of('T')),
    ),
    row(
      'v',
      'specific volume of the saturated liquid',
      'm³/kg',
      REGION_1,
      (at) => `${water.gasConstant}*${at('T')}*${at('γ_π')}/(${water.pressure}*1000000)`,
      (of) => volume(of('T')),
    ),
    row(
      'ρ',
      'density of the saturated liquid',
      'kg/m³',
      'definition',
      (at) => `1/${at('v')}`,
      (of) => 1 / of('v'),
    ),
  ]
}

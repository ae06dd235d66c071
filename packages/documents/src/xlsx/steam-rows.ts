import {
  if97Region1Reducing as reducing,
  if97Region4,
  saturationSlope,
  saturationTemperature,
  steamFunctions,
  vapourDensity,
} from '@coldfill/engine'
import type { SteamCells, WaterCells } from './fluid-data-sheet.ts'
import type { PropertyRow } from './property-row.ts'
import { waterRows } from './water-rows.ts'

const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = if97Region4
const REGION_1 = 'IAPWS-IF97, region 1'
const REGION_4 = 'IAPWS-IF97, region 4'
const VAPOUR = 'IAPWS SR1-86(1992), equation 3'
const MEGA = 1e6

const saturation =
  (water: WaterCells) =>
  (index: number): string =>
    water.saturation[index - 1] ?? ''

/** Saturated water and steam by the temperature `T`: the rows of the liquid and what steam asks for beside them. */
export const steamRows = (water: WaterCells, steam: SteamCells): readonly PropertyRow[] => {
  const n = saturation(water)
  const shape = (T: number) => 1 - n9 / (T - n10) ** 2
  return [
    ...waterRows(water),
    {
      symbol: 'γ_τ',
      name: 'derivative of the Gibbs energy by τ',
      unit: '',
      source: REGION_1,
      formula: (at) =>
        `SUMPRODUCT(${water.n}*${water.j}*((${water.pi}-${at('π')})^${water.i})*((${at('τ')}-${water.tau})^(${water.j}-1)))`,
      value: (of) => steamFunctions.h_f.evaluate(of('T')) / (reducing.gasConstant * reducing.temperature),
    },
    {
      symbol: 'h_f',
      name: 'enthalpy of the saturated liquid',
      unit: 'J/kg',
      source: REGION_1,
      formula: (at) => `${water.gasConstant}*${water.temperature}*${at('γ_τ')}`,
      value: (of) => steamFunctions.h_f.evaluate(of('T')),
    },
    {
      symbol: 'ϑ',
      name: 'distance from the critical temperature, part of it',
      unit: '',
      source: VAPOUR,
      formula: (at) => `1-${at('T')}/${steam.temperature}`,
      value: (of) => 1 - of('T') / vapourDensity.criticalTemperature,
    },
    {
      symbol: 'v_g',
      name: 'specific volume of the saturated steam',
      unit: 'm³/kg',
      source: VAPOUR,
      formula: (at) => `EXP(-SUMPRODUCT(${steam.n}*(${at('ϑ')}^(${steam.sixths}/6))))/${steam.density}`,
      value: (of) => steamFunctions.v_g.evaluate(of('T')),
    },
    {
      symbol: 'β',
      name: 'fourth root of the saturation pressure',
      unit: '',
      source: REGION_4,
      formula: (at) => `(${at('p_sat')}^0.25)`,
      value: (of) => of('p_sat') ** 0.25,
    },
    {
      symbol: 'β′',
      name: 'its slope by θ',
      unit: '',
      source: REGION_4,
      formula: (at) =>
        `(-((${at('β')}^2)*(2*${at('θ')}+${n(1)})+${at('β')}*(2*${n(3)}*${at('θ')}+${n(4)})+2*${n(6)}*${at('θ')}+${n(7)}))/(2*${at('β')}*${at('A')}+${at('B')})`,
      value: (of) => saturationSlope(of('T')) / (MEGA * 4 * of('β') ** 3 * shape(of('T'))),
    },
    {
      symbol: 'p′',
      name: 'slope of the saturation pressure',
      unit: 'MPa/K',
      source: REGION_4,
      formula: (at) => `4*(${at('β')}^3)*${at('β′')}*(1-${n(9)}/((${at('T')}-${n(10)})^2))`,
      value: (of) => saturationSlope(of('T')) / MEGA,
    },
    {
      symbol: 'h_fg',
      name: 'enthalpy of evaporation',
      unit: 'J/kg',
      source: 'Clausius and Clapeyron',
      formula: (at) => `${at('T')}*(${at('v_g')}-${at('v')})*${at('p′')}*1000000`,
      value: (of) => steamFunctions.h_fg.evaluate(of('T')),
    },
  ]
}

/** The saturation temperature by the absolute pressure `P` in MPa: region 4 turned round. */
export const saturationRows = (water: WaterCells): readonly PropertyRow[] => {
  const n = saturation(water)
  const coefficient = (
    symbol: string,
    [a, b, c]: readonly [number | null, number, number],
    numbers: readonly [number, number, number],
  ): PropertyRow => ({
    symbol,
    name: `coefficient ${symbol}`,
    unit: '',
    source: REGION_4,
    formula: (at) => `${a === null ? '' : `${n(a)}*`}(${at('β')}^2)+${n(b)}*${at('β')}+${n(c)}`,
    value: (of) => numbers[0] * of('β') ** 2 + numbers[1] * of('β') + numbers[2],
  })
  return [
    {
      symbol: 'β',
      name: 'fourth root of the pressure',
      unit: '',
      source: REGION_4,
      formula: (at) => `(${at('P')}^0.25)`,
      value: (of) => of('P') ** 0.25,
    },
    coefficient('E', [null, 3, 6], [1, n3, n6]),
    coefficient('F', [1, 4, 7], [n1, n4, n7]),
    coefficient('G', [2, 5, 8], [n2, n5, n8]),
    {
      symbol: 'D',
      name: 'coefficient D',
      unit: '',
      source: REGION_4,
      formula: (at) => `2*${at('G')}/(-${at('F')}-SQRT((${at('F')}^2)-4*${at('E')}*${at('G')}))`,
      value: (of) => (2 * of('G')) / (-of('F') - Math.sqrt(of('F') ** 2 - 4 * of('E') * of('G'))),
    },
    {
      symbol: 'T_sat',
      name: 'saturation temperature',
      unit: 'K',
      source: REGION_4,
      formula: (at) => `(${n(10)}+${at('D')}-SQRT(((${n(10)}+${at('D')})^2)-4*(${n(9)}+${n(10)}*${at('D')})))/2`,
      value: (of) => saturationTemperature(of('P') * MEGA),
    },
  ]
}

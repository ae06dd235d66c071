import { Calculation } from '../../calculation.ts'
import { water } from '../../fluids/index.ts'
import { closedPressures } from '../../sections/closed-pressures.ts'
import { methods } from '../../methods/index.ts'
import { byFigures, byMethod, figure, type VerificationCase } from '../case.ts'

const handbook =
  'ASHRAE Handbook, HVAC Systems and Equipment, hydronic heating and cooling (2000 ch. 12 to 2020 ch. 13), equations (12) to (14)'
const handbookGiven = {
  V_s: '3000 gal',
  t_l: '40 °F',
  t_h: '220 °F',
  alpha: '6.5e-6 1/°F',
  P_a: '14.7 psia',
  p_f: '10 psig',
  p_max: '25 psig',
}
const printedVolumes = { v_l: '0.01602 ft3/lb', v_h: '0.01677 ft3/lb' }
const { P_a: _atmosphere, p_f: _fill, p_max: _maximum, ...openGiven } = handbookGiven

const michigan = 'Michigan Administrative Code R 408.4272, table 272B (as IMC table 1009.2, UMC table 1004.4(2))'
const umc = 'Uniform Mechanical Code 2015 to 2024, table 1004.4(2), pressurised diaphragm type'
const codeGiven = { t_a: '195 °F', P_a: '14.7 psia', p_f: '12 psig', p_max: '30 psig' }

const codeRow = (id: string, volume: number, tank: number): VerificationCase =>
  byMethod(
    {
      id,
      source: michigan,
      title: `Capacity of a plain steel tank, ${volume} gal`,
      origin: 'published',
      tolerance: 0.005,
      because: 'Whole gallons; the equation gives 0.28 % more on every row.',
    },
    'expansion-tank.code-minimum.plain-steel',
    { V_s: `${volume} gal`, ...codeGiven },
    { V_t: `${tank} gal` },
  )

const codeColumn = (id: string, volume: number, tank: number): VerificationCase =>
  byMethod(
    {
      id,
      source: umc,
      title: `Capacity of a diaphragm tank, ${volume} gal`,
      origin: 'from memory',
      tolerance: Math.max(0.02, 0.75 / tank),
      because: 'Whole gallons, rounded: three quarters of a gallon or 2 %.',
    },
    'expansion-tank.code-minimum.diaphragm',
    { V_s: `${volume} gal`, ...codeGiven },
    { V_t: `${tank} gal` },
  )

const codeJob = (id: string, given: Readonly<Record<string, string>>, tank: string): VerificationCase =>
  byMethod(
    {
      id,
      source: '13 NCAC 13 .0412(d), IMC 1009.2, UMC 1004.4: code equation',
      title: `Plain steel tank for ${given['V_s']} at ${given['t_a']}`,
      origin: 'derived',
      tolerance: 0.003,
      because: 'Six printed digits; 14.7 or 14.696 psia.',
    },
    'expansion-tank.code-minimum.plain-steel',
    { P_a: '14.7 psia', ...given },
    { V_t: tank },
  )

/** Expansion by the code equation at a temperature in K, as the method has it. */
const codeNumerator = (T: number): number => {
  const method = methods['expansion-tank.code-minimum.plain-steel']
  const step = method?.steps['E_c']
  if (!method || !step) throw new Error('the code equation is gone')
  const calculation = new Calculation('zero', water.functions)
  calculation.section('zero')
  calculation.input('t_a', 'temperature', 'average', { value: T, origin: { from: 'spec', path: '' } })
  calculation.run({ ...method, inputs: {}, steps: { E_c: step }, checks: [], validity: [] }, {})
  return calculation.value('E_c')
}

const column = (height: number, pump: number): Calculation => {
  const from = { from: 'spec', path: '' } as const
  const value = (number: number) => ({ value: number, origin: from })
  const section = closedPressures(
    {
      staticHeight: value(height),
      topMargin: value(0),
      fillTemperature: value((60 - 32) / 1.8 + 273.15),
      maximum: value(2e6),
      pumpHead: { as: 'length', given: value(pump) },
    },
    'handbook',
  )
  const calculation = new Calculation('column', water.functions)
  calculation.section('Pressures')
  calculation.run(section.method, section.given)
  return calculation
}

const PSI = 6894.757293168361
const FOOT = 0.3048

/** Closed and open vessels by the handbook and by the equation of the American codes, with the pressures they lean on. */
export const hydronicCases: readonly VerificationCase[] = [
  byMethod(
    {
      id: 'H01',
      source: handbook,
      title: 'Plain steel tank, 3,000 gal, 40 to 220 °F, 10 and 25 psig',
      origin: 'from memory',
      tolerance: 0.003,
      because: 'Whole gallons, with specific volumes of five decimals.',
    },
    'expansion-tank.ashrae.plain-steel',
    { ...handbookGiven, ...printedVolumes },
    { V_t: '578 gal' },
  ),
  byMethod(
    {
      id: 'H02',
      source: handbook,
      title: 'Diaphragm tank, the same system',
      origin: 'from memory',
      tolerance: 0.003,
      because: 'Whole gallons, with specific volumes of five decimals.',
    },
    'expansion-tank.ashrae.diaphragm',
    { ...handbookGiven, ...printedVolumes },
    { V_t: '344 gal' },
  ),
  byMethod(
    {
      id: 'H03',
      source: handbook,
      title: 'Open tank, the same system',
      origin: 'derived',
      tolerance: 0.003,
      because: 'Six printed digits.',
    },
    'expansion-tank.ashrae.open',
    { ...openGiven, ...printedVolumes },
    { V_t: '259.839 gal' },
  ),
  byMethod(
    {
      id: 'H04',
      source: handbook,
      title: 'Plain steel tank with the volumes of IAPWS-IF97',
      origin: 'derived',
      tolerance: 0.001,
      because: 'Six printed digits.',
    },
    'expansion-tank.ashrae.plain-steel',
    handbookGiven,
    { V_t: '579.029 gal' },
  ),
  byMethod(
    {
      id: 'H04_diaphragm',
      source: handbook,
      title: 'Diaphragm tank with the volumes of IAPWS-IF97',
      origin: 'derived',
      tolerance: 0.001,
      because: 'Six printed digits.',
    },
    'expansion-tank.ashrae.diaphragm',
    handbookGiven,
    { V_t: '344.604 gal', e_n: '0.043401' },
  ),
  codeRow('H10', 100, 15),
  codeRow('H11', 200, 30),
  codeRow('H12', 300, 45),
  codeRow('H13', 400, 60),
  codeRow('H15', 1000, 150),
  codeColumn('H20', 100, 9),
  codeColumn('H21', 200, 17),
  codeColumn('H22', 300, 25),
  codeColumn('H24', 500, 42),
  codeColumn('H26', 2000, 165),
  byFigures(
    {
      id: 'H28',
      source: '13 NCAC 13 .0412(d), ASME IV HG-709: code equation',
      title: 'Temperature at which the code equation gives nothing',
      origin: 'derived',
      tolerance: 0.001,
      because: 'Six printed digits.',
    },
    figure('temperature of no expansion', 'temperature', '113.659 °F', () => {
      const [a, b] = [300, 400]
      const [low, high] = [codeNumerator(a), codeNumerator(b)]
      return a - (low * (b - a)) / (high - low)
    }),
  ),
  byMethod(
    {
      id: 'H40',
      source: 'ASHRAE Fundamentals 2017, ch. 1 equation (3), with the tank equations',
      title: 'Atmospheric pressure at 5,280 ft',
      origin: 'derived',
      tolerance: 0.0005,
      because: 'Six printed digits.',
    },
    'section.site',
    { Z: '5280 ft' },
    { P_a: '12.1002 psia' },
  ),
  byMethod(
    {
      id: 'H40_plain',
      source: 'ASHRAE Fundamentals 2017, ch. 1 equation (3), with the tank equations',
      title: 'Plain steel tank of the handbook example at 5,280 ft',
      origin: 'derived',
      tolerance: 0.005,
      because: 'Six printed digits.',
    },
    'expansion-tank.ashrae.plain-steel',
    { ...handbookGiven, P_a: '12.1002 psia', e_n: '0.04330647940074907' },
    { V_t: '586.898 gal' },
  ),
  byMethod(
    {
      id: 'H40_diaphragm',
      source: 'ASHRAE Fundamentals 2017, ch. 1 equation (3), with the tank equations',
      title: 'Diaphragm tank of the handbook example at 5,280 ft',
      origin: 'derived',
      tolerance: 0.005,
      because: 'Six printed digits.',
    },
    'expansion-tank.ashrae.diaphragm',
    { ...handbookGiven, P_a: '12.1002 psia', e_n: '0.04330647940074907' },
    { V_t: '321.336 gal' },
  ),
  byFigures(
    {
      id: 'H41',
      source: 'ASHRAE Handbook, HVAC Systems and Equipment: pump and expansion tank location',
      title: 'Vessel at the pump discharge, head of 46.2 ft: the suction falls by the pump pressure',
      origin: 'derived',
      tolerance: 0.01,
      because: 'Water at 60 °F, 2.31 ft for one psi.',
    },
    figure('pump pressure', 'pressure difference', '20.0 psi', () => column(0, 46.2 * FOOT).value('dp_p')),
    figure(
      'suction with 15 psig fill',
      'gauge pressure',
      '-5.0 psig',
      () => 15 * PSI - column(0, 46.2 * FOOT).value('dp_p'),
    ),
  ),
  byFigures(
    {
      id: 'K01',
      source: 'Hydronics trade article on pump location (2024)',
      title: 'Column of 28 in of water',
      origin: 'published',
      tolerance: 0.02,
      because: 'A rounded rule of the trade; 2.31 ft for one psi at 60 °F.',
    },
    figure('pressure', 'pressure difference', '1.0 psi', () => column((28 / 12) * FOOT, 0).value('p_st')),
  ),
  byMethod(
    {
      id: 'K03',
      source: 'ASHRAE Fundamentals 2017, ch. 1 equation (3)',
      title: 'Atmospheric pressure at 6,000 ft',
      origin: 'published',
      tolerance: 0.0043,
      because: 'Printed with one decimal: half a unit is 0.05 in 11.8.',
    },
    'section.site',
    { Z: '6000 ft' },
    { P_a: '11.8 psia' },
  ),
  codeJob('H50', { V_s: '850 gal', t_a: '190 °F', p_f: '20 psig', p_max: '30 psig' }, '280.726 gal'),
  codeJob('H52', { V_s: '400 gal', t_a: '170 °F', p_f: '12 psig', p_max: '30 psig' }, '41.6774 gal'),
]

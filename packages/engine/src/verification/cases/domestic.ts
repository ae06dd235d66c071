import { water } from '../../fluids/index.ts'
import { methods } from '../../methods/index.ts'
import { runExample } from '../../run-example.ts'
import { demandFactor } from '../../tables/ashrae-service-water.fixture-demand.ts'
import { byFigures, byMethod, figure, type VerificationCase } from '../case.ts'

const aspe = 'ASPE Plumbing Engineering Design Handbook, volume 4 (2008 to 2016), expansion tanks'
const heater = { P_a: '14.7 psia', V_s: '1000 gal', t_c: '40 °F', t_h: '140 °F', p_1: '50 psig', p_2: '110 psig' }
const din = 'DIN 4807-5:1997, 6.2 and 6.3'
const upc = 'Uniform Plumbing Code 2024, 608.2 and 608.3'

const storage = 'ASHRAE Handbook, HVAC Applications, service water heating'
const county = 'County plan-check guide (California, 2014 to 2017), appendix E, hot-water demand'
const heated = { f_d: '1', f_s: '1' }
const atOnce = { rho_m: '62.3127 lb/ft3', c_m: '1 Btu/(lb·°F)' }

const curve = (
  id: string,
  title: string,
  origin: 'published' | 'from memory',
  [units, recovery, stored]: readonly [string, string, string],
  [rate, tank]: readonly [string, string],
  tolerance: number,
  because: string,
): VerificationCase =>
  byMethod(
    { id, source: `${storage}, recovery and storage curves`, title, origin, tolerance, because },
    'storage-tank.recovery-and-storage',
    { n_u: units, r_u: recovery, s_u: stored, f_u: '0.7', t_c: '40 °F', t_s: '140 °F' },
    { q_r: rate, V_t: tank },
  )

/** Heat in W that water takes at a rate in gal/h with a rise of 60 °F, as the storage methods have it, with 8.33 lb/gal. */
const heatOf = (gallons: number): number => {
  const method = methods['storage-tank.ashrae-fixture']
  if (!method) throw new Error('the fixture method is gone')
  const given = { q_f: `${gallons} gph`, ...heated, ...atOnce, t_c: '60 °F', t_s: '120 °F' }
  const source = { source: '', locator: '' }
  const head = { id: 'heat', title: '', origin: 'by hand', source, tolerance: 0, because: '' } as const
  const [row] = runExample(method, { ...head, given, expected: { Q_h: '1 W' } }, water.functions)
  return row?.computed ?? Number.NaN
}

const gas = (id: string, gallons: number, printed: string): VerificationCase =>
  byFigures(
    {
      id,
      source: county,
      title: `Gas input of ${gallons} gph with a rise of 60 °F, three quarters of it to the water`,
      origin: 'published',
      tolerance: 0.011,
      because: 'The guide rounds 8.33/0.75 = 11.107 down to 11, by 1 %.',
    },
    figure('gas input', 'power', printed, () => heatOf(gallons) / 0.75),
  )

const warmed = (
  id: string,
  source: string,
  title: string,
  [volume, low, high]: readonly [string, string, string],
  power: string,
  tolerance: number,
): VerificationCase =>
  byMethod(
    { id, source, title, origin: 'published', tolerance, because: 'Three or four printed digits; 1.163 Wh/(kg·K).' },
    'storage-tank.ashrae-fixture',
    { q_f: volume, ...heated, t_c: low, t_s: high, rho_m: '1000 kg/m3', c_m: '4.1868 kJ/(kg·K)' },
    { Q_h: power },
  )

/** Thermal expansion of domestic hot water, its storage and its heat. */
export const domesticCases: readonly VerificationCase[] = [
  byMethod(
    {
      id: 'P01',
      source: aspe,
      title: 'Expansion of 1,000 gal from 40 to 140 °F',
      origin: 'from memory',
      tolerance: 0.005,
      because: 'One printed decimal; full volumes give 17.0.',
    },
    'thermal-expansion-tank.aspe',
    { ...heater, v_c: '0.01602 ft3/lb', v_h: '0.01629 ft3/lb' },
    { V_w: '16.9 gal' },
  ),
  byMethod(
    {
      id: 'P02',
      source: aspe,
      title: 'The same less the growth of a 900 gal steel heater and 100 gal of copper piping',
      origin: 'from memory',
      tolerance: 0.06,
      because: 'Growths of one decimal, taken off rounded.',
    },
    'thermal-expansion-tank.aspe.materials',
    {
      ...heater,
      V_st: '900 gal',
      V_cu: '100 gal',
      alpha_st: '6.5e-6 1/°F',
      alpha_cu: '9.5e-6 1/°F',
      V_w: '16.9 gal',
    },
    { G_st: '1.8 gal', G_cu: '0.3 gal', V_e: '14.8 gal' },
  ),
  byMethod(
    {
      id: 'P03',
      source: aspe,
      title: 'Tank for 14.8 gal, 50 to 110 psig',
      origin: 'from memory',
      tolerance: 0.005,
      because: 'One printed decimal.',
    },
    'thermal-expansion-tank.aspe',
    { ...heater, V_e: '14.8 gal' },
    { V_t: '30.8 gal' },
  ),
  byMethod(
    {
      id: 'P06',
      source: din,
      title: '200 L, 4 bar incoming, valve 10 bar',
      origin: 'derived',
      tolerance: 0.01,
      because: 'Six printed digits; the formula is from memory.',
    },
    'thermal-expansion-tank.din-4807-5',
    { V_s: '200 L', t_h: '60 °C', p_1: '4 bar g', p_rv: '10 bar g' },
    { p_e: '8.0 bar g', p_0: '3.8 bar g', V_t: '9.31995 L' },
  ),
  byMethod(
    {
      id: 'P07',
      source: din,
      title: '500 L, 3 bar incoming, valve 6 bar',
      origin: 'derived',
      tolerance: 0.01,
      because: 'Six printed digits; the formula is from memory.',
    },
    'thermal-expansion-tank.din-4807-5',
    { V_s: '500 L', t_h: '60 °C', p_1: '3 bar g', p_rv: '6 bar g' },
    { p_e: '4.8 bar g', p_0: '2.8 bar g', V_t: '44.4667 L' },
  ),
  byMethod(
    {
      id: 'P08',
      source: upc,
      title: '119 gal heater from 50 to 140 °F, 60 psig incoming, 80 psig limit',
      origin: 'derived',
      tolerance: 0.01,
      because: 'Four printed digits.',
    },
    'thermal-expansion-tank.aspe',
    { P_a: '14.696 psia', V_s: '119 gal', t_c: '50 °F', t_h: '140 °F', p_1: '60 psig', p_2: '80 psig' },
    { V_w: '1.99451 gal', V_t: '9.444 gal' },
  ),
  byMethod(
    {
      id: 'D01',
      source: `${storage}, fixture method, example`,
      title: 'Apartment building, 2,520 gph of fixtures',
      origin: 'from memory',
      tolerance: 0.002,
      because: 'Whole gallons.',
    },
    'storage-tank.ashrae-fixture',
    { q_f: '2520 gph', f_d: '0.30', f_s: '1.25', t_c: '40 °F', t_s: '140 °F' },
    { q_r: '756 gph', V_t: '945 gal' },
  ),
  curve(
    'D02',
    'Dormitory of 300 students',
    'published',
    ['300', '1.1 gph', '12 gal'],
    ['330 gph', '5150 gal'],
    0.003,
    'The handbook rounds 5,143 gal.',
  ),
  byFigures(
    {
      id: 'D06_ymca',
      source: 'Reprint of the fixture chart of ASHRAE',
      title: 'Demand factor of a hostel with gymnasium',
      origin: 'published',
      tolerance: 0.01,
      because: 'Two printed digits.',
      knownWrong: 'The decimal point slipped: 0.40.',
    },
    figure('demand factor', 'ratio', '0.040', () => demandFactor['hostel with gymnasium']),
  ),
  byMethod(
    {
      id: 'D07',
      source: 'ASPE Plumbing Engineering Design Handbook, volume 2 (2014), ch. 6, method 1',
      title: '16 apartments, 1,104 gph of fixtures, 70 % usable',
      origin: 'published',
      tolerance: 0.003,
      because: 'Whole gallons.',
    },
    'storage-tank.aspe-fixture',
    { q_f: '1104 gph', f_d: '0.30', f_s: '1.25', f_u: '0.70', t_c: '40 °F', t_s: '140 °F' },
    { q_r: '331 gph', V_u: '414 gal', V_t: '591 gal' },
  ),
  curve(
    'D09',
    'Office of 300 people',
    'from memory',
    ['300', '0.1 gph', '1.6 gal'],
    ['30 gph', '690 gal'],
    0.01,
    'The handbook rounds 686 gal.',
  ),
  curve(
    'D11',
    'Building of 200 apartments',
    'from memory',
    ['200', '2.1 gph', '24 gal'],
    ['420 gph', '6900 gal'],
    0.025,
    'The handbook rounds 6,857 gal.',
  ),
  gas('D15', 95, '62700 Btu/h'),
  gas('D16', 160, '105600 Btu/h'),
  gas('D17', 64, '42240 Btu/h'),
  gas('D18', 72, '47520 Btu/h'),
  byFigures(
    {
      id: 'D19',
      source: county,
      title: 'Electric input of 95 gph with a rise of 60 °F, 98 % of it to the water',
      origin: 'published',
      tolerance: 0.03,
      because: 'Three printed digits.',
      knownWrong: 'The formula that the guide states gives 14.2 kW; the printed figure fits a rise of 70 °F.',
    },
    figure('electric input', 'power', '16.5 kW', () => heatOf(95) / 0.98),
  ),
  warmed(
    'D20',
    'Trade journal article on DIN 4708',
    '80 L an hour from 10 to 45 °C',
    ['80 L/h', '10 °C', '45 °C'],
    '3256 W',
    0.001,
  ),
  warmed(
    'D21',
    'DIN 4708-1 and -2:1994, bath of the standard dwelling',
    '100 L an hour by 50 K',
    ['100 L/h', '10 °C', '60 °C'],
    '5820 W',
    0.002,
  ),
  warmed(
    'D22',
    'Trade encyclopedia article',
    '160 L an hour from 10 to 45 °C',
    ['160 L/h', '10 °C', '45 °C'],
    '6.51 kW',
    0.002,
  ),
  byMethod(
    {
      id: 'D23',
      source: 'DIN 4708-2:1994, section 4',
      title: 'Demand index of ten standard dwellings',
      origin: 'derived',
      tolerance: 0.001,
      because: 'The standard dwelling is the unit of the index.',
    },
    'storage-tank.din-4708.dwellings',
    { n_d: '10', p_d: '3.5', w_d: '5820 Wh' },
    { N: '10.0' },
  ),
  byMethod(
    {
      id: 'D26',
      source: `${storage}, demands by type of building`,
      title: '100 apartments',
      origin: 'derived',
      tolerance: 0.001,
      because: 'Look-up in the table.',
    },
    'storage-tank.per-apartment',
    { n_a: '100', V_h: '7 gal', V_d: '60 gal', V_m: '37 gal', f_s: '1.25', t_c: '40 °F', t_s: '140 °F' },
    { q_r: '700 gph', V_day: '6000 gal', V_mean: '3700 gal' },
  ),
  {
    by: 'words',
    id: 'aspe-method-2',
    source: 'ASPE Plumbing Engineering Design Handbook, volume 2, ch. 6, method 2',
    title: 'Draw of a person in half an hour',
    origin: 'published',
    tolerance: 0,
    because: '',
    knownWrong: 'The volume drawn in half an hour is called gallons per hour.',
  },
]

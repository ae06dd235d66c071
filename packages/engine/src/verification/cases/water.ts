import { fluid, water } from '../../fluids/index.ts'
import { byFigures, byMethod, figure, type VerificationCase } from '../case.ts'

const fahrenheit = (t: number): number => (t - 32) / 1.8 + 273.15
const celsius = (t: number): number => t + 273.15
const v = (T: number): number => water.functions.v_sat.evaluate(T)
const growth = (low: number, high: number): number => v(high) / v(low) - 1
const net = (low: number, high: number): number => growth(low, high) - 3 * 11.7e-6 * (high - low)

const netTable = 'Net expansion of water in steel from 40 °F, widely reproduced US trade table, table 1'
const netRow = (t: number, printed: string, knownWrong?: string): VerificationCase =>
  byFigures(
    {
      id: `H33_${t}`,
      source: netTable,
      title: `Net expansion of water in steel, 40 to ${t} °F`,
      origin: 'published',
      tolerance: 0.03,
      because: 'Two or three printed digits; the base of the table is not stated.',
      ...(knownWrong === undefined ? {} : { knownWrong }),
    },
    figure('net expansion', 'ratio', printed, () => net(fahrenheit(40), fahrenheit(t))),
  )

const codeFraction = (t: number, printed: string): VerificationCase =>
  byMethod(
    {
      id: `H29_${t}`,
      source: 'IMC 1009.2, UMC 1004.4, ASME IV HG-709: numerator of the code equation',
      title: `Expansion by the code equation at ${t} °F`,
      origin: 'derived',
      tolerance: 0.01,
      because: 'Three printed digits.',
    },
    'expansion-tank.code-minimum.plain-steel',
    { V_s: '100 gal', t_a: `${t} °F`, P_a: '14.7 psia', p_f: '12 psig', p_max: '30 psig' },
    { E_c: printed },
  )

const schoolTable = (t: number, printed: string): VerificationCase =>
  byFigures(
    {
      id: `P12_${t}`,
      source: 'Public education platform of a regional government (Spain), section 3.3, table of dilatation',
      title: `Expansion of water, 4 to ${t} °C`,
      origin: 'published',
      tolerance: 0.004,
      because: 'Three printed digits: half a unit is up to 0.3 %.',
    },
    figure('expansion', 'ratio', printed, () => growth(celsius(4), celsius(t))),
  )

const uneRow = (t: number, printed: string): VerificationCase =>
  byMethod(
    {
      id: `S01_${t}`,
      source: 'UNE 100155:2004, clause 9, equation (7)',
      title: `Expansion coefficient at ${t} °C`,
      origin: 'published',
      tolerance: 0.006,
      because: 'Three printed digits; the formula parts from the table of the standard by up to 0.5 %.',
    },
    'expansion-tank.une-100155.water',
    { V_s: '1000 L', t_h: `${t} °C`, p_f: '1.5 bar g', p_max: '3.6 bar g' },
    { C_e: printed },
  )

const annexRow = (t: number, printed: string): VerificationCase =>
  byMethod(
    {
      id: `S08_${t}`,
      source: 'EN 12828:2012+A1:2014, Annex D, table D.1',
      title: `Expansion coefficient at ${t} °C`,
      origin: 'from memory',
      tolerance: 0.0065,
      because: 'Printed with two decimals of a per cent.',
    },
    'expansion-tank.en-12828.water',
    { V_s: '1000 L', t_h: `${t} °C`, p_0: '1 bar g', p_e: '2.5 bar g' },
    { e: printed },
  )

const dinRow = (t: number, printed: string): VerificationCase =>
  byMethod(
    {
      id: `S14_${t}`,
      source: 'DIN 4807-2:1999 and -5:1997, expansion from 10 °C',
      title: `Expansion of water, 10 to ${t} °C`,
      origin: 'derived',
      tolerance: 0.01,
      because: 'Evaluated at 3 bar with two decimals of a per cent.',
    },
    'expansion-tank.din-4807',
    { V_s: '1000 L', t_h: `${t} °C`, p_0: '1 bar g', p_e: '2.5 bar g' },
    { e: printed },
  )

const glycolRow = (id: string, base: 'ethylene glycol' | 'propylene glycol', per: number, printed: string) =>
  byFigures(
    {
      id: `S30_${id}`,
      source: 'EnergyPlus 9, reference data of glycol densities (ASHRAE Fundamentals, secondary coolants)',
      title: `Expansion of ${base} ${per} % vol, 5 to 80 °C, with the densities of Melinder (IIR 2010)`,
      origin: 'derived',
      tolerance: 0.165,
      because: 'Two data sets that part by 3 to 16 %: the larger expansion is used for sizing.',
    },
    figure('expansion', 'ratio', printed, () => {
      const read = fluid(base, { value: per / 100, by: 'volume' })
      if (!read.ok) throw new Error(read.message)
      const { v_sat } = read.fluid.functions
      return v_sat.evaluate(celsius(80)) / v_sat.evaluate(celsius(5)) - 1
    }),
  )

/** Properties: expansion of water and glycol solutions by tables, coefficients and equations. */
export const waterCases: readonly VerificationCase[] = [
  netRow(100, '0.0057'),
  netRow(140, '0.0149'),
  netRow(150, '0.0178'),
  netRow(180, '0.0279'),
  netRow(220, '0.0433'),
  netRow(240, '0.0523'),
  netRow(130, '0.126', 'The decimal point slipped: 0.0126.'),
  codeFraction(160, '0.0190'),
  codeFraction(180, '0.0272'),
  codeFraction(200, '0.0354'),
  codeFraction(220, '0.0436'),
  schoolTable(30, '0.435 %'),
  schoolTable(40, '0.782 %'),
  schoolTable(60, '1.71 %'),
  schoolTable(70, '2.27 %'),
  schoolTable(90, '3.59 %'),
  uneRow(30, '0.00328'),
  uneRow(50, '0.0105'),
  uneRow(60, '0.0151'),
  uneRow(70, '0.0204'),
  uneRow(90, '0.0328'),
  uneRow(100, '0.0400'),
  byMethod(
    {
      id: 'S07',
      source: 'Raccolta R (Italy) 2009, R.3.B, 4.2, note 14',
      title: 'Expansion coefficient at 100 °C',
      origin: 'published',
      tolerance: 0.01,
      because: 'Three printed digits.',
    },
    'expansion-tank.en-12828.water',
    { V_s: '1000 L', t_h: '100 °C', p_0: '1 bar g', p_e: '2.5 bar g' },
    { e: '4.21 %' },
  ),
  annexRow(30, '0.66 %'),
  annexRow(40, '0.93 %'),
  annexRow(50, '1.29 %'),
  annexRow(70, '2.22 %'),
  annexRow(80, '2.81 %'),
  annexRow(90, '3.47 %'),
  annexRow(100, '4.21 %'),
  annexRow(120, '5.93 %'),
  annexRow(130, '6.90 %'),
  dinRow(50, '1.18 %'),
  dinRow(60, '1.68 %'),
  dinRow(70, '2.24 %'),
  dinRow(80, '2.87 %'),
  dinRow(90, '3.56 %'),
  dinRow(100, '4.31 %'),
  glycolRow('EG30', 'ethylene glycol', 30, '0.035503'),
  glycolRow('EG40', 'ethylene glycol', 40, '0.037001'),
  glycolRow('EG50', 'ethylene glycol', 50, '0.039499'),
  glycolRow('PG30', 'propylene glycol', 30, '0.0419186'),
  glycolRow('PG40', 'propylene glycol', 40, '0.0459286'),
  glycolRow('PG50', 'propylene glycol', 50, '0.048951'),
  byFigures(
    {
      id: 'S15',
      source: 'City & Guilds plumbing textbook, level 2 and 3 (2019), p. 384',
      title: 'Allowance for a feed and expansion cistern: 4 % from 4 to 96 °C',
      origin: 'published',
      tolerance: 0.03,
      because: 'One printed digit.',
    },
    figure('expansion', 'ratio', '4 %', () => growth(celsius(4), celsius(96))),
  ),
  byFigures(
    {
      id: 'S18_100',
      source: 'French trade method for heating vessels (2016), table of coefficients from 4 °C',
      title: 'Expansion of water, 4 to 100 °C',
      origin: 'published',
      tolerance: 0.01,
      because: 'Four printed digits.',
      knownWrong: 'The decimal point slipped: 0.0431.',
    },
    figure('expansion', 'ratio', '0.4312', () => growth(celsius(4), celsius(100))),
  ),
  byFigures(
    {
      id: 'S05_e',
      source: 'Calculation sheet to BS 7074 (parts 1 to 3)',
      title: 'Expansion of water, 4 to 50 °C',
      origin: 'published',
      tolerance: 0.01,
      because: 'Three printed digits.',
      knownWrong: 'The sheet states 1.88 % at 50 °C; water has 1.21 %. Evidently glycol, or the table of a supplier.',
    },
    figure('expansion', 'ratio', '1.88 %', () => growth(celsius(4), celsius(50))),
  ),
  {
    by: 'words',
    id: 'chilled-sheet',
    source: 'Calculation sheet for chilled water in the form of BS 7074',
    title: 'Temperature of the expansion coefficient',
    origin: 'published',
    tolerance: 0,
    because: '',
    knownWrong: 'The sheet labels its coefficient 5.5 °C and uses that of 35 °C, the plant room in shutdown.',
  },
]

import { compile, formulaTree } from '@coldfill/formula'
import { byFigures, byMethod, figure, type VerificationCase } from '../case.ts'

/** A printed rule that no method offers, evaluated as it is printed. */
const rule = (formula: string) => (): number => compile(formulaTree(formula), {})({})

const arithmetic = 'Arithmetic of the printed rule; the figure is rounded to its printed digits.'

/** Rules of the trade and of codes that size nothing here: run so that no published figure is left out. */
export const ruleCases: readonly VerificationCase[] = [
  byFigures(
    {
      id: 'H27',
      source: 'Michigan Administrative Code R 408.4272, table 272A (gravity systems)',
      title: 'Gravity system of 2,700 ft2 of radiation: 80 gal at 2,400 ft2, one gallon more for each 33 ft2',
      origin: 'derived',
      tolerance: 1e-5,
      because: arithmetic,
    },
    figure('tank volume', 'volume', '89.0909 gal', rule('80[gal] + 1[gal] * ((2700 - 2400) / 33)')),
  ),
  byFigures(
    {
      id: 'O03',
      source: 'University course notes on solar thermal systems',
      title:
        'Linear fit of the expansion of a propylene glycol solar fluid; not used here, since it is negative below 45 °C',
      origin: 'published',
      tolerance: 0.002,
      because: 'Three and four printed digits.',
    },
    figure('expansion at 60 °C', 'ratio', '0.0108', rule('(-33.48 + 0.738 * 60) * 1e-3')),
    figure('expansion at 100 °C', 'ratio', '0.04032', rule('(-33.48 + 0.738 * 100) * 1e-3')),
  ),
  byFigures(
    {
      id: 'P11',
      source: 'Public education platform of a regional government, course on solar water heating',
      title: 'Vessel of 5 % of a storage of 200 L; a band of plausibility, no method',
      origin: 'published',
      tolerance: 0.01,
      because: arithmetic,
    },
    figure('vessel', 'volume', '10 L', rule('0.05 * 200[L]')),
  ),
  byFigures(
    {
      id: 'D25',
      source: 'CTE DB-HE4 (Spain)',
      title: 'Dwelling of three bedrooms, four persons at 28 L a day at 60 °C',
      origin: 'published',
      tolerance: 0.001,
      because: arithmetic,
    },
    figure('volume a day', 'volume', '112 L', rule('4 * 28[L]')),
  ),
  byFigures(
    {
      id: 'N08',
      source: 'CTE DB-HS, section HS4, 4.5.2.3 (from memory)',
      title: 'Pressure vessel, 3.5 and 5 bar absolute, 300 L; odd in its physics, so no method offers it',
      origin: 'derived',
      tolerance: 0.005,
      because: arithmetic,
    },
    figure('vessel', 'volume', '210 L', rule('3.5 * 300[L] / 5')),
  ),
  byFigures(
    {
      id: 'N09',
      source: 'DIN 1988-5 (superseded by DIN 1988-500; from memory)',
      title: 'Pressure vessel on the discharge, 10 m3/h, 6 and 4 bar, 15 starts an hour',
      origin: 'derived',
      tolerance: 0.01,
      because: 'Two printed digits.',
    },
    figure('vessel', 'volume', '0.77 m3', rule('0.33 * 10[m3] * (6 + 1) / ((6 - 4) * 15)')),
  ),
  byFigures(
    {
      id: 'S04',
      source: 'Spanish training page to UNE 100155',
      title: 'Content of a small heating system of 25 kW, 15 Q / 1.16',
      origin: 'published',
      tolerance: 0.002,
      because: 'Printed to the whole litre.',
    },
    figure('content', 'volume', '323 L', rule('15[L] * 25 / 1.16')),
  ),
  byFigures(
    {
      id: 'V04',
      source: 'UNE 100155, application note (14 L/kW of existing plant)',
      title: 'Generator of 100 kW at 14 L/kW',
      origin: 'derived',
      tolerance: 0.001,
      because: arithmetic,
    },
    figure('content', 'volume', '1400 L', rule('14[L/kW] * 100[kW]')),
  ),
  byFigures(
    {
      id: 'V05',
      source: 'DIN 4807-2 and VDI 2035, planning values of emitters (lower), trade values (upper)',
      title: 'Steel panel radiators of 100 kW, 8.8 to 11 L/kW; the upper end is the documented default',
      origin: 'derived',
      tolerance: 0.001,
      because: arithmetic,
    },
    figure('least content', 'volume', '880 L', rule('8.8[L/kW] * 100[kW]')),
    figure('greatest content', 'volume', '1100 L', rule('11[L/kW] * 100[kW]')),
  ),
  byMethod(
    {
      id: 'K02',
      source: 'UMC 1004.1 (from memory)',
      title: '119 gal tank of 250 lb full of water, and its supports',
      origin: 'derived',
      tolerance: 0.005,
      because: 'Worked with 8.34 lb/gal.',
    },
    'check.full-weight',
    { W_0: '250 lb', V_1c: '119 gal' },
    { W_f: '1242.46 lb', W_s: '2484.92 lb' },
  ),
  byFigures(
    {
      id: 'K05',
      source: 'ASME BPVC VIII-1 UG-99, IV HG-510 and HLW (from memory)',
      title: 'Hydrostatic test pressures of a vessel of 125 psi: 1.3, 1.5 and 2 times',
      origin: 'derived',
      tolerance: 0.001,
      because: arithmetic,
    },
    figure('VIII-1 UG-99', 'pressure difference', '162.5 psi', rule('1.3 * 125[psi]')),
    figure('IV HG-510', 'pressure difference', '187.5 psi', rule('1.5 * 125[psi]')),
    figure('IV HLW', 'pressure difference', '250 psi', rule('2 * 125[psi]')),
  ),
]

import { cite, citeFromMemory, type Citation } from '../../citation.ts'
import { defineMethod, given, step, type Method, type WorkedExample } from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { imc } from '../../sources/imc.ts'
import { michiganR4084272 } from '../../sources/michigan-r408-4272.ts'
import { umc } from '../../sources/umc.ts'
import { absolutePressures, pressureInputs, pressuresRise, sections } from './ashrae.ts'

const equation = citeFromMemory(imc, '1009.2 (UMC 1004.4 and ASME IV HG-709 have the same equation)')

const expansionSteps = {
  E_c: step('ratio', 'expansion by the code equation', '0.00041 * fahrenheit(t_a) - 0.0466', equation),
  V_e: step('volume', 'expansion volume', 'E_c * V_s', equation),
}

const shared = {
  revision: 1,
  sections,
  inputs: {
    V_s: given('volume', 'system volume'),
    t_a: {
      kind: 'temperature' as const,
      name: 'average operating temperature',
      from: { at: 'temperatures' as const, key: 'average', standIn: 'high', assumption: 'average-temperature' },
    },
    ...pressureInputs,
  },
  checks: [
    {
      condition: 'E_c > 0',
      code: 'CF-E012',
      message: 'The code equation gives no expansion at this temperature; it is zero at 113.7 °F and negative below.',
      hint: 'Use another method: the code equation is for heating systems from 160 to 280 °F.',
    },
    pressuresRise,
  ],
  validity: [
    {
      condition: 'fahrenheit(t_a) >= 159.999',
      source: equation,
      message: 'The code equation is stated for 160 to 280 °F; below 160 °F it asks for less than the water expands.',
    },
    {
      condition: 'fahrenheit(t_a) <= 280.001',
      source: equation,
      message: 'The code equation is stated for 160 to 280 °F; above it the equation is not validated.',
    },
  ],
} satisfies Partial<Method>

const results = {
  'required-volume': 'V_t',
  'system-volume': 'V_s',
  'expansion-volume': 'V_e',
  'fill-pressure': 'p_f',
  'maximum-pressure': 'p_max',
}

const basis =
  'A legal minimum, not a design method: the equation of the model mechanical codes for heating systems. It takes no account of altitude in its tables, nor of glycol, and is low against the physics of water near 160 °F.'

const tableSystem = { t_a: '195 °F', P_a: '14.7 psia', p_f: '12 psig', p_max: '30 psig' }

const row = (source: Citation, volume: number, tank: number, tolerance: number, because: string): WorkedExample => ({
  id: `code-table-${volume}-gal-to-${tank}`,
  title: `Capacity table of the codes, ${volume} gal system`,
  origin: source.fromMemory ? 'from memory' : 'published',
  source,
  given: { V_s: `${volume} gal`, ...tableSystem },
  expected: { V_t: `${tank} gal` },
  tolerance,
  because,
})

const table = cite(michiganR4084272, 'table 272B, forced circulation')
const offset = 'The printed rows are the equation at 195 °F, 12 and 30 psig, less 0.28 % throughout.'

export const codeMinimumPlainSteel = defineMethod({
  ...shared,
  id: 'expansion-tank.code-minimum.plain-steel',
  title: 'Code minimum, plain steel tank',
  vessel: { kind: 'expansion tank', method: 'code minimum', when: { construction: ['plain steel'] } },
  steps: {
    ...expansionSteps,
    ...absolutePressures,
    V_t: step('volume', 'required volume', 'V_e / (P_a / P_1 - P_a / P_2)', equation),
  },
  results,
  checkBack: 'check-back.plain-steel',
  basis,
  examples: [
    row(table, 100, 15, 0.005, offset),
    row(table, 300, 45, 0.005, offset),
    row(table, 1000, 150, 0.005, offset),
    row(table, 2000, 300, 0.005, offset),
  ],
})

const umcColumn = citeFromMemory(umc, 'table 1004.4, pressurised diaphragm type')
const wholeGallon = 'Printed to the whole gallon, rounded up: up to one gallon.'

export const codeMinimumDiaphragm = defineMethod({
  ...shared,
  id: 'expansion-tank.code-minimum.diaphragm',
  title: 'Code minimum, diaphragm or bladder tank',
  vessel: { kind: 'expansion tank', method: 'code minimum', when: { construction: ['diaphragm', 'bladder'] } },
  steps: {
    ...expansionSteps,
    ...absolutePressures,
    V_t: step(
      'volume',
      'required volume',
      'V_e / (1 - P_1 / P_2)',
      cite(boyle, 'numerator of the code equation for a charged vessel'),
    ),
    p_0: step('gauge pressure', 'precharge', 'p_f', cite(commonPractice, 'precharge equals fill pressure')),
  },
  results: { ...results, precharge: 'p_0' },
  checkBack: 'check-back.diaphragm',
  basis,
  examples: [
    row(umcColumn, 100, 9, 0.085, wholeGallon),
    row(umcColumn, 500, 42, 0.02, wholeGallon),
    row(umcColumn, 2000, 165, 0.005, wholeGallon),
  ],
})

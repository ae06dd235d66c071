import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, type Method, step } from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { imc } from '../../sources/imc.ts'
import { michiganR4084272 } from '../../sources/michigan-r408-4272.ts'
import { umc } from '../../sources/umc.ts'

const equation = citeFromMemory(imc, '1009.2 (UMC 1004.4 and ASME IV HG-709 have the same equation)')
const gasLaw = cite(boyle, 'numerator of the code equation for a charged vessel')

/**
 * The least volume of the model mechanical codes beside a vessel that another method sized, with symbols of its own. `fill`
 * and `highest` are the gauge pressures of that method.
 */
export const codeMinimumCheck = (fill: string, highest: string, construction: 'plain steel' | 'charged'): Method => {
  const plain = construction === 'plain steel'
  return defineMethod({
    id: `check.code-minimum.${plain ? 'plain-steel' : 'charged'}.${fill}-${highest}`,
    revision: 1,
    title: `Code minimum beside another method, ${construction} vessel`,
    inputs: {
      V_s: given('volume', 'system volume'),
      P_a: given('absolute pressure', 'atmospheric pressure'),
      t_k: given('temperature', 'average operating temperature'),
      [fill]: given('gauge pressure', 'fill pressure'),
      [highest]: given('gauge pressure', 'maximum pressure'),
    },
    steps: {
      P_kf: step('absolute pressure', 'absolute fill pressure', `absolute(${fill}, P_a)`, gasLaw),
      P_ko: step('absolute pressure', 'absolute highest pressure', `absolute(${highest}, P_a)`, gasLaw),
      E_k: step('ratio', 'expansion by the code equation', 'max(0, 0.00041 * fahrenheit(t_k) - 0.0466)', equation),
      V_k: step(
        'volume',
        'code minimum volume',
        plain ? 'E_k * V_s / (P_a / P_kf - P_a / P_ko)' : 'E_k * V_s / (1 - P_kf / P_ko)',
        plain ? equation : gasLaw,
      ),
    },
    checks: [],
    validity: [
      {
        condition: 'fahrenheit(t_k) >= 159.999',
        source: equation,
        message: 'The code equation is stated from 160 °F.',
      },
      {
        condition: 'fahrenheit(t_k) <= 280.001',
        source: equation,
        message: 'The code equation is stated up to 280 °F.',
      },
    ],
    results: { 'code-minimum-volume': 'V_k' },
    basis: 'A legal floor for heating systems, whatever method sized the vessel.',
    examples: [
      {
        id: `beside-${plain ? 'plain' : 'charged'}-${fill}`,
        title: 'Row of the capacity table, 1,000 or 2,000 gal at 195 °F, 12 and 30 psig',
        origin: plain ? 'published' : 'from memory',
        source: plain
          ? cite(michiganR4084272, 'table 272B, forced circulation')
          : citeFromMemory(umc, 'table 1004.4, pressurised diaphragm type'),
        given: {
          V_s: plain ? '1000 gal' : '2000 gal',
          P_a: '14.7 psia',
          t_k: '195 °F',
          [fill]: '12 psig',
          [highest]: '30 psig',
        },
        expected: { V_k: plain ? '150 gal' : '165 gal' },
        tolerance: 0.005,
        because: 'Whole gallons; the printed rows are the equation less 0.28 %.',
      },
    ],
  })
}

/** The pressures of the methods that the check may stand beside. */
export const codeMinimumChecks: readonly Method[] = (
  [
    ['p_f', 'p_max'],
    ['p_f', 'p_e'],
  ] as const
).flatMap(([fill, highest]) =>
  (['plain steel', 'charged'] as const).map((construction) => codeMinimumCheck(fill, highest, construction)),
)

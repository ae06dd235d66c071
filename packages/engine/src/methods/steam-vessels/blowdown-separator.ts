import { cite, citeFromMemory } from '../../citation.ts'
import {
  assumed,
  defineMethod,
  given,
  keyed,
  step,
  type Method,
  type MethodInput,
  type MethodStep,
} from '../../method.ts'
import { ashraeFlashArticle } from '../../sources/ashrae-flash-article.ts'
import { boyle } from '../../sources/boyle.ts'
import { heatBalance } from '../../sources/heat-balance.ts'
import { iapwsR7 } from '../../sources/iapws-r7-97.ts'
import { nb27 } from '../../sources/nb-27.ts'

const guide = citeFromMemory(nb27, 'size of a blowoff vessel: twice the volume blown')
const saturation = cite(iapwsR7, 'saturation line, region 4')
const cooling = cite(heatBalance, 'heat of the blown water taken up by the cooling water')

const shared = {
  P_a: '14.696 psia',
  p_b: '100 psig',
  t_dr: '140 °F',
  t_cw: '60 °F',
}

interface Way {
  readonly name: 'blown volume' | 'level drop'
  readonly impliedBy: readonly string[]
  readonly inputs: Readonly<Record<string, MethodInput>>
  readonly steps: Readonly<Record<string, MethodStep>>
  readonly examples: Method['examples']
}

const build = ({ name, impliedBy, inputs, steps, examples }: Way): Method =>
  defineMethod({
    id: `blowdown-separator.${name.replace(' ', '-')}`,
    revision: 1,
    title: `Blowdown separator by ${name === 'blown volume' ? 'the volume blown' : 'the drop of the boiler level'}`,
    vessel: { kind: 'blowdown separator', method: name, impliedBy },
    sections: ['site'],
    inputs: {
      P_a: given('absolute pressure', 'atmospheric pressure'),
      ...inputs,
      p_b: keyed('gauge pressure', 'working pressure of the boiler', 'vessel', 'boiler-pressure'),
      t_dr: keyed(
        'temperature',
        'hottest water that the drain may take',
        'vessel',
        'drain-temperature',
        'blowdown.drain-temperature',
      ),
      t_cw: assumed('temperature', 'temperature of the cooling water', 'blowdown.cooling-water'),
    },
    steps: {
      ...steps,
      V_t: step('volume', 'required volume', '2 * V_b', guide),
      P_b: step(
        'absolute pressure',
        'absolute boiler pressure',
        'absolute(p_b, P_a)',
        cite(boyle, 'absolute pressure'),
      ),
      t_b: step('temperature', 'temperature of the blown water', 't_sat(P_b)', saturation),
      t_0: step('temperature', 'boiling point in the vented vessel', 't_sat(P_a)', saturation),
      x_fl: step(
        'ratio',
        'flash fraction',
        '(h_f(t_b) - h_f(t_0)) / h_fg(t_0)',
        cite(ashraeFlashArticle, 'energy balance: flash fraction of condensate'),
      ),
      r_cw: step(
        'ratio',
        'cooling water for each mass blown',
        'max(0, (1 - x_fl) * (h_f(t_0) - h_f(t_dr)) / (h_f(t_dr) - h_f(t_cw)))',
        cooling,
      ),
      V_cw: step('volume', 'cooling water for one blow', 'r_cw * V_b * rho(t_0) / rho(t_cw)', cooling),
    },
    checks: [
      {
        condition: 't_dr > t_cw',
        code: 'CF-E027',
        message: 'The hottest water that the drain may take is not warmer than the cooling water.',
        hint: 'Correct `drain-temperature`, or the assumption on the cooling water.',
      },
    ],
    results: {
      'required-volume': 'V_t',
      'blown-volume': 'V_b',
      'flash-fraction': 'x_fl',
      'cooling-water': 'V_cw',
    },
    basis:
      'The vessel holds at least twice the volume blown at once, and stands half full of water between blows. What flashes leaves by the vent, whose size is in the table of the guide; the rest is cooled to the limit of the drain. The volume of cooling water counts the blown volume as water at its boiling point in the vented vessel, which is some per cent too much.',
    examples,
  })

const cooled = {
  id: 'cooling-by-steam-tables',
  title: 'Blowdown of 100 psig cooled to 140 °F with water of 60 °F',
  origin: 'by hand' as const,
  source: cite(heatBalance, 'with the enthalpies of the steam tables, from memory: 180.2, 108.0 and 28.1 Btu/lb'),
  expected: { x_fl: '0.133', r_cw: '0.7834' },
  tolerance: 0.004,
  because: 'By hand: (1 − 0.133)(180.2 − 108.0)/(108.0 − 28.1); each enthalpy has one decimal.',
}

export const blowdownByVolume = build({
  name: 'blown volume',
  impliedBy: ['blown-volume'],
  inputs: { V_b: keyed('volume', 'water blown out at once', 'vessel', 'blown-volume') },
  steps: {},
  examples: [
    {
      id: 'blown-150-gal',
      title: 'Twice the 149.61 gal blown',
      origin: 'derived',
      source: guide,
      given: { ...shared, V_b: '149.61 gal' },
      expected: { V_t: '299.22 gal' },
      tolerance: 1e-6,
      because: 'Twice.',
    },
    { ...cooled, given: { ...shared, V_b: '100 gal' } },
  ],
})

export const blowdownByLevel = build({
  name: 'level drop',
  impliedBy: ['water-surface'],
  inputs: {
    A_w: keyed('area', 'water surface in the boiler', 'vessel', 'water-surface'),
    dz: keyed('length', 'drop of the level in one blow', 'vessel', 'level-drop', 'blowdown.level-drop'),
  },
  steps: { V_b: step('volume', 'water blown out at once', 'A_w * dz', citeFromMemory(nb27, 'drop of the level')) },
  examples: [
    {
      id: 'level-of-60-ft2',
      title: '60 ft2 dropped by 4 in',
      origin: 'derived',
      source: guide,
      given: { ...shared, A_w: '60 ft2', dz: '4 in' },
      expected: { V_b: '149.61 gal', V_t: '299.22 gal' },
      tolerance: 2e-5,
      because: '20 ft3 are 149.61 gal; five digits are printed.',
    },
  ],
})

import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step } from '../../method.ts'
import { ashraeFlashArticle } from '../../sources/ashrae-flash-article.ts'
import { ashraeHvacSe } from '../../sources/ashrae-hvac-se.ts'
import { boyle } from '../../sources/boyle.ts'
import { geometry } from '../../sources/geometry.ts'
import { iapwsR7 } from '../../sources/iapws-r7-97.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

const saturation = cite(iapwsR7, 'saturation line, region 4')
const fraction = cite(ashraeFlashArticle, 'energy balance: flash fraction of condensate')
const velocity = citeFromMemory(ashraeHvacSe, 'steam systems, flash tanks, velocity of the steam')

export const flashTank = defineMethod({
  id: 'flash-tank.steam-velocity',
  revision: 1,
  title: 'Flash tank by the velocity of the flash steam',
  vessel: { kind: 'flash tank', method: 'steam velocity' },
  sections: ['site'],
  inputs: {
    P_a: given('absolute pressure', 'atmospheric pressure'),
    m_c: keyed('mass flow', 'condensate that enters', 'vessel', 'condensate-flow'),
    p_c: keyed('gauge pressure', 'pressure from which the condensate comes', 'vessel', 'condensate-pressure'),
    p_fl: keyed('gauge pressure', 'pressure in the flash tank', 'vessel', 'flash-pressure'),
    w_s: keyed(
      'velocity',
      'highest velocity of the flash steam',
      'vessel',
      'steam-velocity',
      'flash-tank.steam-velocity',
    ),
  },
  steps: {
    P_c: step(
      'absolute pressure',
      'absolute condensate pressure',
      'absolute(p_c, P_a)',
      cite(boyle, 'absolute pressure'),
    ),
    P_fl: step('absolute pressure', 'absolute flash pressure', 'absolute(p_fl, P_a)', cite(boyle, 'absolute pressure')),
    t_c: step('temperature', 'temperature of the condensate', 't_sat(P_c)', saturation),
    t_fl: step('temperature', 'temperature in the flash tank', 't_sat(P_fl)', saturation),
    x_fl: step('ratio', 'flash fraction', '(h_f(t_c) - h_f(t_fl)) / h_fg(t_fl)', fraction),
    m_s: step('mass flow', 'flash steam', 'x_fl * m_c', fraction),
    A_s: step('area', 'least area for the flash steam', 'm_s * v_g(t_fl) / w_s', velocity),
    d_s: step('diameter', 'least diameter', 'sqrt(4 * A_s / pi)', cite(geometry, 'circle of an area')),
  },
  checks: [
    {
      condition: 'P_c > P_fl',
      code: 'CF-E026',
      message: 'The flash tank stands at or above the pressure from which the condensate comes: nothing flashes.',
      hint: 'Correct `condensate-pressure` or `flash-pressure`.',
    },
  ],
  results: {
    diameter: 'd_s',
    'flash-fraction': 'x_fl',
    'flash-steam': 'm_s',
    'flash-temperature': 't_fl',
  },
  basis:
    'The part of saturated condensate that flashes follows from its enthalpy at both pressures; the tank is so wide that the steam rises slowly enough to leave the water behind. The limit of velocity is handbook practice from memory; length, inlet and vent follow the data of the maker. Enthalpy of evaporation by Clausius and Clapeyron with the vapour density of IAPWS SR1-86.',
  examples: [
    {
      id: 'article-100-psig',
      title: 'Condensate of 100 psig to atmosphere: 13.3 % flashes',
      origin: 'from memory',
      source: cite(ashraeFlashArticle, 'example from 100 psig to atmosphere'),
      given: { P_a: '14.696 psia', m_c: '1000 lb/h', p_c: '100 psig', p_fl: '0 psig', w_s: '10 ft/s' },
      expected: { x_fl: '0.133' },
      tolerance: 0.004,
      because: 'Printed with three decimals: half a unit is 0.0005 in 0.133.',
    },
    {
      id: 'flash-tank-5000-lb-h',
      title: '5,000 lb/h from 100 to 5 psig, 10 ft/s',
      origin: 'derived',
      source: cite(verificationEvaluation, 'flash steam and diameter at 10 ft/s'),
      given: { P_a: '14.696 psia', m_c: '5000 lb/h', p_c: '100 psig', p_fl: '5 psig', w_s: '10 ft/s' },
      expected: { m_s: '591.67 lb/h', d_s: '7.83693 in' },
      tolerance: 0.001,
      because:
        'Evaluated with other formulations of steam, which differ by some 0.05 %; 14.7 or 14.696 psia is not said.',
    },
    {
      id: 'steam-tables-10-bar',
      title: 'Saturation temperature at 1 MPa',
      origin: 'published',
      source: cite(iapwsR7, 'table 36, 453.035632 K at 1 MPa'),
      given: { P_a: '1 bar abs', m_c: '1000 lb/h', p_c: '9 bar', p_fl: '0 bar', w_s: '10 ft/s' },
      expected: { t_c: '453.035632 K' },
      tolerance: 2e-9,
      because: 'Nine digits are printed.',
    },
  ],
})

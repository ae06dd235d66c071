import { cite, citeFromMemory, type Citation } from '../../citation.ts'
import { assumed, defineMethod, given, keyed, step, type Method } from '../../method.ts'
import { ashraeHvacSe } from '../../sources/ashrae-hvac-se.ts'
import { aspeExpansion } from '../../sources/aspe-expansion.ts'
import { boyle } from '../../sources/boyle.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

const chapter = citeFromMemory(aspeExpansion, 'expansion tank examples')

const inputs = {
  P_a: given('absolute pressure', 'atmospheric pressure'),
  V_s: given('volume', 'system volume'),
  t_c: keyed('temperature', 'cold water temperature', 'temperatures', 'cold'),
  t_h: keyed('temperature', 'storage temperature', 'temperatures', 'storage'),
  p_1: given('gauge pressure', 'fill pressure'),
  p_2: given('gauge pressure', 'maximum pressure'),
}

const water = (source: Citation) => ({
  v_c: step('specific volume', 'specific volume, cold', 'v_sat(t_c)', source),
  v_h: step('specific volume', 'specific volume, hot', 'v_sat(t_h)', source),
  V_w: step('volume', 'expansion of the water', 'V_s * (v_h / v_c - 1)', source),
})

const usualCharge = (source: Citation) => ({
  V_t: step('volume', 'required volume', 'V_e / (1 - P_1 / P_2)', source),
  p_0: step(
    'gauge pressure',
    'precharge',
    'p_1',
    cite(commonPractice, 'charged to the incoming pressure, with the system empty'),
  ),
})

const ownCharge = {
  P_0: step('absolute pressure', 'absolute precharge', 'absolute(p_0, P_a)', cite(boyle, 'absolute pressure')),
  V_t: step(
    'volume',
    'required volume',
    'V_e / (min(1, P_0 / P_1) - P_0 / P_2)',
    cite(boyle, 'gas volume at charge, incoming and highest pressure'),
  ),
}

const absolute = {
  P_1: step('absolute pressure', 'absolute pressure, cold', 'absolute(p_1, P_a)', cite(boyle, 'absolute pressure')),
  P_2: step('absolute pressure', 'absolute pressure, hot', 'absolute(p_2, P_a)', cite(boyle, 'absolute pressure')),
}

const checks: Method['checks'] = [
  {
    condition: 't_h > t_c',
    code: 'CF-E010',
    message: 'The storage temperature is not above the cold water temperature, so the water does not expand.',
    hint: 'Give the hottest and the coldest the water gets under `temperatures`.',
  },
  {
    condition: 'V_e > 0[L]',
    code: 'CF-E011',
    message:
      'Heater and piping grow as much as the water between these temperatures, so no expansion is left to size for.',
    hint: 'Check `temperatures` and the materials of the contents.',
  },
  {
    condition: 'P_2 > P_1',
    code: 'CF-E022',
    message:
      'The incoming pressure is not below the highest pressure allowed at the vessel: no vessel is large enough.',
    hint: 'Lower the regulator setting, or add a regulator; a relief valve is no expansion control.',
  },
]

const chargeBelowHighest: Method['checks'][number] = {
  condition: 'P_2 > P_0',
  code: 'CF-E021',
  message: 'The precharge is not below the highest pressure allowed: the vessel would never take up water.',
  hint: 'Charge the vessel to the incoming pressure.',
}

const results = {
  'required-volume': 'V_t',
  'system-volume': 'V_s',
  'expansion-volume': 'V_e',
  'fill-pressure': 'p_1',
  'maximum-pressure': 'p_2',
  precharge: 'p_0',
}

type Charge = 'usual' | 'own'

const build = (method: 'aspe' | 'ashrae', source: Citation, materials: boolean, charge: Charge): Method => {
  const tank = { ...absolute, ...(charge === 'own' ? ownCharge : usualCharge(source)) }
  const steps = materials
    ? {
        ...water(source),
        G_st: step('volume', 'growth of what steel holds', 'V_st * 3 * alpha_st * (t_h - t_c)', source),
        G_cu: step('volume', 'growth of what copper holds', 'V_cu * 3 * alpha_cu * (t_h - t_c)', source),
        V_e: step('volume', 'expansion volume', 'V_w - G_st - G_cu', source),
        ...tank,
      }
    : {
        ...water(source),
        V_e: step('volume', 'expansion volume', 'V_w', source),
        ...tank,
      }
  return defineMethod({
    id: `thermal-expansion-tank.${method}${materials ? '.materials' : ''}${charge === 'own' ? '.own-charge' : ''}`,
    revision: 1,
    title: `Thermal expansion tank, ${method.toUpperCase()}${materials ? ', with the growth of heater and piping' : ''}${charge === 'own' ? ', its own precharge' : ''}`,
    vessel: {
      kind: 'thermal expansion tank',
      method,
      when: { ...(materials ? { materials: true } : {}), ...(charge === 'own' ? { written: ['precharge'] } : {}) },
    },
    sections: ['site', 'contents', 'domestic pressures'],
    inputs: {
      ...inputs,
      ...(charge === 'own' ? { p_0: keyed('gauge pressure', 'precharge', 'vessel', 'precharge') } : {}),
      ...(materials
        ? {
            V_st: given('volume', 'volume held by steel'),
            V_cu: given('volume', 'volume held by copper'),
            alpha_st: assumed('per temperature difference', 'linear expansion of steel', 'linear-expansion.steel'),
            alpha_cu: assumed('per temperature difference', 'linear expansion of copper', 'linear-expansion.copper'),
          }
        : {}),
    },
    steps,
    checks: charge === 'own' ? [...checks, chargeBelowHighest] : checks,
    results,
    ...(materials ? {} : { assumes: ['material.domestic'] }),
    checkBack: charge === 'own' ? 'check-back.diaphragm-other-charge' : 'check-back.diaphragm',
    basis: materials
      ? 'The heated water expands from the incoming to the storage temperature; heater and piping grow by three times the linear expansion of what holds the water. Cold mains are not counted. The charge equals the incoming pressure.'
      : 'The heated water expands from the incoming to the storage temperature; no growth of heater or piping is credited. Cold mains are not counted. The charge equals the incoming pressure.',
    examples: charge === 'own' ? ownChargeExamples(materials) : materials ? materialExamples : waterExamples,
  })
}

const heater = { P_a: '14.7 psia', V_s: '1000 gal', t_c: '40 °F', t_h: '140 °F', p_1: '50 psig', p_2: '110 psig' }

const ownChargeExamples = (materials: boolean): Method['examples'] => [
  {
    id: 'charge-40-incoming-60-psig',
    title: 'Factory charge of 40 psig left as it is, incoming 60 psig, limit 80 psig',
    origin: 'by hand',
    source: cite(boyle, 'gas volume at charge, incoming and highest pressure'),
    given: {
      P_a: '14.7 psia',
      V_s: '119 gal',
      t_c: '50 °F',
      t_h: '140 °F',
      p_1: '60 psig',
      p_2: '80 psig',
      p_0: '40 psig',
      V_e: '2 gal',
      ...(materials ? { V_st: '0 gal', V_cu: '0 gal', alpha_st: '6.5e-6 1/°F', alpha_cu: '9.5e-6 1/°F' } : {}),
    },
    expected: { V_t: '12.9325228519 gal' },
    tolerance: 1e-9,
    because: 'By hand: 2 / (54.7/74.7 - 54.7/94.7).',
  },
]

const waterExamples: Method['examples'] = [
  {
    id: 'chapter-1000-gal',
    title: 'Expansion of 1,000 gal from 40 to 140 °F',
    origin: 'from memory',
    source: chapter,
    given: { ...heater, v_c: '0.01602 ft3/lb', v_h: '0.01629 ft3/lb' },
    expected: { V_w: '16.9 gal' },
    tolerance: 0.003,
    because: 'Printed with one decimal: half a unit is 0.05 in 16.9. Full specific volumes give 17.0.',
  },
  {
    id: 'chapter-50-110-psig',
    title: 'Tank for 14.8 gal of net expansion, 50 to 110 psig',
    origin: 'from memory',
    source: chapter,
    given: { ...heater, V_e: '14.8 gal' },
    expected: { V_t: '30.8 gal' },
    tolerance: 0.0017,
    because: 'Printed with one decimal: half a unit is 0.05 in 30.8.',
  },
  {
    id: 'heater-119-gal-80-psi',
    title: '119 gal heater, 60 psig incoming, 80 psig limit',
    origin: 'derived',
    source: cite(verificationEvaluation, '119 gal from 50 to 140 °F, 60 to 80 psig'),
    given: { P_a: '14.696 psia', V_s: '119 gal', t_c: '50 °F', t_h: '140 °F', p_1: '60 psig', p_2: '80 psig' },
    expected: { V_w: '1.99451 gal', V_t: '9.444 gal' },
    tolerance: 0.0005,
    because: 'Six and four printed digits; 14.7 or 14.696 psia is not said.',
  },
]

const materialExamples: Method['examples'] = [
  {
    id: 'chapter-steel-and-copper',
    title: '900 gal steel heater and 100 gal of copper piping',
    origin: 'from memory',
    source: chapter,
    given: {
      ...heater,
      V_st: '900 gal',
      V_cu: '100 gal',
      alpha_st: '6.5e-6 1/°F',
      alpha_cu: '9.5e-6 1/°F',
      V_w: '16.9 gal',
    },
    expected: { G_st: '1.8 gal', G_cu: '0.3 gal', V_e: '14.8 gal' },
    tolerance: 0.06,
    because:
      'Growths are printed with one decimal: half a unit is 0.05 in 0.3 and 1.8; the chapter takes them off rounded.',
  },
]

const handbook = cite(ashraeHvacSe, 'expansion tank equations, applied to domestic hot water')

/** Both names of the method, the more particular forms first. */
export const gasLawMethods: readonly Method[] = (
  [
    ['aspe', chapter],
    ['ashrae', handbook],
  ] as const
).flatMap(([method, source]) =>
  [true, false].flatMap((materials) =>
    (['own', 'usual'] as const).map((charge) => build(method, source, materials, charge)),
  ),
)

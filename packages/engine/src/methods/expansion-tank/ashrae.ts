import type { MethodCheck, MethodInput, MethodStep, SectionId } from '../../method.ts'
import { given, keyed, step } from '../../method.ts'
import { cite } from '../../citation.ts'
import { ashraeHvacSe } from '../../sources/ashrae-hvac-se.ts'
import { boyle } from '../../sources/boyle.ts'

/** What the four forms of the handbook's method share: the net expansion of the water and the absolute pressures. */
export const equations = cite(ashraeHvacSe, 'hydronic heating and cooling, expansion tank equations (12) to (14)')

export const sections: readonly SectionId[] = ['site', 'contents', 'material', 'handbook pressures']

export const inputs: Readonly<Record<string, MethodInput>> = {
  V_s: given('volume', 'system volume'),
  t_l: keyed('temperature', 'lowest water temperature', 'temperatures', 'low'),
  t_h: keyed('temperature', 'highest water temperature', 'temperatures', 'high'),
  alpha: given('per temperature difference', 'linear expansion of the piping'),
}

export const pressureInputs: Readonly<Record<string, MethodInput>> = {
  P_a: given('absolute pressure', 'atmospheric pressure'),
  p_f: given('gauge pressure', 'fill pressure'),
  p_max: given('gauge pressure', 'maximum pressure'),
}

export const expansion: Readonly<Record<string, MethodStep>> = {
  v_l: step('specific volume', 'specific volume, cold', 'v_sat(t_l)', equations),
  v_h: step('specific volume', 'specific volume, hot', 'v_sat(t_h)', equations),
  e_n: step('ratio', 'net relative expansion', 'v_h / v_l - 1 - 3 * alpha * (t_h - t_l)', equations),
  V_e: step('volume', 'expansion volume', 'V_s * e_n', equations),
}

export const absolutePressures: Readonly<Record<string, MethodStep>> = {
  P_1: step('absolute pressure', 'absolute pressure, cold', 'absolute(p_f, P_a)', cite(boyle, 'absolute pressure')),
  P_2: step('absolute pressure', 'absolute pressure, hot', 'absolute(p_max, P_a)', cite(boyle, 'absolute pressure')),
}

export const temperaturesRise: MethodCheck = {
  condition: 't_h > t_l',
  code: 'CF-E010',
  message: 'The highest temperature is not above the lowest, so the water does not expand.',
  hint: 'Give the hottest and the coldest the water gets, shutdown included, under `temperatures`.',
}

export const waterExpands: MethodCheck = {
  condition: 'e_n > 0',
  code: 'CF-E011',
  message: 'The piping grows as much as the water between these temperatures, so no expansion is left to size for.',
  hint: 'Check `temperatures.low` and `temperatures.high`; near 4 °C water hardly expands.',
}

export const pressuresRise: MethodCheck = {
  condition: 'P_2 > P_1',
  code: 'CF-E020',
  message: 'The highest pressure allowed at the vessel is not above the fill pressure: no vessel is large enough.',
  hint: 'Raise the relief valve setting, lower the static height above the vessel, or move the vessel higher in the building.',
}

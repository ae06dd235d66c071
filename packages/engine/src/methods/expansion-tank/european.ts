import { citeFromMemory } from '../../citation.ts'
import { given, keyed, type MethodCheck, type MethodInput, type SectionId } from '../../method.ts'
import { en12828 } from '../../sources/en-12828.ts'

/** What EN 12828 and DIN 4807-2 share: the water reserve, and gauge pressures made absolute with one bar. */
export const annexD = citeFromMemory(en12828, 'Annex D')

export const sections: readonly SectionId[] = ['contents', 'european pressures']

export const inputs: Readonly<Record<string, MethodInput>> = {
  V_s: given('volume', 'system volume'),
  t_h: keyed('temperature', 'highest water temperature', 'temperatures', 'high'),
  p_0: given('gauge pressure', 'precharge'),
  p_e: given('gauge pressure', 'maximum pressure'),
}

export const requiredVolume = '(V_e + V_WR) * absolute(p_e, 1[bar abs]) / (p_e - p_0)'
export const leastFill = 'gauge(V_t * absolute(p_0, 1[bar abs]) / (V_t - V_WR), 1[bar abs])'
export const waterReserve = 'max(0.005 * V_s, 3[L])'

export const results = {
  'required-volume': 'V_t',
  'system-volume': 'V_s',
  'expansion-volume': 'V_e',
  'water-reserve': 'V_WR',
  'fill-pressure': 'p_f',
  'maximum-pressure': 'p_e',
  precharge: 'p_0',
} as const

export const chargeBelowHighest: MethodCheck = {
  condition: 'p_e > p_0',
  code: 'CF-E020',
  message: 'The highest pressure allowed at the vessel is not above the precharge: no vessel is large enough.',
  hint: 'Raise the relief valve setting, lower the static height above the vessel, or move the vessel higher in the building.',
}

import type { GivenValue } from '../calculation.ts'
import { cite } from '../citation.ts'
import { defineMethod, given, step, type Method, type MethodInput, type MethodStep } from '../method.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { upc } from '../sources/upc.ts'

/** Facts of a domestic system that the pressures at its vessel follow from. Gauge pressures in Pa. */
export interface DomesticPressureFacts {
  readonly supply?: GivenValue
  readonly regulator?: GivenValue
  readonly maximum?: GivenValue
  readonly reliefSet?: GivenValue
  readonly reliefMargin?: { readonly as: 'ratio' | 'pressure difference'; readonly given: GivenValue }
  /** Pressure limit of the adopted plumbing code, thermal expansion included. */
  readonly cap?: GivenValue
}

/** Incoming pressure `p_1` and highest pressure `p_2` at the vessel, gauge. */
export const domesticPressures = (
  facts: DomesticPressureFacts,
): { method: Method; given: Record<string, GivenValue> } => {
  const inputs: Record<string, MethodInput> = {}
  const steps: Record<string, MethodStep> = {}
  const values: Record<string, GivenValue> = {}
  const need = (symbol: string, name: string, value: GivenValue, kind: MethodInput['kind'] = 'gauge pressure') => {
    inputs[symbol] = given(kind, name)
    values[symbol] = value
  }
  const { supply, regulator } = facts
  if (supply) need('p_s', 'supply pressure', supply)
  if (regulator) need('p_reg', 'regulator setting', regulator)
  if (supply || regulator) {
    const incoming = supply && regulator ? 'min(p_s, p_reg)' : supply ? 'p_s' : 'p_reg'
    steps['p_1'] = step(
      'gauge pressure',
      'fill pressure',
      incoming,
      cite(commonPractice, 'the vessel stands at the incoming pressure; a regulator never raises it'),
    )
  }
  const limits: string[] = []
  if (facts.maximum) {
    need('p_m', 'maximum pressure given', facts.maximum)
    limits.push('p_m')
  }
  if (facts.reliefSet && facts.reliefMargin) {
    need('p_rv', 'relief valve set pressure', facts.reliefSet)
    if (facts.reliefMargin.as === 'ratio') {
      need('m_rv', 'margin below the relief valve', facts.reliefMargin.given, 'ratio')
      limits.push('(1 - m_rv) * p_rv')
    } else {
      need('dp_rv', 'margin below the relief valve', facts.reliefMargin.given, 'pressure difference')
      limits.push('p_rv - dp_rv')
    }
  }
  if (facts.cap) {
    need('p_cap', 'pressure limit of the plumbing code', facts.cap)
    limits.push('p_cap')
  }
  if (limits.length > 0) {
    const lowest = limits.length === 1 ? limits.join('') : `min(${limits.join(', ')})`
    const source = facts.cap ? cite(upc, '608.2 (IPC 607.3)') : cite(commonPractice, 'margin below the relief valve')
    steps['p_2'] = step('gauge pressure', 'maximum pressure', lowest, source)
  }
  const method = defineMethod({
    id: 'section.domestic-pressures',
    revision: 1,
    title: 'Pressures',
    inputs,
    steps,
    checks: [],
    results: {},
    basis:
      'The vessel starts at the incoming pressure (the lower of supply and regulator) and may rise to the lowest of the given maximum, the relief valve less its margin and the pressure limit of the adopted plumbing code.',
    examples: [],
  })
  return { method, given: values }
}

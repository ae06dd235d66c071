import type { GivenValue } from '../calculation.ts'
import { cite, citeFromMemory, type Citation } from '../citation.ts'
import { defineMethod, given, step, type Method, type MethodInput, type MethodStep } from '../method.ts'
import { ashraeHvacSe } from '../sources/ashrae-hvac-se.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { en12828 } from '../sources/en-12828.ts'
import { hydrostatics } from '../sources/hydrostatics.ts'

/** Facts of a closed system that its pressures follow from. Gauge pressures in Pa, heights in m, temperatures in K. */
export interface ClosedPressureFacts {
  /** Given outright, as is a maximum: then it is used and said to be given. */
  readonly fill?: GivenValue
  readonly maximum?: GivenValue
  readonly staticHeight?: GivenValue
  readonly topMargin?: GivenValue
  /** Needed where a height of liquid counts. */
  readonly fillTemperature?: GivenValue
  readonly reliefSet?: GivenValue
  /** Absent where valve and vessel stand at one height. */
  readonly reliefHeight?: GivenValue
  readonly reliefMargin?: { readonly as: 'ratio' | 'pressure difference'; readonly given: GivenValue }
  /** Absent where the vessel is at the pump suction. */
  readonly pumpHead?: { readonly as: 'length' | 'pressure difference'; readonly given: GivenValue }
}

const G = '9.80665[m/s2]'
const columnOfLiquid: Citation = cite(hydrostatics, 'pressure of a column of liquid')

/**
 * `handbook`: fill pressure `p_f` and highest pressure `p_max`. `european`: least charge `p_0`, never below 0.7 bar, and
 * highest pressure `p_e` (set less 0.5 bar up to 5 bar, else 0.9 of the set pressure). `british`: `p_0` with `p_max`.
 */
export type PressureRule = 'handbook' | 'european' | 'british'

/** Static, lowest and highest pressure at the vessel, all gauge, with the symbols of the rule. */
export const closedPressures = (
  facts: ClosedPressureFacts,
  rule: PressureRule,
): { method: Method; given: Record<string, GivenValue> } => {
  const inputs: Record<string, MethodInput> = {}
  const steps: Record<string, MethodStep> = {}
  const values: Record<string, GivenValue> = {}
  const need = (symbol: string, kind: MethodInput['kind'], name: string, value: GivenValue) => {
    inputs[symbol] = given(kind, name)
    values[symbol] = value
  }
  const density = () => {
    if (steps['rho_f']) return
    if (!facts.fillTemperature) throw new Error('a height of liquid without a fill temperature')
    need('t_f', 'temperature', 'fill temperature', facts.fillTemperature)
    steps['rho_f'] = step('density', 'density at the fill temperature', 'rho(t_f)', columnOfLiquid)
  }
  const charged = rule !== 'handbook'
  const fillSymbol = charged ? 'p_0' : 'p_f'

  if (facts.fill) {
    need(fillSymbol, 'gauge pressure', charged ? 'precharge' : 'fill pressure', facts.fill)
  } else if (facts.staticHeight && facts.topMargin) {
    density()
    need('h_st', 'length', 'static height', facts.staticHeight)
    need('p_t', 'gauge pressure', 'pressure kept at the highest point, cold', facts.topMargin)
    steps['p_st'] = step('pressure difference', 'static pressure', `rho_f * ${G} * h_st`, columnOfLiquid)
    let raised = 'p_t + p_st'
    if (facts.pumpHead) {
      if (facts.pumpHead.as === 'length') {
        need('h_p', 'length', 'pump head', facts.pumpHead.given)
        steps['dp_p'] = step('pressure difference', 'pump pressure', `rho_f * ${G} * h_p`, columnOfLiquid)
      } else {
        need('dp_p', 'pressure difference', 'pump pressure', facts.pumpHead.given)
      }
      raised += ' + dp_p'
    }
    steps[fillSymbol] = charged
      ? step(
          'gauge pressure',
          'precharge',
          `max(${raised}, 0.7[bar g])`,
          citeFromMemory(en12828, 'Annex D, initial pressure; 0.7 bar at least is German and British practice'),
        )
      : step(
          'gauge pressure',
          'fill pressure',
          raised,
          cite(ashraeHvacSe, 'hydronic heating and cooling, fill pressure'),
        )
  }

  const highest = rule === 'european' ? 'p_e' : 'p_max'
  if (facts.maximum) {
    need(highest, 'gauge pressure', 'maximum pressure', facts.maximum)
  } else if (facts.reliefSet) {
    need('p_rv', 'gauge pressure', 'relief valve set pressure', facts.reliefSet)
    let allowed: string
    let source: Citation
    if (rule === 'european') {
      allowed = 'when(p_rv <= 5[bar g], p_rv - 0.5[bar], 0.9 * p_rv)'
      source = citeFromMemory(en12828, 'Annex D, final pressure')
    } else if (facts.reliefMargin?.as === 'pressure difference') {
      need('dp_rv', 'pressure difference', 'margin below the relief valve', facts.reliefMargin.given)
      allowed = 'p_rv - dp_rv'
      source = cite(commonPractice, 'margin below the relief valve')
    } else if (facts.reliefMargin) {
      need('m_rv', 'ratio', 'margin below the relief valve', facts.reliefMargin.given)
      allowed = '(1 - m_rv) * p_rv'
      source = cite(commonPractice, 'margin below the relief valve')
    } else {
      throw new Error('a relief valve without a margin')
    }
    if (facts.reliefHeight && facts.reliefHeight.value !== 0) {
      density()
      need('h_rv', 'length', 'relief valve above the vessel', facts.reliefHeight)
      allowed += ` + rho_f * ${G} * h_rv`
    }
    steps[highest] = step('gauge pressure', 'maximum pressure', allowed, source)
  }

  const method = defineMethod({
    id: `section.closed-pressures.${rule}`,
    revision: 1,
    title: 'Pressures',
    inputs,
    steps,
    checks: [],
    results: {},
    basis:
      'The fill pressure keeps the top of the system above atmosphere when cold; the highest pressure stays below the relief valve, corrected for the height between valve and vessel.',
    examples: [],
  })
  return { method, given: values }
}

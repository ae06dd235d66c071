import type { Kind } from '@coldfill/units'
import type { GivenValue } from '../calculation.ts'
import { cite } from '../citation.ts'
import { defineMethod, given, step, type Method, type MethodInput, type MethodStep } from '../method.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { geometry } from '../sources/geometry.ts'

/** One line of what holds the water. Lengths in m, volumes in m3, outputs in W, content per output in m3/W. */
export type ContentsLine = { readonly material?: 'steel' | 'copper' | 'none' } & (
  | { readonly holds: 'equipment'; readonly label: string; readonly each: GivenValue; readonly count: GivenValue }
  | { readonly holds: 'pipe'; readonly label: string; readonly insideDiameter: GivenValue; readonly length: GivenValue }
  | { readonly holds: 'estimate'; readonly label: string; readonly output: GivenValue; readonly content: GivenValue }
  | { readonly holds: 'volume'; readonly label: string; readonly volume: GivenValue }
)

const sum = (symbols: readonly string[]): string => (symbols.length === 0 ? '0[L]' : symbols.join(' + '))

/**
 * The system volume as a method made for these lines: one step a line and their sum `V_s`; where `withMaterials`,
 * also the parts of it held by steel (`V_st`) and by copper (`V_cu`).
 */
export const contents = (
  lines: readonly ContentsLine[],
  withMaterials = false,
): { method: Method; given: Record<string, GivenValue> } => {
  const inputs: Record<string, MethodInput> = {}
  const steps: Record<string, MethodStep> = {}
  const values: Record<string, GivenValue> = {}
  const need = (symbol: string, kind: Kind, name: string, value: GivenValue) => {
    inputs[symbol] = given(kind, name)
    values[symbol] = value
  }
  const volumes = lines.map((line, index) => {
    const n = index + 1
    const total = `V_${n}`
    switch (line.holds) {
      case 'equipment':
        if (line.count.value === 1) {
          need(total, 'volume', line.label, line.each)
          break
        }
        need(`N_${n}`, 'count', `${line.label}, number`, line.count)
        need(`U_${n}`, 'volume', `${line.label}, each`, line.each)
        steps[total] = step('volume', line.label, `N_${n} * U_${n}`, cite(geometry, 'sum'))
        break
      case 'pipe':
        need(`d_${n}`, 'diameter', `${line.label}, inside diameter`, line.insideDiameter)
        need(`L_${n}`, 'length', `${line.label}, length`, line.length)
        steps[total] = step('volume', line.label, `pi / 4 * d_${n} ^ 2 * L_${n}`, cite(geometry, 'content of a tube'))
        break
      case 'estimate':
        need(`c_${n}`, 'volume per power', `${line.label}, content per output`, line.content)
        need(`Q_${n}`, 'power', `${line.label}, output`, line.output)
        steps[total] = step('volume', line.label, `c_${n} * Q_${n}`, cite(commonPractice, 'content by emitter class'))
        break
      case 'volume':
        need(total, 'volume', line.label, line.volume)
        break
    }
    return { total, material: line.material }
  })
  const all = volumes.map((volume) => volume.total)
  steps['V_s'] = step('volume', 'system volume', sum(all), cite(geometry, 'sum of the contents'))
  if (withMaterials) {
    const of = (material: string) => sum(volumes.filter((v) => v.material === material).map((v) => v.total))
    steps['V_st'] = step('volume', 'volume held by steel', of('steel'), cite(geometry, 'sum of the contents'))
    steps['V_cu'] = step('volume', 'volume held by copper', of('copper'), cite(geometry, 'sum of the contents'))
  }
  const method = defineMethod({
    id: 'section.contents',
    revision: 1,
    title: 'Contents',
    inputs,
    steps,
    checks: [
      {
        condition: 'V_s > 0[L]',
        code: 'CF-E002',
        message: 'The system holds no water: every line of its contents comes to zero.',
        hint: 'Give at least one line under `contents` with a volume above zero.',
      },
    ],
    results: { 'system-volume': 'V_s' },
    basis: 'The system volume is the sum of the contents listed in the spec.',
    examples: [],
  })
  return { method, given: values }
}

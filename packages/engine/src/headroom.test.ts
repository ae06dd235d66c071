import { describe, expect, it } from 'vitest'
import { Calculation } from './calculation.ts'
import { water } from './fluids/index.ts'
import { limitOf, recompute, sensitivities } from './headroom.ts'
import { ashraeDiaphragm } from './methods/expansion-tank/ashrae-diaphragm.ts'
import type { TraceInput } from './trace.ts'

const calculation = () => {
  const given = (value: number) => ({ value, origin: { from: 'spec', path: '' } as const })
  const made = new Calculation('ET-1', water.functions)
  made.section('Vessel')
  made.run(ashraeDiaphragm, {
    V_s: given(11.356),
    t_l: given(277.6),
    t_h: given(377.6),
    alpha: given(11.7e-6),
    P_a: given(101325),
    p_f: given(68948),
    p_max: given(172369),
  })
  return made.trace.flatMap((section) => section.entries)
}

describe('headroom', () => {
  const entries = calculation()
  const now = entries.find((entry) => entry.symbol === 'V_t')?.value ?? Number.NaN
  const inputs = entries.filter((entry): entry is TraceInput => entry.entry === 'input')

  it('has the exact derivative for every input', () => {
    const exact = sensitivities(entries, water.functions, 'V_t')
    for (const input of inputs) {
      // Central difference: the error of a step h is of the order of h squared, of rounding 1e-16 / h.
      const h = Math.abs(input.value) * 1e-5
      const at = (value: number) => recompute(entries, water.functions, input.symbol, value)['V_t'] ?? Number.NaN
      const slope = (at(input.value + h) - at(input.value - h)) / (2 * h)
      expect(Math.abs((exact[input.symbol] ?? Number.NaN) / slope - 1), input.symbol).toBeLessThan(1e-6)
    }
  })

  it('finds where a chosen vessel stops being enough: its volume is then exactly what is required', () => {
    const chosen = now * 1.1
    const enough = (values: Readonly<Record<string, number>>) => {
      const required = values['V_t'] ?? Number.NaN
      return Number.isFinite(required) && required > 0 ? required <= chosen : null
    }
    const exact = sensitivities(entries, water.functions, 'V_t')
    for (const input of inputs) {
      const direction = (exact[input.symbol] ?? 0) > 0 ? 1 : -1
      const limit = limitOf(entries, water.functions, input, direction, enough)
      if (limit === null) continue
      const there = recompute(entries, water.functions, input.symbol, limit)['V_t'] ?? Number.NaN
      expect(Math.abs(there / chosen - 1), input.symbol).toBeLessThan(1e-9)
    }
    // By hand: the required volume is in proportion to the system volume.
    const volume = inputs.find((input) => input.symbol === 'V_s')
    expect(
      volume && limitOf(entries, water.functions, volume, 1, (values) => (values['V_t'] ?? Infinity) <= chosen),
    ).toBeCloseTo(11.356 * 1.1, 9)
  })

  it('says so where an input has no limit in reach', () => {
    const volume = inputs.find((input) => input.symbol === 'V_s')
    expect(
      volume && limitOf(entries, water.functions, volume, -1, (values) => (values['V_t'] ?? Infinity) <= now * 1.1),
    ).toBeNull()
  })
})

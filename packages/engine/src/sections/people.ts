import type { GivenValue } from '../calculation.ts'
import { cite } from '../citation.ts'
import { defineMethod, given, step, type Method } from '../method.ts'
import { geometry } from '../sources/geometry.ts'
import { personDayDemand, personDemandSource, personPeakDemand } from '../tables/ashrae-service-water.people.ts'

export type DemandLevel = 'low' | 'medium' | 'high'

export const isDemandLevel = (text: string): text is DemandLevel =>
  text === 'low' || text === 'medium' || text === 'high'

const GALLON = 3.785411784e-3

const drawn = (gallons: number): GivenValue => ({
  value: gallons * GALLON,
  origin: { from: 'table', citation: personDemandSource },
  authored: `${gallons} gal`,
})
const within = (minutes: number): GivenValue => ({
  value: minutes * 60,
  origin: { from: 'table', citation: personDemandSource },
  authored: `${minutes} min`,
})

/**
 * What a person draws in the peak of length `tau` (s), `V_pk`, read from the handbook table or between two of its rows,
 * and in one, two and three hours and the largest day. Null where the peak is shorter or longer than the table reaches.
 */
export const people = (
  level: DemandLevel,
  tau: GivenValue,
): { method: Method; given: Record<string, GivenValue> } | null => {
  const minutes = tau.value / 60
  const near = (row: { readonly minutes: number }) => Math.abs(row.minutes - minutes) < 1e-9
  const exact = personPeakDemand.find(near)
  const below = personPeakDemand.findLast((row) => row.minutes < minutes)
  const above = personPeakDemand.find((row) => row.minutes > minutes)
  if (!exact && (!below || !above)) return null
  const at = (period: number): GivenValue => {
    const row = personPeakDemand.find((each) => each.minutes === period)
    if (!row) throw new Error(`no row of ${period} min`)
    return drawn(row[level])
  }
  const inputs: Record<string, ReturnType<typeof given>> = {
    tau: given('time', 'length of the peak'),
    V_60: given('volume', 'draw of a person in one hour'),
    V_120: given('volume', 'draw of a person in two hours'),
    V_180: given('volume', 'draw of a person in three hours'),
    V_d: given('volume', 'draw of a person on the largest day'),
  }
  const values: Record<string, GivenValue> = {
    tau,
    V_60: at(60),
    V_120: at(120),
    V_180: at(180),
    V_d: drawn(personDayDemand.most[level]),
  }
  const read = 'draw of a person in the peak'
  if (exact) {
    inputs['V_pk'] = given('volume', read)
    values['V_pk'] = drawn(exact[level])
  } else if (below && above) {
    Object.assign(inputs, {
      tau_a: given('time', 'shorter period of the table'),
      tau_b: given('time', 'longer period of the table'),
      V_a: given('volume', 'draw of a person in the shorter period'),
      V_b: given('volume', 'draw of a person in the longer period'),
    })
    Object.assign(values, {
      tau_a: within(below.minutes),
      tau_b: within(above.minutes),
      V_a: drawn(below[level]),
      V_b: drawn(above[level]),
    })
  }
  const method = defineMethod({
    id: 'section.people',
    revision: 1,
    title: 'Demand',
    inputs,
    steps: exact
      ? {}
      : {
          V_pk: step(
            'volume',
            read,
            'V_a + (V_b - V_a) * (tau - tau_a) / (tau_b - tau_a)',
            cite(geometry, 'straight line between two rows of the table'),
          ),
        },
    checks: [],
    results: {},
    basis: 'The draw of a person is that of the handbook table for the length of the peak.',
    examples: [],
  })
  return { method, given: values }
}

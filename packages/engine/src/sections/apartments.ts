import type { GivenValue } from '../calculation.ts'
import { cite } from '../citation.ts'
import { defineMethod, given, step, type Method, type MethodInput, type MethodStep } from '../method.ts'
import { geometry } from '../sources/geometry.ts'
import { apartmentDemand, apartmentDemandSource } from '../tables/ashrae-service-water.apartments.ts'

const GALLON = 3.785411784e-3
const line = cite(geometry, 'straight line between two rows of the table')

const columns = [
  { symbol: 'h', of: 'mostInAnHour', words: 'draw of an apartment in the busiest hour' },
  { symbol: 'd', of: 'mostInADay', words: 'draw of an apartment on the largest day' },
  { symbol: 'm', of: 'averageDay', words: 'draw of an apartment on an average day' },
] as const

/**
 * What one of so many apartments draws: in the busiest hour `V_h`, on the largest day `V_d` and on an average day `V_m`,
 * read from the handbook table or between two of its rows. The first row holds for 20 or fewer, the last for 200 or more.
 */
export const apartments = (number: GivenValue): { method: Method; given: Record<string, GivenValue> } => {
  const count = Math.min(200, Math.max(20, number.value))
  const inputs: Record<string, MethodInput> = { n_a: given('count', 'apartments') }
  const steps: Record<string, MethodStep> = {}
  const values: Record<string, GivenValue> = { n_a: number }
  const table = (value: number, unit = ''): GivenValue => ({
    value: unit === 'gal' ? value * GALLON : value,
    origin: { from: 'table', citation: apartmentDemandSource },
    authored: `${value} ${unit}`.trim(),
  })
  const exact = apartmentDemand.find((row) => row.apartments === count)
  const below = apartmentDemand.findLast((row) => row.apartments < count)
  const above = apartmentDemand.find((row) => row.apartments > count)
  if (!exact && below && above) {
    inputs['n_1'] = given('count', 'apartments, smaller row of the table')
    inputs['n_2'] = given('count', 'apartments, larger row of the table')
    values['n_1'] = table(below.apartments)
    values['n_2'] = table(above.apartments)
  }
  for (const { symbol, of, words } of columns) {
    if (exact) {
      inputs[`V_${symbol}`] = given('volume', words)
      values[`V_${symbol}`] = table(exact[of], 'gal')
    } else if (below && above) {
      const [from, to] = [`V_${symbol}1`, `V_${symbol}2`]
      inputs[from] = given('volume', `${words}, smaller row`)
      inputs[to] = given('volume', `${words}, larger row`)
      values[from] = table(below[of], 'gal')
      values[to] = table(above[of], 'gal')
      steps[`V_${symbol}`] = step('volume', words, `${from} + (${to} - ${from}) * (n_a - n_1) / (n_2 - n_1)`, line)
    }
  }
  const method = defineMethod({
    id: 'section.apartments',
    revision: 1,
    title: 'Demand',
    inputs,
    steps,
    checks: [],
    results: {},
    basis: 'The draw of an apartment falls as there are more of them; it is that of the handbook table.',
    examples: [],
  })
  return { method, given: values }
}

import type { Method } from '@coldfill/engine'
import { formatQuantity } from '@coldfill/units'
import { gaugeFromSpec } from '../calculate-sections.ts'
import type { ResultValue, SelectedVessel } from '../result.ts'
import { report, type VesselContext } from '../vessel-context.ts'

const BAR = 1e5
const LITRE = 1e-3

/** Upper end of each category for vessels with a gas of group 2, in bar·L (Directive 2014/68/EU, Annex II; from memory). */
const categories = [
  { most: 50, words: 'below the categories: sound engineering practice (Article 4, paragraph 3)' },
  { most: 200, words: 'category I' },
  { most: 1000, words: 'category II' },
  { most: 3000, words: 'category III' },
  { most: Infinity, words: 'category III or IV, by the diagram of the directive' },
]

/** Says the category of a vessel made to EN 13831, by the relief setting at it and the volume of each. `atmosphere` in Pa abs. */
export const sayCategory = (
  context: VesselContext,
  method: Method,
  results: Readonly<Record<string, ResultValue>>,
  selected: SelectedVessel | null,
  atmosphere: number,
): void => {
  const relief = context.system.pressure['relief-valve']
  const required = results['required-volume']?.value
  if (method.product !== 'EN 13831' || !relief || required === undefined) return
  const quantity = context.vessel.fields.quantity?.value ?? 1
  const volume = selected?.volume ?? required / quantity
  const pressure = Math.max(selected?.maxPressure ?? 0, gaugeFromSpec(relief, atmosphere).value)
  const product = (pressure / BAR) * (volume / LITRE)
  const category = categories.find(({ most }) => product <= most)
  const bar = `${(pressure / BAR).toFixed(1)} bar`
  const litres = formatQuantity({ kind: 'volume', value: volume }, 'SI')
  report(context, 'CF-E037', {
    message: `${context.vessel.mark}: ${bar} × ${litres} is ${Math.round(product)} bar·L, ${category?.words}.`,
    hint: selected ? '' : 'A vessel rated higher, or larger than required, may fall into the next category.',
  })
}

import { methodWords, numbersOf, sentenceCase } from '../words/vessel-words.ts'
import { inputNumber, quantity, words } from './schedule.ts'

/** Columns that every schedule has in the same words and place. */
export const serves = words('serves', 'Serves', 17, ({ vessel, system }) => vessel.serves || (system?.title ?? ''))
export const fluid = words('fluid', 'Fluid', 13, ({ vessel }) => sentenceCase(vessel.fluid))
export const construction = words('construction', 'Type', 10, ({ vessel }) => sentenceCase(vessel.construction ?? ''))
export const count = quantity('quantity', 'Qty', 5.5, 'count', ({ vessel }) => vessel.quantity)
export const method = words('method', 'Method', 10, ({ vessel }) => methodWords(vessel.method))
export const assumptions = words('assumptions', 'Assumptions', 13, ({ vessel, result }) =>
  numbersOf(vessel.assumptions, result),
)
export const selectedVolume = quantity('selected-volume', 'Selected volume', 9, 'volume', ({ vessel }) =>
  vessel.selected === null ? null : vessel.selected.volume,
)
export const reliefSet = inputNumber('relief-set', 'Relief set', 8, 'gauge pressure', ['p_rv'], ({ system }) =>
  system?.relief ? system.relief.set : null,
)
export const ratedPressure = quantity('rated-pressure', 'Rated pressure', 9, 'gauge pressure', ({ vessel }) =>
  vessel.selected === null ? null : vessel.selected.maxPressure,
)

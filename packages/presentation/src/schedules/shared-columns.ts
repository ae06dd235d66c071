import { methodWords, numbersOf, sentenceCase } from '../vessel-words.ts'
import type { Kind } from '@coldfill/units'
import {
  filesOnly,
  inputNumber,
  ofSelection,
  optional,
  quantity,
  words,
  type ScheduleColumnDefinition,
  type VesselResult,
} from './schedule.ts'

type Selected = NonNullable<VesselResult['selected']>

/** Columns that every schedule has in the same words and place. */
export const serves = words('serves', 'Serves', 17, ({ vessel, system }) => vessel.serves || (system?.title ?? ''))
export const location = filesOnly(optional(words('location', 'Location', 14, ({ vessel }) => vessel.location)))
export const fluid = words('fluid', 'Fluid', 16, ({ vessel }) => sentenceCase(vessel.fluid))
export const construction = words('construction', 'Type', 10, ({ vessel }) => sentenceCase(vessel.construction ?? ''))
/** A number of vessels is an input where there are several; a single vessel has no step that its number goes into. */
export const count = inputNumber('quantity', 'Qty', 5.5, 'count', ['N_v'], ({ vessel }) => vessel.quantity)
export const method = words('method', 'Method', 10, ({ vessel }) => methodWords(vessel.method))
export const assumptions = words('assumptions', 'Assumptions', 13, ({ vessel, result }) =>
  numbersOf(vessel.assumptions, result),
)
export const reliefSet = inputNumber('relief-set', 'Relief set', 8, 'gauge pressure', ['p_rv'], ({ system }) =>
  system?.relief ? system.relief.set : null,
)

const chosenWords = (key: string, heading: string, width: number, of: (selected: Selected) => string) =>
  ofSelection(words(key, heading, width, ({ vessel }) => (vessel.selected === null ? '' : of(vessel.selected))))
const chosenNumber = (
  key: string,
  heading: string,
  width: number,
  kind: Kind,
  of: (selected: Selected) => number | undefined,
) =>
  ofSelection(
    quantity(key, heading, width, kind, ({ vessel }) =>
      vessel.selected === null ? null : (of(vessel.selected) ?? null),
    ),
  )

/** What the chosen vessel is; none of it is shown in a schedule in which no vessel is chosen. Numbers are of one vessel. */
export const selection: readonly ScheduleColumnDefinition[] = [
  chosenWords(
    'selected-vessel',
    'Selected vessel',
    23,
    ({ quantity: many, maker, model }) => `${many > 1 ? `${many} × ` : ''}${maker} ${model}`,
  ),
  chosenNumber('selected-volume', 'Selected volume', 9, 'volume', ({ volume }) => volume),
  ...[
    chosenNumber('selected-acceptance', 'Acceptance', 11, 'volume', ({ acceptance }) => acceptance),
    chosenNumber('rated-pressure', 'Rated pressure', 9, 'gauge pressure', ({ maxPressure }) => maxPressure),
    chosenNumber('rated-temperature', 'Rated temp.', 8, 'temperature', ({ maxTemperature }) => maxTemperature),
    chosenWords('stamped', 'Stamp', 7, ({ stamped }) => (stamped ? 'Yes' : 'No')),
    chosenWords('connection', 'Connection', 12, ({ connection }) => connection ?? ''),
    chosenWords('mounting', 'Mounting', 10, ({ mounting }) => sentenceCase(mounting ?? '')),
    chosenNumber('diameter', 'Diameter', 9, 'diameter', ({ diameter }) => diameter),
    chosenNumber('height', 'Height', 8, 'diameter', ({ height }) => height),
    chosenNumber('weight-empty', 'Weight empty', 8, 'mass', ({ weightEmpty }) => weightEmpty),
  ].map(filesOnly),
]

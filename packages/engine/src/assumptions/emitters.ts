import { defineAssumption, type Assumption } from '../assumption.ts'
import { citeFromMemory } from '../citation.ts'
import { bs7074 } from '../sources/bs-7074.ts'
import { din4807Part2 } from '../sources/din-4807-2.ts'

const content = (id: string, name: string, value: string, source: Assumption['source'], why: string): Assumption =>
  defineAssumption({
    id: `content.${id}`,
    name: `water content per output, ${name}`,
    kind: 'volume per power',
    value,
    source,
    because: `${why} An estimate of this kind is good to ±30 %; a take-off of the contents replaces it.`,
    overriddenBy: 'assumptions',
  })

const planning = citeFromMemory(din4807Part2, 'planning values of the content per output')

const range = (least: number, most: number): string =>
  `The upper end of the published range of ${least} to ${most} L/kW, so the vessel comes out larger, never smaller. Holds for about 20 K between flow and return at high temperature.`

/** Content of a system per output by its emitters, keyed by the name that a spec gives after `estimate:`. */
export const emitterClasses: Readonly<Record<string, Assumption>> = {
  convectors: content('convectors', 'convectors', '6 L/kW', planning, range(5, 6)),
  'air handlers and fan coils': content('air-handlers', 'air handlers and fan coils', '8 L/kW', planning, range(7, 8)),
  'panel radiators': content('panel-radiators', 'panel radiators', '11 L/kW', planning, range(9, 11)),
  'column radiators': content('column-radiators', 'column radiators', '14 L/kW', planning, range(12, 14)),
  underfloor: content(
    'underfloor',
    'underfloor heating',
    '23 L/kW',
    planning,
    'The upper end of the published range of 18 to 23 L/kW, so the vessel comes out larger, never smaller.',
  ),
  'district or long runs': content(
    'district',
    'district heating or long runs',
    '26 L/kW',
    planning,
    'The upper end of the published range of 20 to 26 L/kW, so the vessel comes out larger, never smaller.',
  ),
  'heating plant': content(
    'heating-plant',
    'heating plant',
    '12 L/kW',
    citeFromMemory(bs7074, 'rule for the content of a heating system, as on calculation sheets'),
    'First figure for a whole heating system by the output of its plant; other rules say 12.9 and 14 L/kW, so the vessel may come out small by a sixth.',
  ),
  'chilled plant': content(
    'chilled-plant',
    'chilled-water plant',
    '18 L/kW',
    citeFromMemory(bs7074, 'rule for the content of a chilled-water system, as on calculation sheets'),
    'First figure for a whole chilled-water system by the output of its plant; no range is published.',
  ),
}

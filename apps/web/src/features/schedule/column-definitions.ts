import type { ProjectResult } from '@coldfill/contract'
import type { Kind } from '@coldfill/units'
import { capital } from '#lib/format.ts'
import type { System, Vessel } from '#lib/sized-project.ts'

/** What a column may look at beside the vessel itself. */
export interface VesselContext {
  readonly vessel: Vessel
  readonly system: System | undefined
  readonly result: ProjectResult
}

interface Base {
  readonly key: string
  readonly heading: string
}

export type ColumnDefinition = Base &
  (
    | { readonly shows: 'words'; readonly words: (context: VesselContext) => string; readonly mono?: true }
    /** A result of the vessel: the key is its name, which redlines use too. */
    | { readonly shows: 'result'; readonly kind: Kind }
    /** An input of the calculation, by the symbols it may have. */
    | { readonly shows: 'input'; readonly kind: Kind; readonly symbols: readonly string[] }
    /** A number that is no part of the calculation. SI; null where it does not apply. */
    | { readonly shows: 'quantity'; readonly kind: Kind; readonly number: (context: VesselContext) => number | null }
  )

const words = (key: string, heading: string, text: (context: VesselContext) => string): ColumnDefinition => ({
  shows: 'words',
  key,
  heading,
  words: text,
})
const result = (key: string, heading: string, kind: Kind): ColumnDefinition => ({ shows: 'result', key, heading, kind })
const input = (key: string, heading: string, kind: Kind, symbols: readonly string[]): ColumnDefinition => ({
  shows: 'input',
  key,
  heading,
  kind,
  symbols,
})

const serves = words('serves', 'Serves', ({ vessel, system }) => vessel.serves || (system?.title ?? ''))
const construction = words('construction', 'Type', ({ vessel }) => capital(vessel.construction ?? ''))
const fluid = words('fluid', 'Fluid', ({ vessel }) => capital(vessel.fluid))
const count = words('quantity', 'Qty', ({ vessel }) => String(vessel.quantity))
/** Methods as drawings write them: initials of standards bodies in capitals. */
const methodWords = (method: string): string =>
  capital(method.replaceAll(/\b(?:ashrae|en|une|bs|din|aspe)\b/g, (initials) => initials.toUpperCase()))
const method = words('method', 'Method', ({ vessel }) => methodWords(vessel.method))
/** `A1–A3, A5` of 1, 2, 3 and 5. */
export const numberRanges = (numbers: readonly number[]): string => {
  const sorted = numbers.toSorted((a, b) => a - b)
  const runs: { first: number; last: number }[] = []
  for (const number of sorted) {
    const run = runs.at(-1)
    if (run && number === run.last + 1) run.last = number
    else runs.push({ first: number, last: number })
  }
  const words = runs.map(({ first, last }) =>
    first === last ? `A${first}` : `A${first}${last === first + 1 ? ', ' : '–'}A${last}`,
  )
  return words.join(', ')
}
const assumptions: ColumnDefinition = {
  shows: 'words',
  key: 'assumptions',
  heading: 'Assumptions',
  mono: true,
  words: ({ vessel, result: { assumptions: used } }) =>
    numberRanges(used.filter((one) => vessel.assumptions.includes(one.id)).map((one) => Number(one.number.slice(1)))),
}
const selectedVessel = words('selected-vessel', 'Selected vessel', ({ vessel: { selected } }) =>
  selected ? `${selected.quantity > 1 ? `${selected.quantity} × ` : ''}${selected.maker} ${selected.model}` : '',
)
const selectedVolume: ColumnDefinition = {
  shows: 'quantity',
  key: 'selected-volume',
  heading: 'Selected volume',
  kind: 'volume',
  number: ({ vessel }) => vessel.selected?.volume ?? null,
}
const reliefSet: ColumnDefinition = {
  shows: 'quantity',
  key: 'relief-set',
  heading: 'Relief set',
  kind: 'gauge pressure',
  number: ({ system }) => system?.relief?.set ?? null,
}

const byKind: Readonly<Record<string, readonly ColumnDefinition[]>> = {
  'expansion tank': [
    serves,
    construction,
    fluid,
    count,
    result('system-volume', 'System volume', 'volume'),
    input('low-temperature', 'Lowest temp.', 'temperature', ['t_l', 't_low']),
    input('high-temperature', 'Highest temp.', 'temperature', ['t_h', 't_high', 't_max']),
    result('expansion-volume', 'Expansion volume', 'volume'),
    result('required-volume', 'Required volume', 'volume'),
    selectedVessel,
    selectedVolume,
    result('fill-pressure', 'Fill pressure', 'gauge pressure'),
    result('precharge', 'Precharge', 'gauge pressure'),
    result('maximum-pressure', 'Maximum pressure', 'gauge pressure'),
    result('final-pressure', 'Final pressure', 'gauge pressure'),
    reliefSet,
    method,
    assumptions,
  ],
  'thermal expansion tank': [
    serves,
    construction,
    count,
    result('system-volume', 'Heated volume', 'volume'),
    input('cold-temperature', 'Cold water temp.', 'temperature', ['t_c', 't_cold', 't_l', 't_low']),
    input('storage-temperature', 'Storage temp.', 'temperature', ['t_h', 't_hot', 't_s', 't_high']),
    result('expansion-volume', 'Expansion volume', 'volume'),
    result('required-volume', 'Required volume', 'volume'),
    selectedVessel,
    selectedVolume,
    result('fill-pressure', 'Supply pressure', 'gauge pressure'),
    result('precharge', 'Precharge', 'gauge pressure'),
    result('maximum-pressure', 'Maximum pressure', 'gauge pressure'),
    result('final-pressure', 'Final pressure', 'gauge pressure'),
    reliefSet,
    method,
    assumptions,
  ],
}

/** Columns of the schedule of a kind. A kind without columns of its own shows every result that one of its vessels has. */
export const columnsOf = (kind: string, project: ProjectResult): readonly ColumnDefinition[] => {
  const vessels = project.vessels.filter((vessel) => vessel.kind === kind)
  const chosen = vessels.some((vessel) => vessel.selected !== null)
  const isShown = ({ key }: ColumnDefinition): boolean => {
    if (key === 'selected-vessel' || key === 'selected-volume') return chosen
    // A result that only some methods give takes a column only where a vessel has it.
    return key !== 'final-pressure' || vessels.some((vessel) => vessel.results[key])
  }
  const defined = byKind[kind]
  if (defined) return defined.filter(isShown)
  const found = new Map<string, ColumnDefinition>()
  for (const vessel of vessels) {
    for (const [key, value] of Object.entries(vessel.results))
      if (!found.has(key)) found.set(key, result(key, capital(value.name), value.kind))
  }
  return [serves, count, ...found.values(), selectedVessel, selectedVolume, method, assumptions].filter(isShown)
}

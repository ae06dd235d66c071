import {
  type CatalogueRow,
  fullWeight,
  type Method,
  methods,
  type Requirement,
  selectRow,
  type Selection,
} from '@coldfill/engine'
import { gaugeFromSpec } from './calculate-sections.ts'
import { stampReasons } from './checks/stamp.ts'
import { column, densityAsFilled } from './pressure-model.ts'
import type { ResultValue, SelectedVessel } from './result.ts'
import { report, show, type VesselContext } from './vessel-context.ts'

/** Pressure that the vessel has to stand, gauge Pa: the relief setting at its height, or its highest pressure. */
const pressureToStand = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): number => {
  const { pressure } = context.system
  const set = pressure['relief-valve']
  const highest = results['maximum-pressure']?.value ?? 0
  if (!set) return highest
  const lift = column(densityAsFilled(context.system, context.fluid), pressure['relief-height']?.value.value ?? 0)
  return Math.max(highest, gaugeFromSpec(set, atmosphere).value + lift)
}

const requirementOf = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  construction: string | undefined,
  atmosphere: number,
): Requirement | null => {
  const volume = results['required-volume']?.value
  if (volume === undefined) return null
  const { system, vessel } = context
  const { temperatures } = system
  const fields: Readonly<Record<string, { readonly value: unknown } | undefined>> = vessel.fields
  const expansion = results['expansion-volume']?.value
  const reserve = results['water-reserve']?.value ?? 0
  const takesUp = construction === 'diaphragm' || construction === 'bladder' || vessel.kind === 'thermal expansion tank'
  const service = system.service?.value
  const drawdown = vessel.kind === 'pressure tank' ? results['drawdown']?.value : undefined
  const stamp = fields['stamp']?.value
  const mounting = fields['mounting']?.value
  return {
    kind: vessel.kind,
    construction: vessel.kind === 'expansion tank' ? (construction ?? null) : null,
    volume,
    acceptance: drawdown ?? (takesUp && expansion !== undefined ? expansion + reserve : null),
    pressure: pressureToStand(context, results, atmosphere),
    temperature: Math.max(...Object.values(temperatures).map((t) => t?.value.value ?? 0), 0),
    potable: service === 'domestic hot water' || service === 'domestic cold water',
    stamped: typeof stamp === 'boolean' ? stamp : stampReasons(context, results, atmosphere).length > 0,
    mounting: typeof mounting === 'string' ? mounting : null,
    quantity: vessel.fields.quantity?.value ?? null,
  }
}

const label = (row: CatalogueRow): string => `${row.maker} ${row.model}`

/** Largest vessel that is usually hung, 15 gal in m3. */
const LARGEST_HUNG = 15 * 3.785411784e-3

const sayHung = (context: VesselContext, row: CatalogueRow): void => {
  if (row.mounting !== 'hung' || row.volume <= LARGEST_HUNG * 1.001) return
  report(context, 'CF-E035', {
    message: `${context.vessel.mark} is ${label(row)}, ${show(context, 'volume', row.volume)}, hung; vessels above 15 gal (57 L) usually stand on the floor.`,
    hint: 'Write `mounting: floor`, or show the supports.',
  })
}

const sayNear = (context: VesselContext, selection: Selection): void => {
  const { choice, nearMiss, ties } = selection
  if (!choice) return
  const parts: string[] = []
  if (nearMiss)
    parts.push(
      `the next size down, ${label(nearMiss.row)}, falls short by ${show(context, 'volume', nearMiss.short)} of ${nearMiss.of}`,
    )
  if (ties.length > 0) parts.push(`${ties.map(label).join(', ')} would do as well`)
  if (parts.length === 0) return
  report(context, 'CF-E034', {
    message: `${context.vessel.mark} is ${choice.quantity > 1 ? `${choice.quantity} × ` : ''}${label(choice.row)}; ${parts.join('; ')}.`,
    hint: '',
  })
}

const selectedFrom = (row: CatalogueRow, quantity: number): SelectedVessel => ({
  maker: row.maker,
  model: row.model,
  volume: row.volume,
  ...(row.acceptance === null ? {} : { acceptance: row.acceptance }),
  maxPressure: row.maxPressure,
  maxTemperature: row.maxTemperature,
  ...(row.diameter === null ? {} : { diameter: row.diameter }),
  ...(row.height === null ? {} : { height: row.height }),
  ...(row.weightEmpty === null ? {} : { weightEmpty: row.weightEmpty }),
  ...(row.connection === null ? {} : { connection: row.connection }),
  ...(row.mounting === null ? {} : { mounting: row.mounting }),
  stamped: row.stamped,
  quantity,
})

const besides = ({ nearMiss, ties }: Selection): Pick<SelectedVessel, 'nextDown' | 'ties'> => ({
  ...(nearMiss
    ? {
        nextDown: {
          maker: nearMiss.row.maker,
          model: nearMiss.row.model,
          volume: nearMiss.row.volume,
          short: nearMiss.short,
          of: nearMiss.of,
        },
      }
    : {}),
  ...(ties.length > 0 ? { ties: ties.map(({ maker, model }) => ({ maker, model })) } : {}),
})

const namedRow = (context: VesselContext, rows: readonly CatalogueRow[], need: Requirement): SelectedVessel | null => {
  const { selection } = context.vessel
  if (selection.choose !== 'row') return null
  const same = (a: string, b: string) => a.trim().toLowerCase() === b.trim().toLowerCase()
  const row = rows.find((candidate) => same(candidate.maker, selection.maker) && same(candidate.model, selection.model))
  if (!row) {
    report(context, 'CF-E032', {
      message: `${selection.maker} ${selection.model} does not stand in the catalogue.`,
      hint: 'Correct the maker or model, or add the row.',
      at: selection,
    })
    return null
  }
  const alone = selectRow([row], { ...need, quantity: need.quantity ?? 1 })
  if (!alone.choice) {
    const why = alone.nearMiss
      ? `it falls short by ${show(context, 'volume', alone.nearMiss.short)} of ${alone.nearMiss.of}`
      : `its ${Object.keys(alone.refusals).join(' and ')} does not satisfy the duty`
    report(context, 'CF-E033', {
      message: `${label(row)} cannot be ${context.vessel.mark}: ${why}.`,
      hint: 'Choose another row, or write `selection: auto`.',
      at: selection,
    })
  }
  sayHung(context, row)
  return selectedFrom(row, need.quantity ?? 1)
}

/** Chooses a vessel from the catalogue, or checks the one that the spec fixes. Null where none is chosen. */
export const selectVessel = (
  context: VesselContext,
  rows: readonly CatalogueRow[] | undefined,
  results: Readonly<Record<string, ResultValue>>,
  construction: string | undefined,
  atmosphere: number,
): SelectedVessel | null => {
  const { selection, mark } = context.vessel
  if (selection.choose === 'none' || !rows) return null
  const need = requirementOf(context, results, construction, atmosphere)
  if (!need) return null
  if (selection.choose === 'row') return namedRow(context, rows, need)
  const found = selectRow(rows, need)
  if (!found.choice) {
    const why = found.nearMiss
      ? `the largest that fits otherwise, ${label(found.nearMiss.row)}, falls short by ${show(context, 'volume', found.nearMiss.short)} of ${found.nearMiss.of}`
      : `no row has the ${Object.keys(found.refusals).join(', ') || 'kind'} it needs`
    report(context, 'CF-E031', {
      message: `No vessel of the catalogue fits ${mark}: ${why}.`,
      hint: 'Add vessels to the catalogue, or write `selection: none`.',
    })
    return null
  }
  sayNear(context, found)
  sayHung(context, found.choice.row)
  return { ...selectedFrom(found.choice.row, found.choice.quantity), ...besides(found) }
}

const resultsAs = (context: VesselContext, results: Method['results']): Record<string, ResultValue> =>
  Object.fromEntries(
    Object.entries(results).map(([name, symbol]) => {
      const entry = context.calculation.entry(symbol)
      return [name, { kind: entry.kind, value: entry.value, name: entry.name, entry: entry.id }]
    }),
  )

/** What the structure has to carry, where the catalogue has the empty weight. */
export const weighVessel = (context: VesselContext, selected: SelectedVessel): Record<string, ResultValue> => {
  if (selected.weightEmpty === undefined) return {}
  const origin = { from: 'catalogue' } as const
  context.calculation.section('Weight')
  context.calculation.run(fullWeight, {
    W_0: { value: selected.weightEmpty, origin },
    V_1c: { value: selected.volume, origin },
  })
  return resultsAs(context, fullWeight.results)
}

/** What becomes of the pressures with the chosen vessel. */
export const checkBack = (
  context: VesselContext,
  method: Method,
  selected: SelectedVessel,
): Record<string, ResultValue> => {
  const back = method.checkBack === undefined ? undefined : methods[method.checkBack]
  if (!back) return {}
  const { calculation } = context
  calculation.section('Check with the chosen vessel')
  calculation.input('V_c', 'volume', 'volume of the chosen vessels together', {
    value: selected.volume * selected.quantity,
    origin: { from: 'catalogue' },
  })
  const outcome = calculation.run(back, {})
  const [failed] = outcome.failed
  if (failed) {
    report(context, 'CF-E030', { message: `${context.vessel.mark}: ${failed.message}`, hint: failed.hint })
    return {}
  }
  return resultsAs(context, back.results)
}

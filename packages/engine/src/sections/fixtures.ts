import type { GivenValue } from '../calculation.ts'
import { cite } from '../citation.ts'
import { defineMethod, given, step, type Method, type MethodInput, type MethodStep } from '../method.ts'
import { ashraeServiceWater } from '../sources/ashrae-service-water.ts'
import {
  demandFactor,
  demandFactorSource,
  type DemandBuilding,
  fixtureDemandSource,
  storageFactor,
} from '../tables/ashrae-service-water.fixture-demand.ts'

/** Fixtures of one sort: how many, and the hot water that each draws in an hour, m3/s. */
export interface FixtureLine {
  readonly label: string
  readonly number: GivenValue
  readonly each: GivenValue
}

const perHour = cite(ashraeServiceWater, 'possible demand: number of fixtures and demand of each')

/**
 * The possible demand of all fixtures as a method made for these lines: one step a line and their sum `q_f`, with the
 * demand factor `f_d` and the storage factor `f_s` of the building. The data predate low-flow fixtures.
 */
export const fixtures = (
  lines: readonly FixtureLine[],
  building: DemandBuilding,
): { method: Method; given: Record<string, GivenValue> } => {
  const inputs: Record<string, MethodInput> = {}
  const steps: Record<string, MethodStep> = {}
  const values: Record<string, GivenValue> = {}
  for (const [index, { label, number, each }] of lines.entries()) {
    const n = index + 1
    inputs[`n_${n}`] = given('count', `${label}, number`)
    inputs[`g_${n}`] = given('hourly flow', `${label}, demand of each`)
    values[`n_${n}`] = number
    values[`g_${n}`] = each
    steps[`q_${n}`] = step('hourly flow', label, `n_${n} * g_${n}`, perHour)
  }
  steps['q_f'] = step('hourly flow', 'possible demand', Object.keys(steps).join(' + ') || '0[gph]', perHour)
  inputs['f_d'] = given('ratio', 'demand factor')
  inputs['f_s'] = given('ratio', 'storage factor')
  const factor = (value: number): GivenValue => ({ value, origin: { from: 'table', citation: demandFactorSource } })
  values['f_d'] = factor(demandFactor[building])
  values['f_s'] = factor(storageFactor[building])
  const method = defineMethod({
    id: 'section.fixtures',
    revision: 1,
    title: 'Demand',
    inputs,
    steps,
    checks: [
      {
        condition: 'q_f > 0[gph]',
        code: 'CF-E014',
        message: 'The fixtures draw no hot water: every line comes to zero.',
        hint: 'Give at least one fixture under `demand.fixtures`.',
      },
    ],
    results: { 'possible-demand': 'q_f' },
    basis:
      'The possible demand is the sum of the fixtures of the spec by the handbook table for the building. The table predates low-flow fixtures and is usually high.',
    examples: [],
  })
  return { method, given: values }
}

/** An hourly demand of the fixture table, gal/h, as the input of a calculation. */
export const fixtureFigure = (gallonsPerHour: number): GivenValue => ({
  value: gallonsPerHour * (3.785411784e-3 / 3600),
  origin: { from: 'table', citation: fixtureDemandSource },
  authored: `${gallonsPerHour} gph`,
})

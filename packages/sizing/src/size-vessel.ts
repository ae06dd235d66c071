import {
  Calculation,
  type CatalogueRow,
  equalShares,
  type Fluid,
  type Method,
  methodNames,
  type RunOutcome,
  type TraceSection,
} from '@coldfill/engine'
import type { Finding, SpecModel, SystemModel, VesselModel } from '@coldfill/spec'
import { chooseMethod } from './choose-method.ts'
import type { AssumptionRegister } from './assumption-register.ts'
import { bindInputs } from './bind-inputs.ts'
import { runSection } from './calculate-sections.ts'
import { checkUnusedKeys } from './checks/unused-keys.ts'
import { checkVessel } from './checks/check-vessel.ts'
import { headroomRows } from './headroom-rows.ts'
import { type PressureModel, pressureModel } from './pressure-model.ts'
import type { HeadroomRow, ResultValue, SelectedVessel, VesselResult, VesselStatus } from './result.ts'
import { checkBack, selectVessel, weighVessel } from './select-vessel.ts'
import { report, show, type VesselContext } from './vessel-context.ts'

interface Outcome {
  readonly status: VesselStatus
  readonly reason?: string
}

const sized: Outcome = { status: 'sized' }

/** What stands in the way after a method or section ran: the first failed check, or a step without a value. */
const obstacle = (context: VesselContext, outcome: RunOutcome): Outcome | null => {
  const [check] = outcome.failed
  if (check) {
    report(context, check.code as never, { message: `${context.vessel.mark}: ${check.message}`, hint: check.hint })
    return { status: 'infeasible', reason: check.message }
  }
  if (outcome.notFinite !== null) {
    const name = context.calculation.entry(outcome.notFinite).name
    const message = `the ${name} has no finite value with these inputs.`
    report(context, 'CF-E005', {
      message: `${context.vessel.mark}: ${message}`,
      hint: 'Check the temperatures and pressures.',
    })
    return { status: 'infeasible', reason: message }
  }
  for (const range of outcome.warnings) {
    report(context, 'CF-E013', {
      message: `${context.vessel.mark}: ${range.message}`,
      hint: 'Size by another method, or accept the finding with a reason.',
    })
  }
  return null
}

const blockedByMissing = (context: VesselContext): Outcome | null => {
  const [reason] = context.blocked
  if (reason !== undefined) return { status: 'blocked', reason }
  const [first] = context.missing
  if (first === undefined) return null
  const message = `${context.vessel.mark} needs ${first}.`
  report(context, 'CF-E001', { message, hint: 'Add the key that is named.' })
  return { status: 'blocked', reason: message }
}

const outsideFluid = (context: VesselContext): Outcome | null => {
  const { fluid, system, vessel } = context
  if (system.service?.value === 'steam' && fluid.base !== 'water') {
    const message = `a steam system holds water, not ${fluid.label}.`
    report(context, 'CF-E003', {
      message: `${vessel.mark}: ${message}`,
      hint: 'Take `fluid` out.',
      at: system.fluid ?? undefined,
    })
    return { status: 'blocked', reason: `${vessel.mark}: ${message}` }
  }
  for (const located of Object.values(system.temperatures)) {
    if (!located) continue
    const kelvin = located.value.value
    if (kelvin >= fluid.validity.least && kelvin <= fluid.validity.most) continue
    const temperature = (value: number) => show(context, 'temperature', value)
    const message = `${located.value.authored ?? temperature(kelvin)} is outside the range of the data for ${fluid.label}, ${temperature(fluid.validity.least)} to ${temperature(fluid.validity.most)}.`
    const hint =
      fluid.base === 'water'
        ? 'Check the temperature; water data hold from the freezing point up.'
        : 'Raise the strength of the solution, or check the temperature.'
    report(context, 'CF-E003', { message, hint, at: located })
    return { status: 'blocked', reason: `${vessel.mark}: ${message}` }
  }
  return null
}

const run = (context: VesselContext, method: Method, atmosphere: number): Outcome => {
  const outside = outsideFluid(context)
  if (outside) return outside
  for (const section of method.sections ?? []) {
    const outcome = runSection(context, section, atmosphere)
    const stop = blockedByMissing(context) ?? (outcome ? obstacle(context, outcome) : null)
    if (stop) return stop
  }
  for (const id of method.assumes ?? []) context.register.words(id, context.reference)
  context.calculation.section('Vessel')
  const given = bindInputs(context, method, atmosphere)
  const missing = blockedByMissing(context)
  if (missing) return missing
  return obstacle(context, context.calculation.run(method, given)) ?? sized
}

const addResults = (context: VesselContext, method: Method, results: Record<string, ResultValue>): void => {
  const { calculation } = context
  for (const [name, symbol] of Object.entries(method.results)) {
    if (!calculation.has(symbol)) continue
    const entry = calculation.entry(symbol)
    results[name] = { kind: entry.kind, value: entry.value, name: entry.name, entry: entry.id }
  }
}

const shareEqually = (
  context: VesselContext,
  method: Method,
  quantity: number,
  results: Record<string, ResultValue>,
): void => {
  const answer = method.results['required-volume']
  if (quantity <= 1 || answer === undefined) return
  const shares = equalShares(answer)
  context.calculation.section('Vessel')
  context.calculation.run(shares, {
    N_v: { value: quantity, origin: { from: 'spec', path: `${context.vessel.path}.quantity` } },
  })
  addResults(context, shares, results)
}

/** The sections that have entries. Copied, for an array that grew keeps room for more, and there are many. */
const keptTrace = (calculation: Calculation): readonly TraceSection[] => {
  const kept: TraceSection[] = []
  for (const { title, entries } of calculation.trace)
    if (entries.length > 0) kept.push({ title, entries: entries.slice() })
  return kept
}

export interface SizingInput {
  readonly spec: SpecModel
  readonly system: SystemModel
  readonly vessel: VesselModel
  readonly fluid: Fluid
  readonly register: AssumptionRegister
  /** Pa abs */
  readonly atmosphere: number
  /** Rows of the office catalogue; undefined where there is none. */
  readonly catalogue?: readonly CatalogueRow[] | undefined
}

export interface SizedVessel {
  readonly result: VesselResult
  readonly findings: readonly Finding[]
  /** Null where the vessel holds no system under pressure, or has no size. */
  readonly pressures: PressureModel | null
}

/** Sizes one vessel. An infeasible or blocked vessel is a result with its reason; findings come beside it. */
export const sizeVessel = (input: SizingInput): SizedVessel => {
  const { spec, system, vessel, fluid, register, atmosphere } = input
  const reference = `${system.id}/${vessel.mark}`
  const context: VesselContext = {
    spec,
    system,
    vessel,
    fluid,
    register,
    reference,
    calculation: new Calculation(vessel.mark, fluid.functions),
    missing: [],
    blocked: [],
    findings: [],
    said: [],
  }
  const choice = chooseMethod(context)
  const quantity = vessel.fields.quantity?.value ?? 1
  let outcome: Outcome
  const results: Record<string, ResultValue> = {}
  let selected: SelectedVessel | null = null
  let headroom: readonly HeadroomRow[] = []
  if (!vessel.sound || !system.sound) {
    const whose = vessel.sound ? 'its system' : 'its inputs'
    outcome = { status: 'blocked', reason: `An error in ${whose} has to be mended first; see the findings.` }
  } else if (!choice.method) {
    const message = `${vessel.mark}: the method "${choice.name}" has no form for this ${choice.construction ?? 'vessel'}.`
    report(context, 'CF-E004', { message, hint: `Choose one of: ${methodNames(vessel.kind).join(', ')}.` })
    outcome = { status: 'blocked', reason: message }
  } else {
    checkUnusedKeys(context, choice.method)
    outcome = run(context, choice.method, atmosphere)
    if (outcome.status === 'sized') {
      addResults(context, choice.method, results)
      shareEqually(context, choice.method, quantity, results)
      selected = selectVessel(context, input.catalogue, results, choice.construction, atmosphere)
      Object.assign(results, checkVessel(context, choice.method, results, choice.construction, selected, atmosphere))
      headroom = headroomRows(context, choice.method, selected)
      if (selected) Object.assign(results, checkBack(context, choice.method, selected), weighVessel(context, selected))
    }
  }
  const result: VesselResult = {
    system: system.id,
    mark: vessel.mark,
    path: vessel.path,
    kind: vessel.kind,
    method: choice.name,
    methodId: choice.method?.id ?? '',
    methodTitle: choice.method?.title ?? '',
    methodRevision: choice.method?.revision ?? 0,
    ...(choice.construction === undefined ? {} : { construction: choice.construction }),
    quantity,
    serves: vessel.fields.serves?.value ?? system.title?.value ?? system.id,
    service: system.service?.value ?? '',
    fluid: fluid.label,
    solution: { base: fluid.base, massFraction: fluid.massFraction },
    location: vessel.fields.location?.value ?? '',
    notes: vessel.fields.note ? [vessel.fields.note.value] : [],
    status: outcome.status,
    ...(outcome.reason === undefined ? {} : { reason: outcome.reason }),
    results,
    selected,
    headroom,
    trace: keptTrace(context.calculation),
    assumptions: register.usedBy(reference),
  }
  return { result, findings: context.findings, pressures: pressureModel(context, results, atmosphere) }
}

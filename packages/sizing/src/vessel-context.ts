import type { Calculation, Fluid, GivenValue } from '@coldfill/engine'
import type {
  Finding,
  Located,
  Range,
  SaidQuantity,
  Severity,
  SpecModel,
  SystemModel,
  VesselModel,
} from '@coldfill/spec'
import { formatQuantity, type Kind, type Quantity } from '@coldfill/units'
import type { AssumptionRegister } from './assumption-register.ts'
import { engineeringCodes, type EngineeringCode } from './engineering-codes.ts'

/** What sizing one vessel has at hand. */
export interface VesselContext {
  readonly spec: SpecModel
  readonly system: SystemModel
  readonly vessel: VesselModel
  readonly fluid: Fluid
  readonly calculation: Calculation
  readonly register: AssumptionRegister
  /** `HWS/ET-1`, as assumptions name the vessels that lean on them. */
  readonly reference: string
  /** Words for inputs that are missing; the vessel is blocked when there is one. */
  readonly missing: string[]
  /** Reasons, each with a finding of its own already, why the vessel cannot be sized. */
  readonly blocked: string[]
  readonly findings: Finding[]
  /** Quantities said since the last finding. */
  readonly said: SaidQuantity[]
}

/** A quantity for a message, in the units of the project; the finding that has it in its words keeps its value. */
export const show = (context: VesselContext, kind: Kind, value: number): string => {
  const text = formatQuantity({ kind, value }, context.spec.project.units?.value ?? 'US')
  context.said.push({ text, kind, value })
  return text
}

/** A value written in the spec as an input of a calculation. */
export const fromSpec = (located: Located<Quantity>): GivenValue => {
  const { value, authored } = located.value
  const origin = { from: 'spec', path: located.path } as const
  return authored === undefined ? { value, origin } : { value, origin, authored }
}

/** A plain number written in the spec. */
export const numberFromSpec = (located: Located<number>): GivenValue => ({
  value: located.value,
  origin: { from: 'spec', path: located.path },
  authored: String(located.value),
})

interface FindingDetails {
  readonly message: string
  readonly hint: string
  readonly at?: { readonly path: string; readonly range: Range } | undefined
  readonly severity?: Severity
  readonly related?: Finding['related']
}

/** Adds an engineering finding; without a place of its own it stands at the mark of the vessel. */
export const report = (context: VesselContext, code: EngineeringCode, details: FindingDetails): void => {
  const at = details.at ?? context.vessel
  const words = `${details.message} ${details.hint}`
  const quantities = context.said.splice(0).filter(({ text }) => words.includes(text))
  context.findings.push({
    code,
    severity: details.severity ?? engineeringCodes[code].severity,
    message: details.message,
    hint: details.hint,
    path: at.path,
    range: at.range,
    related: details.related ?? [],
    fixes: [],
    ...(quantities.length > 0 ? { quantities } : {}),
  })
}

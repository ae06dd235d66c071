import type { Kind } from '@coldfill/units'
import type { Citation } from './citation.ts'

/** A symbol that a method is given: `V_s`, a volume, "system volume". Values are in the SI unit of the kind. */
export interface MethodInput {
  readonly kind: Kind
  readonly name: string
}

/** A symbol that a method computes by one formula over inputs and earlier steps. */
export interface MethodStep {
  readonly kind: Kind
  readonly name: string
  readonly formula: string
  readonly source: Citation
  /** Name of this step among the results of the vessel (`expansion-volume`), where it is one. */
  readonly result?: string
}

/** A condition over the symbols; when it is false the vessel is infeasible, for this reason and with this way out. */
export interface MethodCheck {
  readonly condition: string
  readonly code: string
  readonly message: string
  readonly hint: string
}

/** A range in which the source states the method to hold. Outside it the result carries a warning; nothing is clamped. */
export interface ValidityRange {
  readonly symbol: string
  readonly least?: string
  readonly most?: string
  readonly source: Citation
  readonly message: string
}

/** Where an expected number comes from. It is never the program's own output. */
export type Origin = 'published' | 'from memory' | 'by hand' | 'derived'

/** A worked example. Quantities are written as in the source, with its units. */
export interface WorkedExample {
  readonly id: string
  readonly title: string
  readonly origin: Origin
  readonly source: Citation
  /** By symbol of input, or of a step whose value the source states instead of computing (as a rounded specific volume). */
  readonly given: Readonly<Record<string, string>>
  readonly expected: Readonly<Record<string, string>>
  /** Relative, from the digits the source prints; `because` says how. */
  readonly tolerance: number
  readonly because: string
}

/** An engineering method as data. Steps are evaluated in order; a key is the symbol. */
export interface Method {
  /** `expansion-tank.ashrae.diaphragm` */
  readonly id: string
  /** Raised whenever a formula, a source or a check of the method changes. */
  readonly revision: number
  readonly title: string
  readonly inputs: Readonly<Record<string, MethodInput>>
  readonly steps: Readonly<Record<string, MethodStep>>
  readonly checks: readonly MethodCheck[]
  readonly validity?: readonly ValidityRange[]
  /** Symbol of the step that is the answer. */
  readonly result: string
  readonly examples: readonly WorkedExample[]
}

export const defineMethod = (method: Method): Method => method

export const given = (kind: Kind, name: string): MethodInput => ({ kind, name })

export const step = (kind: Kind, name: string, formula: string, source: Citation, result?: string): MethodStep =>
  result === undefined ? { kind, name, formula, source } : { kind, name, formula, source, result }

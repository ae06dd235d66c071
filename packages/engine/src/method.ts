import type { Kind } from '@coldfill/units'
import type { Citation } from './citation.ts'

/** Parts of a spec that a method may take a key from. */
export type BindingPlace = 'project' | 'vessel' | 'temperatures' | 'pressure' | 'demand'

/** Where the value of a method's input is found. Sizing follows it; a method file names no other code. */
export type Binding =
  /** An earlier section of the calculation has the symbol: the site, the contents, the pressures. */
  | { readonly at: 'section' }
  /** A key of the spec; where it is not written, an assumption stands in, or the vessel is blocked. */
  | {
      readonly at: BindingPlace
      readonly key: string
      readonly assumption?: string
      /** Another key of the same place whose value stands in, as the assumption in words says. */
      readonly standIn?: string
    }
  | { readonly at: 'assumption'; readonly id: string }
  /** A property of the fluid of the system. */
  | { readonly at: 'fluid'; readonly property: 'volume fraction' }

/** A symbol that a method is given: `V_s`, a volume, "system volume". Values are in the SI unit of the kind. */
export interface MethodInput {
  readonly kind: Kind
  readonly name: string
  readonly from: Binding
}

/** A symbol that a method computes by one formula over inputs and earlier steps. */
export interface MethodStep {
  readonly kind: Kind
  readonly name: string
  readonly formula: string
  readonly source: Citation
}

/** A condition over the symbols; when it is false the vessel is infeasible, for this reason and with this way out. */
export interface MethodCheck {
  readonly condition: string
  /** Finding code, `CF-E…`. */
  readonly code: string
  readonly message: string
  readonly hint: string
}

/** A range in which the source states the method to hold. Outside it the result carries a warning; nothing is clamped. */
export interface ValidityRange {
  /** Condition over the symbols that holds inside the range. */
  readonly condition: string
  readonly source: Citation
  readonly message: string
}

/** Where an expected number comes from. It is never the program's own output. */
export type ExampleOrigin = 'published' | 'from memory' | 'by hand' | 'derived'

/** A worked example. Quantities are written as in the source, with its units. */
export interface WorkedExample {
  readonly id: string
  readonly title: string
  readonly origin: ExampleOrigin
  readonly source: Citation
  /** By symbol of an input, or of a step whose value the source states instead of computing it (a rounded specific volume). */
  readonly given: Readonly<Record<string, string>>
  readonly expected: Readonly<Record<string, string>>
  /** Relative, from the digits the source prints; `because` says how. */
  readonly tolerance: number
  readonly because: string
}

/** Sections of a calculation that come before the vessel's own. Each is documented beside its file in sections/. */
export type SectionId =
  | 'site'
  | 'contents'
  | 'material'
  | 'handbook pressures'
  | 'european pressures'
  | 'british pressures'
  | 'domestic pressures'
  | 'incoming pressure'
  | 'fixtures'
  | 'people'
  | 'apartments'
  | 'units served'

/** An engineering method as data. Steps are evaluated in order; a key is the symbol. */
export interface Method {
  /** `expansion-tank.ashrae.diaphragm` */
  readonly id: string
  /** Raised whenever a formula, a source or a check of the method changes. */
  readonly revision: number
  readonly title: string
  /** Vessel kind and method name as in a spec; absent for a section or a check. */
  readonly vessel?: {
    readonly kind: string
    readonly method: string
    /** Where the spec names no method, this one is meant when all these keys of the vessel are written. */
    readonly impliedBy?: readonly string[]
    /** The first method of the kind and name whose conditions hold is used. */
    readonly when?: {
      readonly construction?: readonly string[]
      /** Keys of the vessel that must be written. */
      readonly written?: readonly string[]
      /** Keys of the vessel that must be written with one of these words. */
      readonly chosen?: Readonly<Record<string, readonly string[]>>
      /** Materials of the contents must be given. */
      readonly materials?: true
      /** The fluid must be a glycol solution. */
      readonly glycol?: true
    }
  }
  /** Sections to compute first, in order. */
  readonly sections?: readonly SectionId[]
  readonly inputs: Readonly<Record<string, MethodInput>>
  readonly steps: Readonly<Record<string, MethodStep>>
  readonly checks: readonly MethodCheck[]
  readonly validity?: readonly ValidityRange[]
  /** Result name of the command (`required-volume`) → symbol. The first is the answer. */
  readonly results: Readonly<Record<string, string>>
  /** Assumptions that the method leans on beside those its inputs are bound to. */
  readonly assumes?: readonly string[]
  /** Method run with the chosen vessel to find what becomes of the pressures. */
  readonly checkBack?: string
  /** Product standard of the vessels that the method is written for; findings about limits and conformity follow it. */
  readonly product?: 'EN 13831'
  /** Plain sentence for the basis of the submittal: what the method does and what it leaves out. */
  readonly basis: string
  readonly examples: readonly WorkedExample[]
}

export const defineMethod = (method: Method): Method => method

const fromSection: Binding = { at: 'section' }

/** An input that an earlier section computes. */
export const given = (kind: Kind, name: string): MethodInput => ({ kind, name, from: fromSection })

/** An input that is a key of the spec, or else an assumption. */
export const keyed = (kind: Kind, name: string, at: BindingPlace, key: string, assumption?: string): MethodInput => ({
  kind,
  name,
  from: assumption === undefined ? { at, key } : { at, key, assumption },
})

/** An input that is always an assumption, unless the spec overrides it by id. */
export const assumed = (kind: Kind, name: string, id: string): MethodInput => ({
  kind,
  name,
  from: { at: 'assumption', id },
})

export const step = (kind: Kind, name: string, formula: string, source: Citation): MethodStep => ({
  kind,
  name,
  formula,
  source,
})

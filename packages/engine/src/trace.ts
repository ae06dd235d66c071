import type { Kind } from '@coldfill/units'
import type { Citation } from './citation.ts'

/** Where the value of an input comes from, so that a reader can go there. */
export type Origin =
  | { readonly from: 'spec'; readonly path: string }
  | { readonly from: 'assumption'; readonly id: string }
  /** A published table, as a pipe dimension. */
  | { readonly from: 'table'; readonly citation: Citation }
  /** The catalogue row of the chosen vessel. */
  | { readonly from: 'catalogue' }

export interface TraceInput {
  readonly entry: 'input'
  /** `ET-1/system-volume`: mark, slash, name with hyphens; with `-2` behind it where a name stands twice. */
  readonly id: string
  readonly symbol: string
  readonly name: string
  readonly kind: Kind
  /** SI unit of the kind. */
  readonly value: number
  readonly origin: Origin
  /** As the person wrote it, where a person did. */
  readonly authored?: string
}

export interface TraceStep {
  readonly entry: 'step'
  readonly id: string
  readonly symbol: string
  readonly name: string
  readonly kind: Kind
  readonly value: number
  /** Text of the formula; its symbols are earlier entries of the same trace. */
  readonly formula: string
  readonly source: Citation
  readonly method: string
}

export type TraceEntry = TraceInput | TraceStep

/** The whole calculation of a vessel, in order: each symbol is defined before it is used, and once. */
export interface TraceSection {
  /** "Site", "Contents", "Pressures", "Vessel", "Check with the chosen vessel" */
  readonly title: string
  readonly entries: readonly TraceEntry[]
}

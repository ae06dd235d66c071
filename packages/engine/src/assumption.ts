import type { Kind } from '@coldfill/units'
import type { Citation } from './citation.ts'

/** A documented default. It is used only where the spec is silent, and then named in the result of every vessel it touches. */
export interface Assumption {
  /** Stable id that specs and redlines use, as in `relief-margin.hydronic`. */
  readonly id: string
  readonly name: string
  /** Kind of the value; `words` for one that is a choice. */
  readonly kind: Kind | 'words'
  /** The value as a person would type it: `4 psi`, `10 %`, `steel`. */
  readonly value: string
  /** Kind of units an override may have beside `kind`, as a relief margin in per cent or as a pressure. */
  readonly alsoKind?: Kind
  /** Choices of a `words` assumption. */
  readonly choices?: readonly string[]
  readonly source: Citation
  /** Why this value, and on which side it errs. */
  readonly because: string
  /** Path pattern of the key that replaces it in a spec, as in `systems.*.pressure.relief-margin`. */
  readonly overriddenBy: string
}

export const defineAssumption = (assumption: Assumption): Assumption => assumption

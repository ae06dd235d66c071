import type { Fields } from '../field.ts'
import type { Service } from '../system.ts'

/**
 * An input without which the vessel has no size: one of `keys` must be there. A key is a path inside the system
 * (`temperatures.high`), or begins with `vessel.` and is a key of the vessel. `only` and `unless` narrow the need to some
 * values of a key of the vessel; an empty text stands for a key that is not written.
 */
export interface Need {
  readonly keys: readonly [string, ...string[]]
  /** What it is for, after the words "ET-1 needs … ": "to know how hot the water gets". */
  readonly to: string
  readonly only?: { readonly key: string; readonly is: readonly string[] }
  readonly unless?: { readonly key: string; readonly is: readonly string[] }
  /** Keys of the vessel that ask for another method, so that this need does not hold. */
  readonly liftedBy?: readonly string[]
  /** Keys of the vessel that ask for the method of this need together, where none is named. */
  readonly askedBy?: readonly string[]
  /** Keys of the system that together make this input needless. */
  readonly sparedBy?: readonly string[]
  /** Holds only where the system is filled with glycol. */
  readonly glycol?: true
}

export interface VesselKindDefinition {
  /** For headings: "Expansion tanks". */
  readonly title: string
  readonly doc: string
  /** A whole vessel in one line, as in `ET-1: { … }`. */
  readonly example: string
  readonly services: readonly Service[]
  readonly fields: Fields
  readonly needs: readonly Need[]
}

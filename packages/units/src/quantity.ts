import type { Kind } from './kind.ts'

/** A number with its kind. `value` is in the `si` unit of the kind (see KINDS), full precision. */
export interface Quantity<K extends Kind = Kind> {
  readonly kind: K
  readonly value: number
  /** The text a person wrote, kept so that schedules and redlines can quote it. */
  readonly authored?: string
}

/** The system in which a document or screen shows quantities; any unit may be typed anywhere. */
export type UnitSystem = 'US' | 'SI'

import type { Field } from './field.ts'

interface Documented {
  /** What the key means, one sentence. */
  readonly doc: string
  /** A value as a person would write it. */
  readonly example: string
}

export interface FieldShape {
  readonly shape: 'field'
  readonly field: Field
  /** Names that the value links to: pipe families, fluids. Value → one line that explains it. */
  readonly names?: Readonly<Record<string, string>>
  /** What the names are, where they are not all known before the spec is read. */
  readonly refersTo?: 'fluid' | 'pipe size'
}

/** A block with keys of the language. */
export interface BlockShape extends Documented {
  readonly shape: 'block'
  readonly keys: Readonly<Record<string, Shape>>
  readonly required: readonly string[]
}

/** A block whose keys are ids or marks of the user, or names that the vocabulary knows. */
export interface MapShape extends Documented {
  readonly shape: 'map'
  readonly of: Shape
  /** A key as a person would write it. */
  readonly exampleKey: string
  /** Key → one line, where only these keys are taken. */
  readonly names?: Readonly<Record<string, string>>
}

export interface ListShape extends Documented {
  readonly shape: 'list'
  readonly of: Shape
}

/** A block whose other keys depend on the value of the key `by`. */
export interface BranchShape extends Documented {
  readonly shape: 'branch by value'
  readonly by: string
  readonly branches: Readonly<Record<string, BlockShape>>
}

/** A block that is what its leading key says; earlier branches win. */
export interface LeadShape extends Documented {
  readonly shape: 'branch by key'
  readonly branches: Readonly<Record<string, BlockShape>>
}

/** A single text or a block. */
export interface EitherShape extends Documented {
  readonly shape: 'either'
  readonly text: FieldShape
  readonly block: BlockShape
}

export type Shape = FieldShape | BlockShape | MapShape | ListShape | BranchShape | LeadShape | EitherShape

export const docOf = (shape: Shape): string => (shape.shape === 'field' ? shape.field.doc : shape.doc)

export const exampleOf = (shape: Shape): string => (shape.shape === 'field' ? shape.field.example : shape.example)

import type { Kind, Quantity } from '@coldfill/units'
import type { Range } from '../finding.ts'

/** A value of the spec with the place where it was written. */
export interface Located<T> {
  readonly value: T
  readonly path: string
  readonly range: Range
}

interface FieldBase {
  /** What the key means, one sentence, for hover, completion, the schema and the reference. */
  readonly doc: string
  /** A value as a person would write it. */
  readonly example: string
  /** Said where a key has a default: "sea level, and then an assumption". */
  readonly fallback?: string
  /** Missing it blocks the vessel or system: said once, at the mark or id. */
  readonly required?: true
}

/** A number with a unit. Several kinds where a value may be written in more than one way, as a margin in % or psi. */
export interface QuantityField<K extends Kind = Kind> extends FieldBase {
  readonly field: 'quantity'
  readonly kinds: readonly K[]
  /** Least value in the SI unit of the first kind; `positive` excludes zero. */
  readonly least?: number
  readonly positive?: true
}
export interface ChoiceField<C extends string = string> extends FieldBase {
  readonly field: 'choice'
  /** Choice → one line that explains it. */
  readonly choices: Readonly<Record<C, string>>
}
export interface TextField extends FieldBase {
  readonly field: 'text'
}
/** A whole number without a unit. */
export interface IntegerField extends FieldBase {
  readonly field: 'integer'
  readonly least: number
}
/** A plain number without a unit, as a factor or a demand index. */
export interface NumberField extends FieldBase {
  readonly field: 'number'
  readonly least?: number
}
export interface YesNoField extends FieldBase {
  readonly field: 'yes or no'
}

export type Field = QuantityField | ChoiceField | TextField | IntegerField | NumberField | YesNoField

export type FieldValue<F> =
  F extends QuantityField<infer K>
    ? Quantity<K>
    : F extends ChoiceField<infer C>
      ? C
      : F extends TextField
        ? string
        : F extends IntegerField | NumberField
          ? number
          : F extends YesNoField
            ? boolean
            : never

export type Fields = Readonly<Record<string, Field>>

/** What the reader hands on for a table of fields: each key that was written and understood, with its place. */
export type ReadFields<T extends Fields> = { readonly [Key in keyof T]?: Located<FieldValue<T[Key]>> }

interface QuantityOptions {
  readonly fallback?: string
  readonly required?: true
  readonly least?: number
  readonly positive?: true
}

/** A number with a unit of one of `kinds`; the first kind is the usual one. */
export const quantity = <const K extends Kind>(
  kinds: readonly [K, ...K[]],
  doc: string,
  example: string,
  options: QuantityOptions = {},
): QuantityField<K> => ({ field: 'quantity', kinds, doc, example, ...options })

/** One of a few trade words. `choices` holds a line for each that explains it. */
export const choice = <const C extends string>(
  choices: Readonly<Record<C, string>>,
  doc: string,
  example: NoInfer<C>,
  options: { readonly fallback?: string; readonly required?: true } = {},
): ChoiceField<C> => ({ field: 'choice', choices, doc, example, ...options })

export const text = (doc: string, example: string, options: { readonly fallback?: string } = {}): TextField => ({
  field: 'text',
  doc,
  example,
  ...options,
})

export const integer = (
  least: number,
  doc: string,
  example: string,
  options: { readonly fallback?: string; readonly required?: true } = {},
): IntegerField => ({ field: 'integer', least, doc, example, ...options })

export const number = (
  doc: string,
  example: string,
  options: { readonly fallback?: string; readonly least?: number } = {},
): NumberField => ({ field: 'number', doc, example, ...options })

export const yesNo = (
  doc: string,
  example: 'yes' | 'no',
  options: { readonly fallback?: string } = {},
): YesNoField => ({
  field: 'yes or no',
  doc,
  example,
  ...options,
})

/** Where a node stands in the formula text: UTF-16 offsets, end exclusive. */
export interface Columns {
  readonly start: number
  readonly end: number
}

export type BinaryOperator = '+' | '-' | '*' | '/' | '^'
export type Comparison = '<' | '<=' | '>' | '>=' | '='

/**
 * A parsed formula. Every node knows its columns. Brackets are not nodes: they are decided anew in layout.
 * A number may carry a unit, as in `3[L]` or `14.696[psia]`; its value is then in the SI unit of the unit's kind.
 */
export type Tree =
  | {
      readonly type: 'number'
      readonly value: number
      readonly text: string
      readonly unit?: string
      readonly at: Columns
    }
  | { readonly type: 'symbol'; readonly name: string; readonly at: Columns }
  | { readonly type: 'negate'; readonly operand: Tree; readonly at: Columns }
  | {
      readonly type: 'binary'
      readonly operator: BinaryOperator
      readonly left: Tree
      readonly right: Tree
      readonly at: Columns
    }
  | {
      readonly type: 'compare'
      readonly operator: Comparison
      readonly left: Tree
      readonly right: Tree
      readonly at: Columns
    }
  | { readonly type: 'call'; readonly name: string; readonly args: readonly Tree[]; readonly at: Columns }

/** What is wrong with a formula, and where. Collected, never thrown. */
export interface FormulaProblem {
  readonly message: string
  readonly at: Columns
}

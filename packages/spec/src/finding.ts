import type { Kind } from '@coldfill/units'

/** Zero-based line and UTF-16 character, as in the language server protocol. */
export interface Position {
  readonly line: number
  readonly character: number
}

export interface Range {
  readonly start: Position
  readonly end: Position
}

export type Severity = 'error' | 'warning' | 'note'

/** A change of the text that mends a finding: replaces `range` by `text`. */
export interface Fix {
  readonly title: string
  /** It puts in a value that nobody has said, or is one of several that may be meant: for a person to choose, never made unseen. */
  readonly guess?: true
  readonly edits: readonly { readonly range: Range; readonly text: string }[]
}

/** A quantity as it stands in a message, so that documents in other units can say it in theirs. SI value of the kind. */
export interface SaidQuantity {
  readonly text: string
  readonly kind: Kind
  readonly value: number
}

/** Something to tell the author of a spec. Collected, never thrown. */
export interface Finding {
  /** `CF-Y…` syntax, `CF-S…` spec, `CF-E…` engineering. */
  readonly code: string
  readonly severity: Severity
  /** What is wrong, in the reader's words. */
  readonly message: string
  /** What to write instead. */
  readonly hint: string
  /** Path of the key, mark or id: `systems.HWS.vessels.ET-1.relief-margin`. Empty for the whole text. */
  readonly path: string
  /** The key or the value, never the whole block. */
  readonly range: Range
  readonly related: readonly { readonly message: string; readonly path: string; readonly range: Range }[]
  readonly fixes: readonly Fix[]
  /** Quantities of message and hint that the program worked out; what a person wrote stands as written. */
  readonly quantities?: readonly SaidQuantity[]
  /** Reason with which a person accepted the finding, where one did. */
  readonly accepted?: string
}

/**
 * A drawn formula before it is MathML, a Word equation or plain text. Every bracket that a reader needs is already
 * a `fence` box, so that no face decides about brackets again.
 */
export type Box =
  | { readonly box: 'row'; readonly items: readonly Box[] }
  | { readonly box: 'identifier'; readonly text: string }
  /** Upright words: a subscript in words, a function name, a unit. */
  | { readonly box: 'word'; readonly text: string }
  | { readonly box: 'number'; readonly text: string }
  /** `=`, `+`, `−`, `·`, `<` … drawn with the space an operator has. */
  | { readonly box: 'operator'; readonly text: string }
  | { readonly box: 'fraction'; readonly top: Box; readonly bottom: Box }
  | { readonly box: 'subscript'; readonly base: Box; readonly sub: Box }
  | { readonly box: 'superscript'; readonly base: Box; readonly sup: Box }
  | { readonly box: 'radical'; readonly inside: Box }
  | { readonly box: 'fence'; readonly inside: Box; readonly open: '(' | '|'; readonly close: ')' | '|' }
  /** One line a case, with the word "otherwise" for the last: `when(condition, a, b)`. */
  | { readonly box: 'cases'; readonly cases: readonly { readonly value: Box; readonly condition: Box | null }[] }

import { compile, differentiate, formulaTree, symbolsIn, type Dual, type FormulaFunction } from '@coldfill/formula'

type Functions = Readonly<Record<string, FormulaFunction>>
type Values = Readonly<Record<string, number>>

export interface CompiledFormula {
  readonly evaluate: (values: Values) => number
  readonly differentiate: (values: Values, seeds: Values) => Dual
  readonly symbols: readonly string[]
}

const cache = new WeakMap<Functions, Map<string, CompiledFormula>>()

/** The closures of a formula, made once for a text and a set of functions. */
export const compiled = (formula: string, functions: Functions): CompiledFormula => {
  let byText = cache.get(functions)
  if (!byText) cache.set(functions, (byText = new Map()))
  let found = byText.get(formula)
  if (!found) {
    const tree = formulaTree(formula)
    let slope: CompiledFormula['differentiate'] | undefined
    found = {
      evaluate: compile(tree, functions),
      differentiate: (values, seeds) => (slope ??= differentiate(tree, functions))(values, seeds),
      symbols: symbolsIn(tree),
    }
    byText.set(formula, found)
  }
  return found
}

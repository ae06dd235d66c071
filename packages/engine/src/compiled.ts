import { compile, formulaTree, type FormulaFunction, partial, symbolsIn } from '@coldfill/formula'

type Functions = Readonly<Record<string, FormulaFunction>>
type Values = Readonly<Record<string, number>>

export interface CompiledFormula {
  readonly evaluate: (values: Values) => number
  /** Partial derivative by each symbol of the formula that moves it. */
  readonly partials: () => readonly (readonly [symbol: string, slope: (values: Values) => number])[]
}

const cache = new WeakMap<Functions, Map<string, CompiledFormula>>()

/** The closures of a formula, made once for a text and a set of functions. */
export const compiled = (formula: string, functions: Functions): CompiledFormula => {
  let byText = cache.get(functions)
  if (!byText) cache.set(functions, (byText = new Map()))
  let found = byText.get(formula)
  if (!found) {
    const tree = formulaTree(formula)
    let slopes: ReturnType<CompiledFormula['partials']> | undefined
    found = {
      evaluate: compile(tree, functions),
      partials: () =>
        (slopes ??= symbolsIn(tree).flatMap((symbol) => {
          const slope = partial(tree, symbol, functions)
          return slope ? [[symbol, slope] as const] : []
        })),
    }
    byText.set(formula, found)
  }
  return found
}

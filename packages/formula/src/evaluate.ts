import { builtin, constant } from './builtins.ts'
import type { FormulaFunction } from './function.ts'
import type { Comparison, Tree } from './tree.ts'

export type Values = Readonly<Record<string, number>>
export type Functions = Readonly<Record<string, FormulaFunction>>
type Evaluate = (values: Values) => number

export const COMPARE: Readonly<Record<Comparison, (left: number, right: number) => boolean>> = {
  '<': (left, right) => left < right,
  '<=': (left, right) => left <= right,
  '>': (left, right) => left > right,
  '>=': (left, right) => left >= right,
  '=': (left, right) => left === right,
}

/** The function of a call beside the built-in ones. An unknown name or a wrong number of arguments throws. */
export const calledFunction = (tree: Extract<Tree, { type: 'call' }>, functions: Functions): FormulaFunction => {
  const found = Object.hasOwn(functions, tree.name) ? functions[tree.name] : undefined
  if (!found) throw new Error(`unknown function "${tree.name}"`)
  if (found.parameters.length !== tree.args.length)
    throw new Error(`${tree.name}() takes ${found.parameters.length} values`)
  return found
}

const applied = (evaluate: (...values: number[]) => number, args: readonly Evaluate[]): Evaluate => {
  const [a, b] = args
  if (args.length === 1) return (values) => evaluate(a!(values))
  if (args.length === 2) return (values) => evaluate(a!(values), b!(values))
  return (values) => evaluate(...args.map((arg) => arg(values)))
}

const binary = (tree: Extract<Tree, { type: 'binary' }>, functions: Functions): Evaluate => {
  const left = compile(tree.left, functions)
  const right = compile(tree.right, functions)
  switch (tree.operator) {
    case '+':
      return (values) => left(values) + right(values)
    case '-':
      return (values) => left(values) - right(values)
    case '*':
      return (values) => left(values) * right(values)
    case '/':
      return (values) => left(values) / right(values)
    case '^':
    default:
      return (values) => left(values) ** right(values)
  }
}

/**
 * A function that computes the formula from values by symbol: SI in, SI out; a comparison gives 1 or 0. The formula is
 * turned into closures, never into program text. An unknown function throws here, a symbol without a value when called.
 */
export const compile = (tree: Tree, functions: Functions): Evaluate => {
  switch (tree.type) {
    case 'number': {
      const { value } = tree
      return () => value
    }
    case 'symbol': {
      const { name } = tree
      const fixed = constant(name)
      if (fixed !== undefined) return () => fixed
      return (values) => {
        const value = values[name]
        if (value === undefined) throw new Error(`no value for "${name}"`)
        return value
      }
    }
    case 'negate': {
      const operand = compile(tree.operand, functions)
      return (values) => -operand(values)
    }
    case 'binary':
      return binary(tree, functions)
    case 'compare': {
      const left = compile(tree.left, functions)
      const right = compile(tree.right, functions)
      const holds = COMPARE[tree.operator]
      return (values) => (holds(left(values), right(values)) ? 1 : 0)
    }
    case 'call':
    default: {
      const args = tree.args.map((arg) => compile(arg, functions))
      if (tree.name === 'when') {
        const [condition, a, b] = args
        return (values) => (condition!(values) ? a!(values) : b!(values))
      }
      return applied((builtin(tree.name) ?? calledFunction(tree, functions)).evaluate, args)
    }
  }
}

import { builtin, constant } from './builtins.ts'
import { COMPARE, type Functions, type Values, calledFunction } from './evaluate.ts'
import type { Tree } from './tree.ts'

/** A value and its derivative along the direction of the seeds. */
export interface Dual {
  readonly value: number
  readonly derivative: number
}
type Differentiate = (values: Values, seeds: Values) => Dual

const fixed = (value: number): Differentiate => {
  const dual = { value, derivative: 0 }
  return () => dual
}

/** Chain rule. What does not move adds nothing, even where the slope is infinite. */
const along = (slope: number, derivative: number): number => (derivative === 0 ? 0 : slope * derivative)

const power = (base: Dual, exponent: Dual): Dual => {
  const value = base.value ** exponent.value
  const byBase = along(exponent.value * base.value ** (exponent.value - 1), base.derivative)
  return { value, derivative: byBase + along(value * Math.log(base.value), exponent.derivative) }
}

const OPERATIONS: Readonly<Record<string, (a: Dual, b: Dual) => Dual>> = {
  '+': (a, b) => ({ value: a.value + b.value, derivative: a.derivative + b.derivative }),
  '-': (a, b) => ({ value: a.value - b.value, derivative: a.derivative - b.derivative }),
  '*': (a, b) => ({
    value: a.value * b.value,
    derivative: along(b.value, a.derivative) + along(a.value, b.derivative),
  }),
  '/': (a, b) => {
    const value = a.value / b.value
    return { value, derivative: (a.derivative - along(value, b.derivative)) / b.value }
  },
  '^': power,
}
const CALLED: Readonly<Record<string, string>> = { absolute: '+', gauge: '-' }

const call = (tree: Extract<Tree, { type: 'call' }>, functions: Functions): Differentiate => {
  const args = tree.args.map((arg) => differentiate(arg, functions))
  const [a, b, c] = args
  const { name } = tree
  if (name === 'when') return (values, seeds) => (a!(values, seeds).value ? b! : c!)(values, seeds)
  if (name === 'min' || name === 'max') {
    const better = name === 'min' ? (x: Dual, y: Dual) => y.value < x.value : (x: Dual, y: Dual) => y.value > x.value
    return (values, seeds) => {
      const duals = args.map((arg) => arg(values, seeds))
      return duals.find(({ value }) => Number.isNaN(value)) ?? duals.reduce((x, y) => (better(x, y) ? y : x))
    }
  }
  const operation = OPERATIONS[CALLED[name] ?? '']
  if (operation) return (values, seeds) => operation(a!(values, seeds), b!(values, seeds))
  const known = builtin(name)
  if (known) {
    return (values, seeds) => {
      const { value, derivative } = a!(values, seeds)
      return { value: known.evaluate(value), derivative: along(known.slope!(value), derivative) }
    }
  }
  const { evaluate, partials } = calledFunction(tree, functions)
  return (values, seeds) => {
    const duals = args.map((arg) => arg(values, seeds))
    const at = duals.map(({ value }) => value)
    const moves = duals.some(({ derivative }) => derivative !== 0)
    const slopes = moves ? partials(...at) : []
    const derivative = moves ? duals.reduce((sum, dual, index) => sum + along(slopes[index]!, dual.derivative), 0) : 0
    return { value: evaluate(...at), derivative }
  }
}

/**
 * The formula together with its exact derivative: the sum over the symbols of the partial derivative times the seed of
 * that symbol (0 where none is given). Values in SI. min, max, when and abs have the slope of the branch that is active;
 * ceil, floor and round are flat. Throws as `compile` does.
 */
export const differentiate = (tree: Tree, functions: Functions): Differentiate => {
  switch (tree.type) {
    case 'number':
      return fixed(tree.value)
    case 'symbol': {
      const { name } = tree
      const known = constant(name)
      if (known !== undefined) return fixed(known)
      return (values, seeds) => {
        const value = values[name]
        if (value === undefined) throw new Error(`no value for "${name}"`)
        return { value, derivative: seeds[name] ?? 0 }
      }
    }
    case 'negate': {
      const operand = differentiate(tree.operand, functions)
      return (values, seeds) => {
        const { value, derivative } = operand(values, seeds)
        return { value: -value, derivative: -derivative }
      }
    }
    case 'call':
      return call(tree, functions)
    case 'binary':
    case 'compare':
    default: {
      const left = differentiate(tree.left, functions)
      const right = differentiate(tree.right, functions)
      if (tree.type === 'binary') {
        const operation = OPERATIONS[tree.operator]!
        return (values, seeds) => operation(left(values, seeds), right(values, seeds))
      }
      const holds = COMPARE[tree.operator]
      return (values, seeds) => ({
        value: holds(left(values, seeds).value, right(values, seeds).value) ? 1 : 0,
        derivative: 0,
      })
    }
  }
}

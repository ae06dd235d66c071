import { builtin, constant } from './builtins.ts'
import { calledFunction, compile, type Functions, type Values } from './evaluate.ts'
import type { Tree } from './tree.ts'

type Slope = (values: Values) => number

/** Chain rule. What does not move adds nothing, even where the slope is infinite. */
const along = (slope: number, derivative: number): number => (derivative === 0 ? 0 : slope * derivative)

const sum = (a: Slope | null, b: Slope | null): Slope | null => (a && b ? (values) => a(values) + b(values) : (a ?? b))
const negated = (a: Slope | null): Slope | null => a && ((values) => -a(values))

const power = (
  tree: Extract<Tree, { type: 'binary' }>,
  a: Slope | null,
  b: Slope | null,
  functions: Functions,
): Slope => {
  const base = compile(tree.left, functions)
  const exponent = compile(tree.right, functions)
  return (values) => {
    const x = base(values)
    const n = exponent(values)
    const byBase = a ? along(n * x ** (n - 1), a(values)) : 0
    return b ? byBase + along(x ** n * Math.log(x), b(values)) : byBase
  }
}

const product = (
  tree: Extract<Tree, { type: 'binary' }>,
  a: Slope | null,
  b: Slope | null,
  functions: Functions,
): Slope => {
  const left = compile(tree.left, functions)
  const right = compile(tree.right, functions)
  if (!b) return (values) => along(right(values), a!(values))
  if (!a) return (values) => along(left(values), b(values))
  return (values) => along(right(values), a(values)) + along(left(values), b(values))
}

const quotient = (
  tree: Extract<Tree, { type: 'binary' }>,
  a: Slope | null,
  b: Slope | null,
  functions: Functions,
): Slope => {
  const left = compile(tree.left, functions)
  const right = compile(tree.right, functions)
  if (!b) return (values) => a!(values) / right(values)
  return (values) => {
    const below = right(values)
    return ((a ? a(values) : 0) - along(left(values) / below, b(values))) / below
  }
}

const call = (tree: Extract<Tree, { type: 'call' }>, symbol: string, functions: Functions): Slope | null => {
  const slopes = tree.args.map((arg) => partial(arg, symbol, functions))
  const { name } = tree
  const [first, second, third] = slopes
  if (name === 'when') {
    if (!second && !third) return null
    const condition = compile(tree.args[0]!, functions)
    return (values) => (condition(values) ? (second?.(values) ?? 0) : (third?.(values) ?? 0))
  }
  if (slopes.every((slope) => !slope)) return null
  if (name === 'absolute') return sum(first ?? null, second ?? null)
  if (name === 'gauge') return sum(first ?? null, negated(second ?? null))
  const args = tree.args.map((arg) => compile(arg, functions))
  if (name === 'min' || name === 'max') {
    const better = name === 'min' ? (x: number, y: number) => y < x : (x: number, y: number) => y > x
    return (values) => {
      let active = 0
      let best = args[0]!(values)
      for (let n = 1; n < args.length; n += 1) {
        const value = args[n]!(values)
        if (better(best, value)) {
          best = value
          active = n
        }
      }
      return slopes[active]?.(values) ?? 0
    }
  }
  const known = builtin(name)
  if (known?.slope) {
    const { slope } = known
    return (values) => along(slope(args[0]!(values)), first!(values))
  }
  const { partials } = calledFunction(tree, functions)
  return (values) => {
    const at = partials(...args.map((arg) => arg(values)))
    let total = 0
    for (let n = 0; n < slopes.length; n += 1) {
      const slope = slopes[n]
      if (slope) total += along(at[n]!, slope(values))
    }
    return total
  }
}

/**
 * The exact partial derivative of the formula by one symbol, in SI units; null where the symbol is not in it. The same
 * rules as `differentiate`, made for one symbol: branches that do not move are left out when it is made, not when it runs.
 */
export const partial = (tree: Tree, symbol: string, functions: Functions): Slope | null => {
  switch (tree.type) {
    case 'number':
    case 'compare':
      return null
    case 'symbol':
      return tree.name === symbol && constant(symbol) === undefined ? () => 1 : null
    case 'negate':
      return negated(partial(tree.operand, symbol, functions))
    case 'call':
      return call(tree, symbol, functions)
    case 'binary':
    default: {
      const a = partial(tree.left, symbol, functions)
      const b = partial(tree.right, symbol, functions)
      if (!a && !b) return null
      if (tree.operator === '+') return sum(a, b)
      if (tree.operator === '-') return sum(a, negated(b))
      if (tree.operator === '*') return product(tree, a, b, functions)
      if (tree.operator === '/') return quotient(tree, a, b, functions)
      return power(tree, a, b, functions)
    }
  }
}

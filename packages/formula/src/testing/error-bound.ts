import type { Functions } from '../evaluate.ts'
import type { Tree } from '../tree.ts'

/** A value and a bound on what rounding may have done to it: a plain recursive evaluator, apart from `compile`. */
export interface Bounded {
  readonly value: number
  readonly error: number
  /** Two sides of a comparison, or of min and max, are too near each other to tell which is taken. */
  readonly undecided: boolean
}

const EPSILON = 2 ** -50

export const bounded = (tree: Tree, values: Readonly<Record<string, number>>, functions: Functions): Bounded => {
  const exact = (value: number): Bounded => ({ value, error: EPSILON * Math.abs(value), undecided: false })
  if (tree.type === 'number')
    return tree.unit === undefined ? { value: tree.value, error: 0, undecided: false } : exact(tree.value)
  if (tree.type === 'symbol') return exact(tree.name === 'pi' ? 3.141592653589793 : values[tree.name]!)
  const parts = (
    tree.type === 'call' ? tree.args : tree.type === 'negate' ? [tree.operand] : [tree.left, tree.right]
  ).map((part) => bounded(part, values, functions))
  const [a, b, c] = parts as [Bounded, Bounded, Bounded]
  const undecided = parts.some((part) => part.undecided)
  const of = (value: number, error: number): Bounded => ({ value, error: error + EPSILON * Math.abs(value), undecided })
  /** Error carried through any smooth function, by moving each argument by its own error. */
  const moved = (f: (...args: number[]) => number, ...args: Bounded[]): Bounded => {
    const value = f(...args.map((arg) => arg.value))
    const error = args.reduce((sum, arg, index) => {
      if (arg.error === 0) return sum
      const at = (step: number) => f(...args.map((other, i) => other.value + (i === index ? step : 0)))
      const step = Math.max(arg.error, Math.abs(arg.value) * 1e-9, 1e-200)
      return sum + (Math.max(Math.abs(at(step) - value), Math.abs(at(-step) - value)) * arg.error) / step
    }, 0)
    return of(value, error)
  }
  if (tree.type === 'negate') return of(-a.value, a.error)
  if (tree.type === 'compare') {
    const near = !(Math.abs(a.value - b.value) > 4 * (a.error + b.error))
    const holds = {
      '<': a.value < b.value,
      '<=': a.value <= b.value,
      '>': a.value > b.value,
      '>=': a.value >= b.value,
      '=': a.value === b.value,
    }
    return { value: holds[tree.operator] ? 1 : 0, error: 0, undecided: undecided || near }
  }
  const operator = tree.type === 'binary' ? tree.operator : tree.name
  switch (operator) {
    case '+':
    case 'absolute':
      return of(a.value + b.value, a.error + b.error)
    case '-':
    case 'gauge':
      return of(a.value - b.value, a.error + b.error)
    case '*':
      return of(a.value * b.value, a.error * Math.abs(b.value) + b.error * Math.abs(a.value))
    case '/':
      return of(a.value / b.value, (a.error + (Math.abs(a.value) * b.error) / Math.abs(b.value)) / Math.abs(b.value))
    case '^':
      return moved((x, y) => x ** y, a, b)
    case 'min':
    case 'max': {
      const value = (operator === 'min' ? Math.min : Math.max)(...parts.map((part) => part.value))
      return of(value, Math.max(...parts.map((part) => part.error)))
    }
    case 'when': {
      const taken = a.value === 1 ? b : c
      return { ...taken, undecided: a.undecided || taken.undecided }
    }
    case 'celsius':
      return of(a.value - 273.15, a.error + EPSILON * 273.15)
    case 'fahrenheit':
      return of((a.value * 9) / 5 - 459.67, a.error * 2 + EPSILON * 459.67)
    default: {
      const known: Record<string, (x: number) => number> = {
        sqrt: (x) => x ** 0.5,
        abs: Math.abs,
        exp: Math.exp,
        ln: Math.log,
        log10: Math.log10,
      }
      return moved(functions[operator]?.evaluate ?? known[operator]!, ...parts)
    }
  }
}

import { formatNumber } from '@coldfill/units'
import { builtin } from './builtins.ts'
import { type Functions, type Values, compile } from './evaluate.ts'
import { children, symbolsIn } from './symbols-in.ts'
import type { Tree } from './tree.ts'

export interface LineToShow {
  /** In display units, as `inUnits` returns it. */
  readonly tree: Tree
  /** In display units, by symbol; more than the formula needs may be given. */
  readonly values: Values
  /** In display units. */
  readonly result: number
  /** Functions in display units (`functionsInUnits`). A line that calls others is shown without being recomputed. */
  readonly functions?: Functions
  /** Significant digits of the result, and the least of what stands in the line. */
  readonly digits?: number
}

export interface ShownLine {
  /** For `layout`, in place of the symbols. */
  readonly numbers: Record<string, string>
  readonly result: string
  /** The formula, with more digits in its conversion factors where six did not do. */
  readonly tree: Tree
}

/** What stands beyond is rounding of the arithmetic, not of the reader; a tie such as 1.2685 then rounds one way only. */
const MOST_DIGITS = 13

/** A value with significant digits; what is exact with fewer is written with fewer. */
const written = (value: number, digits: number): string => {
  const exact = Number(value.toPrecision(MOST_DIGITS))
  const rounded = Number(exact.toPrecision(digits))
  return exact === rounded && Math.abs(rounded) >= 1e-5 && Math.abs(rounded) < 1e15
    ? String(rounded)
    : formatNumber(exact, digits)
}

/** The formula as its constants are drawn, with `digits` in those that are drawn shorter than they are. */
const withConstants = (tree: Tree, digits: number): Tree => {
  const inside = (node: Tree): Tree => withConstants(node, digits)
  switch (tree.type) {
    case 'number': {
      if (tree.unit !== undefined || Number(tree.text) === tree.value) return tree
      const text = written(tree.value, digits)
      return { ...tree, text, value: Number(text) }
    }
    case 'symbol':
      return tree
    case 'negate':
      return { ...tree, operand: inside(tree.operand) }
    case 'call':
      return { ...tree, args: tree.args.map(inside) }
    case 'binary':
    case 'compare':
    default:
      return { ...tree, left: inside(tree.left), right: inside(tree.right) }
  }
}

const callsOnly = (tree: Tree, functions: Functions): boolean =>
  (tree.type !== 'call' || builtin(tree.name) !== undefined || Object.hasOwn(functions, tree.name)) &&
  children(tree).every((child) => callsOnly(child, functions))

/**
 * The numbers of a line as they are shown. Digits are raised until somebody who computes from the shown numbers gets the
 * shown result; where even thirteen do not do (the result is lost in cancellation) all thirteen are shown.
 */
export const shownLine = ({ tree, values, result, functions = {}, digits = 4 }: LineToShow): ShownLine => {
  const symbols = symbolsIn(tree)
  const shown = written(result, digits)
  const line = (inputDigits: number, constants: Tree): ShownLine => ({
    numbers: Object.fromEntries(symbols.map((name) => [name, written(values[name] ?? Number.NaN, inputDigits)])),
    result: shown,
    tree: constants,
  })
  const recomputable = callsOnly(tree, functions) && symbols.every((name) => values[name] !== undefined)
  if (!recomputable || written(compile(tree, functions)(values), digits) !== shown)
    return line(digits, withConstants(tree, 6))
  for (const constantDigits of [6, 9, MOST_DIGITS]) {
    const constants = withConstants(tree, constantDigits)
    const recompute = compile(constants, functions)
    for (let inputDigits = digits; inputDigits <= MOST_DIGITS; inputDigits++) {
      const candidate = line(inputDigits, constants)
      const read = Object.fromEntries(symbols.map((name) => [name, Number(candidate.numbers[name])]))
      if (written(recompute(read), digits) === shown) return candidate
    }
  }
  return line(MOST_DIGITS, withConstants(tree, MOST_DIGITS))
}

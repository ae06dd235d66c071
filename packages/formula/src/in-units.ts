import { type Kind, type UnitSystem, displayUnit, fromSi, toSi } from '@coldfill/units'
import { builtin, constant } from './builtins.ts'
import { type Functions, calledFunction, compile } from './evaluate.ts'
import type { FormulaFunction, Scope } from './function.ts'
import { binaryTree, near, negated, numberTree, scaled, shifted } from './scaled-tree.ts'
import { symbolsIn } from './symbols-in.ts'
import type { Tree } from './tree.ts'

/**
 * A part of the formula rewritten: its SI value is `scale · tree + offset`, with a positive scale. Without a tree it is
 * the number `offset`, from literals with a unit, which are carried along until it is known in which unit they are wanted.
 */
interface Part {
  readonly scale: number
  readonly offset: number
  readonly tree: Tree | null
}

const fixed = (offset: number): Part => ({ scale: 1, offset, tree: null })
const part = (scale: number, tree: Tree): Part => ({ scale: near(scale, 1) ? 1 : scale, offset: 0, tree })
/** The part times a number; a sign goes into the tree. */
const times = ({ scale, offset, tree }: Part, by: number): Part => {
  if (!tree || by === 0) return fixed(tree ? 0 : offset * by)
  return { ...part(scale * Math.abs(by), by < 0 ? negated(tree) : tree), offset: offset * by }
}
/** Zero where the two are equal but for rounding. */
const difference = (a: number, b: number): number => (near(a, b) ? 0 : a - b)

/** The tree whose number is the value of the part measured in a unit of size `scale` from `offset`. */
const measured = ({ scale: own, offset: from, tree }: Part, scale: number, offset: number, at: Tree): Tree => {
  if (!tree) return numberTree(difference(from, offset) / scale, at.at)
  const [before, after] = [difference(from, offset) / own, difference(from, offset) / scale]
  const isWhole = (shift: number): boolean => near(shift, Math.round(shift))
  return isWhole(before) && !isWhole(after)
    ? scaled(own / scale, shifted(tree, before))
    : shifted(scaled(own / scale, tree), after)
}
/** The part with its offset moved into the tree. */
const free = (whole: Part, at: Tree): Part =>
  whole.offset === 0 || !whole.tree ? whole : part(whole.scale, measured(whole, whole.scale, 0, at))

const isNumber = ({ tree }: Part): boolean => tree?.type === 'number'
/** A written number beside a part with an offset is merged into it, and else stays as written. */
const merged = (own: Part, beside: Part): Part =>
  beside.offset !== 0 && own.tree?.type === 'number' ? fixed(own.scale * own.tree.value) : own

/** The unit for several parts side by side: the wanted one where a part has it or they differ, else that of the first. */
const shared = (parts: readonly Part[], want: number | undefined): Pick<Part, 'scale' | 'offset'> => {
  const trees = parts.filter(({ tree }) => tree)
  const [first = fixed(0)] = trees
  const wanted = trees.find((each) => isNumber(each) || (want !== undefined && near(each.scale, want)))
  if (wanted || want === undefined || trees.every(({ scale }) => near(scale, first.scale))) return wanted ?? first
  return { scale: want, offset: first.offset }
}

/**
 * Rewrites a formula so that it holds for the numbers shown in a unit system: each symbol in the display unit of its kind,
 * and the value in that of `result`. A conversion factor appears only where units do not cancel, a shift only where a
 * thermometer reading does not meet another. Functions of the scope are still called by name, with arguments and value
 * in display units: evaluate with `functionsInUnits`. Numbers that are made hold full precision in `value` and a shorter
 * `text`. The formula must have passed `checkDimensions`; a condition needs no `result`.
 */
export const inUnits = (tree: Tree, scope: Scope, system: UnitSystem, result: Kind = 'ratio'): Tree => {
  const sum = (node: Extract<Tree, { type: 'binary' }>, wish: number | undefined): Part => {
    const adds = node.operator === '+'
    const isPlain = (term: Tree): boolean => term.type === 'number' && term.unit === undefined
    const want = isPlain(node.left) || isPlain(node.right) ? 1 : wish
    const [left, right] = [rewrite(node.left, want), rewrite(node.right, want)]
    const [a, b] = [merged(left, right), merged(right, left)]
    const offset = difference(a.offset, adds ? -b.offset : b.offset)
    if (!b.tree) return { ...a, offset }
    if (!a.tree) return { scale: b.scale, offset, tree: adds ? b.tree : negated(b.tree) }
    const { scale } = shared([a, b], want)
    const terms = [scaled(a.scale / scale, a.tree), scaled(b.scale / scale, b.tree)] as const
    return { scale, offset, tree: binaryTree(adds ? '+' : '-', ...terms, node.at) }
  }

  const product = (node: Extract<Tree, { type: 'binary' }>): Part => {
    const divides = node.operator === '/'
    const [left, right] = [rewrite(node.left), rewrite(node.right)]
    const [a, b] = [merged(left, right), merged(right, left)]
    if (!b.tree) return times(a, divides ? 1 / b.offset : b.offset)
    if (!a.tree && !divides) return times(b, a.offset)
    const [over, under] = [free(a, node.left), free(b, node.right)]
    const scale = divides ? over.scale / under.scale : over.scale * under.scale
    const first = over.tree ?? numberTree(1, node.at)
    return times(part(scale, binaryTree(divides ? '/' : '*', first, under.tree!, node.at)), over.tree ? 1 : over.offset)
  }

  const power = (node: Extract<Tree, { type: 'binary' }>): Part => {
    const base = free(rewrite(node.left), node.left)
    const exponent = measured(rewrite(node.right), 1, 0, node.right)
    const raised = (inside: Tree): Tree => binaryTree('^', inside, exponent, node.at)
    if (symbolsIn(exponent).length > 0) return part(1, raised(measured(base, 1, 0, node.left)))
    const by = compile(exponent, {})({})
    return base.tree ? part(base.scale ** by, raised(base.tree)) : fixed(base.offset ** by)
  }

  const call = (node: Extract<Tree, { type: 'call' }>, want: number | undefined): Part => {
    const { name, at } = node
    const made = (args: Tree[]): Tree => ({ type: 'call', name, args, at })
    const own =
      Object.hasOwn(scope.functions, name) && !builtin(name) ? calledFunction(node, scope.functions) : undefined
    if (own) {
      const args = node.args.map((arg, index) => {
        const { factor, offset } = displayUnit(own.parameters[index]!, system)
        return measured(rewrite(arg, factor), factor, offset, arg)
      })
      const { factor, offset } = displayUnit(own.result, system)
      return { scale: factor, offset, tree: made(args) }
    }
    if (name === 'when') {
      const [condition, ...branches] = node.args
      const parts = branches.map((branch) => rewrite(branch, want))
      const { scale, offset } = shared(parts, want)
      const taken = parts.map((branch, index) => measured(branch, scale, offset, branches[index]!))
      return { scale, offset, tree: made([rewrite(condition!).tree!, ...taken]) }
    }
    const parts = node.args.map((arg) => rewrite(arg, want))
    const [only] = parts
    if (name === 'celsius') return { ...only!, offset: difference(only!.offset, 273.15) }
    if (name === 'fahrenheit') {
      const scale = only!.scale * 1.8
      return { ...only!, scale: near(scale, 1) ? 1 : scale, offset: difference(only!.offset * 1.8, 459.67) }
    }
    if (parts.every((each) => !each.tree)) return fixed(builtin(name)!.evaluate(...parts.map((each) => each.offset)))
    switch (name) {
      case 'min':
      case 'max':
      case 'absolute':
      case 'gauge': {
        const { scale, offset: from } = shared(parts, want)
        // A sum of two that are both measured from somewhere else would count the shift twice.
        const offset = name === 'min' || name === 'max' ? from : 0
        const args = parts.map((each, index) => measured(each, scale, offset, node.args[index]!))
        return { scale, offset, tree: made(args) }
      }
      case 'abs':
      case 'sqrt': {
        const { scale, tree: inside } = free(only!, node)
        return part(name === 'abs' ? scale : Math.sqrt(scale), made([inside!]))
      }
      default:
        return part(1, made([measured(only!, 1, 0, node)]))
    }
  }

  const rewrite = (node: Tree, want?: number): Part => {
    switch (node.type) {
      case 'number':
        return node.unit === undefined ? part(1, node) : fixed(node.value)
      case 'symbol': {
        if (constant(node.name) !== undefined) return part(1, node)
        const kind = scope.symbols[node.name]
        if (!kind) throw new Error(`unknown symbol "${node.name}"`)
        const { factor, offset } = displayUnit(kind, system)
        return { scale: factor, offset, tree: node }
      }
      case 'negate': {
        const operand = free(rewrite(node.operand, want), node)
        return operand.tree ? part(operand.scale, { ...node, operand: operand.tree }) : fixed(-operand.offset)
      }
      case 'compare': {
        const parts = [rewrite(node.left), rewrite(node.right)] as const
        const { scale, offset } = shared(parts, undefined)
        const [left, right] = [
          measured(parts[0], scale, offset, node.left),
          measured(parts[1], scale, offset, node.right),
        ]
        return part(1, { ...node, left, right })
      }
      case 'call':
        return call(node, want)
      case 'binary':
      default: {
        if (node.operator === '^') return power(node)
        return node.operator === '+' || node.operator === '-' ? sum(node, want) : product(node)
      }
    }
  }

  const unit = displayUnit(result, system)
  return measured(rewrite(tree, unit.factor), unit.factor, unit.offset, tree)
}

/** Functions that take and give numbers in display units, for evaluating what `inUnits` returns. */
export const functionsInUnits = (functions: Functions, system: UnitSystem): Record<string, FormulaFunction> =>
  Object.fromEntries(
    Object.entries(functions).map(([name, own]) => {
      const units = own.parameters.map((kind) => displayUnit(kind, system))
      const result = displayUnit(own.result, system)
      const inSi = (values: readonly number[]): number[] => values.map((value, index) => toSi(value, units[index]!))
      return [
        name,
        {
          ...own,
          evaluate: (...values) => fromSi(own.evaluate(...inSi(values)), result),
          partials: (...values) =>
            own.partials(...inSi(values)).map((slope, index) => (slope * units[index]!.factor) / result.factor),
        } satisfies FormulaFunction,
      ]
    }),
  )

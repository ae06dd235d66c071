import type { BinaryOperator, Comparison, Tree } from '@coldfill/formula'

/** Where the emitter finds what a formula names. */
export interface CellFinder {
  /** Address of the cell that holds a symbol. */
  readonly symbol: (name: string) => string
  /** Formula text of a fluid function over arguments that are already emitted. */
  readonly call: (tree: Extract<Tree, { type: 'call' }>, args: readonly string[]) => string
}

/** Functions that every spreadsheet program has under the same name. */
const SAME: Readonly<Record<string, string>> = {
  min: 'MIN',
  max: 'MAX',
  sqrt: 'SQRT',
  abs: 'ABS',
  exp: 'EXP',
  ln: 'LN',
  log10: 'LOG10',
  floor: 'INT',
  when: 'IF',
}

const builtinCall = (name: string, args: readonly string[]): string | null => {
  const [a = '', b = ''] = args
  const same = SAME[name]
  if (same !== undefined) return `${same}(${args.join(',')})`
  switch (name) {
    case 'ceil':
      return `(-INT(-(${a})))`
    case 'round':
      return `ROUND(${a},0)`
    case 'absolute':
      return `(${a}+${b})`
    case 'gauge':
      return `(${a}-${b})`
    default:
      return null
  }
}

const number = (value: number): string => {
  if (!Number.isFinite(value)) throw new Error(`a formula holds ${value}`)
  const text = String(value).replace('e', 'E').replace('E+', 'E')
  return value < 0 ? `(${text})` : text
}

const STRENGTH: Readonly<Record<BinaryOperator, number>> = { '+': 1, '-': 1, '*': 2, '/': 2, '^': 3 }
const COMPARE: Readonly<Record<Comparison, string>> = { '<': '<', '<=': '<=', '>': '>', '>=': '>=', '=': '=' }

/**
 * A formula as a spreadsheet reads it, without the `=`. Every power and every minus in front is bracketed, because
 * spreadsheets read `-x^2` as `(-x)^2` and `a^b^c` from the left.
 */
export const emitFormula = (tree: Tree, find: CellFinder): string => {
  const emit = (node: Tree): string => {
    switch (node.type) {
      case 'number':
        return number(node.value)
      case 'symbol':
        return node.name === 'pi' ? 'PI()' : find.symbol(node.name)
      case 'negate':
        return `(-${operand(node.operand, 4)})`
      case 'binary': {
        const strength = STRENGTH[node.operator]
        if (node.operator === '^') return `(${operand(node.left, 4)}^${operand(node.right, 4)})`
        const left = operand(node.left, strength)
        // Subtraction and division group from the left, so an equally strong right side keeps its brackets.
        return `${left}${node.operator}${operand(node.right, strength + 1)}`
      }
      case 'compare':
        return `${operand(node.left, 1)}${COMPARE[node.operator]}${operand(node.right, 1)}`
      case 'call':
      default: {
        const args = node.args.map(emit)
        return builtinCall(node.name, args) ?? find.call(node, args)
      }
    }
  }
  /** Brackets a part that binds weaker than its place asks for. */
  const operand = (node: Tree, strength: number): string => {
    const text = emit(node)
    const own =
      node.type === 'binary' && node.operator !== '^' ? STRENGTH[node.operator] : node.type === 'compare' ? 0 : 5
    return own < strength ? `(${text})` : text
  }
  return emit(tree)
}

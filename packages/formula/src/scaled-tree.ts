import type { BinaryOperator, Columns, Tree } from './tree.ts'

/** Conversion factors are known to a few units in the sixteenth digit; products of them that should be equal are. */
export const near = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-13 * Math.abs(b)

/** Text drawn for a conversion factor: six significant digits, without trailing zeros. */
const numberText = (value: number): string => String(Number(value.toPrecision(6)))

/** A number without a unit. What is a short decimal but for rounding becomes that decimal. */
export const numberTree = (value: number, at: Columns): Tree => {
  if (value < 0) return { type: 'negate', operand: numberTree(-value, at), at }
  const short = Number(value.toPrecision(10))
  const snapped = near(value, short) ? short : value
  return { type: 'number', value: snapped, text: numberText(snapped), at }
}

export const binaryTree = (operator: BinaryOperator, left: Tree, right: Tree, at: Columns): Tree => ({
  type: 'binary',
  operator,
  left,
  right,
  at,
})

export const negated = (tree: Tree): Tree =>
  tree.type === 'negate' ? tree.operand : { type: 'negate', operand: tree, at: tree.at }

const isProduct = (tree: Tree): tree is Extract<Tree, { type: 'binary' }> =>
  tree.type === 'binary' && (tree.operator === '*' || tree.operator === '/')

/** The product with its first factor replaced; a factor of one is left out of a product. */
const withFirst = (tree: Tree, replace: (first: Tree) => Tree): Tree => {
  if (!isProduct(tree)) return replace(tree)
  const left = withFirst(tree.left, replace)
  if (tree.operator === '*' && left.type === 'number' && left.value === 1) return tree.right
  return { ...tree, left }
}

const first = (tree: Tree): Tree => (isProduct(tree) ? first(tree.left) : tree)

const short = (value: number): boolean => near(value, Number(value.toPrecision(4)))

/** What to divide by instead of multiplying: a whole number, or a short decimal where the factor is none. */
const divisorOf = (factor: number): number | undefined => {
  const divisor = 1 / factor
  if (near(divisor, Math.round(divisor))) return Math.round(divisor)
  return !short(factor) && short(divisor) ? Number(divisor.toPrecision(4)) : undefined
}

/** `factor` times the tree; the factor is merged into a number that is there, or becomes a divisor where that is the shorter number. */
export const scaled = (factor: number, tree: Tree): Tree => {
  if (near(factor, 1)) return tree
  if (tree.type === 'number') return numberTree(factor * tree.value, tree.at)
  if (tree.type === 'negate') return negated(scaled(factor, tree.operand))
  if (isProduct(tree) && tree.operator === '/' && tree.right.type === 'number')
    return scaled(factor / tree.right.value, tree.left)
  const leading = first(tree)
  if (leading.type === 'number') return withFirst(tree, () => numberTree(factor * leading.value, leading.at))
  const divisor = divisorOf(factor)
  if (divisor !== undefined) {
    return isProduct(tree) && tree.operator === '/'
      ? { ...tree, right: scaled(divisor, tree.right) }
      : binaryTree('/', tree, numberTree(divisor, tree.at), tree.at)
  }
  return withFirst(tree, (start) => binaryTree('*', numberTree(factor, start.at), start, start.at))
}

/** The tree plus a number, which is merged into a number that already stands at the end. */
export const shifted = (tree: Tree, by: number): Tree => {
  if (by === 0) return tree
  if (tree.type === 'number') return numberTree(tree.value + by, tree.at)
  if (tree.type === 'negate' && by > 0) return binaryTree('-', numberTree(by, tree.at), tree.operand, tree.at)
  return binaryTree(by < 0 ? '-' : '+', tree, numberTree(Math.abs(by), tree.at), tree.at)
}

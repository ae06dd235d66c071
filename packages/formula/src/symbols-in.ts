import { constant } from './builtins.ts'
import type { Tree } from './tree.ts'

/** The nodes directly below a node, in the order of the text. */
export const children = (tree: Tree): readonly Tree[] => {
  switch (tree.type) {
    case 'number':
    case 'symbol':
      return []
    case 'negate':
      return [tree.operand]
    case 'binary':
    case 'compare':
      return [tree.left, tree.right]
    case 'call':
    default:
      return tree.args
  }
}

/** Symbols that need a value, each once, in the order of the text. */
export const symbolsIn = (tree: Tree): string[] => {
  const names = new Set<string>()
  const walk = (node: Tree): void => {
    if (node.type === 'symbol' && constant(node.name) === undefined) names.add(node.name)
    children(node).forEach(walk)
  }
  walk(tree)
  return [...names]
}

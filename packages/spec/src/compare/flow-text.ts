import type { SourceNode } from '../parse/source-tree.ts'
import { asScalar } from '../read/keys.ts'

/** A value on one line, as it could be written in braces: to show it and to compare it. */
export const flowText = (node: SourceNode | null): string => {
  if (node === null) return ''
  if (node.node === 'text') return node.text.trim()
  if (node.node === 'list') return `[${node.items.map((item) => inside(item)).join(', ')}]`
  return node.entries.length === 0
    ? '{}'
    : `{ ${node.entries.map(({ key, value }) => `${asScalar(key, true)}: ${inside(value)}`.trimEnd()).join(', ')} }`
}

const inside = (node: SourceNode | null): string =>
  node?.node === 'text' ? asScalar(node.text.trim(), true) : flowText(node)

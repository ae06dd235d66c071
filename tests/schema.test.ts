import { vocabulary } from '@coldfill/sizing'
import { jsonSchema } from '@coldfill/spec'
import { describe, expect, it } from 'vitest'

/** The schema as it is published: with every kind, method, pipe, emitter, building and fixture that this version knows. */
type Node = Readonly<Record<string, unknown>>

const schema = jsonSchema(vocabulary) as Node

const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null && !Array.isArray(value)

/** What stands behind a `$ref`, or the node itself. */
const resolved = (node: Node): Node => {
  const to = node['$ref']
  const found = typeof to === 'string' ? (schema['definitions'] as Node)[to.replace('#/definitions/', '')] : node
  return isNode(found) ? found : {}
}

/** Every place in which a value may stand: keys, entries under names of one's own, items of lists, blocks. */
function* values(node: unknown, at: string): Generator<readonly [string, Node]> {
  if (Array.isArray(node)) for (const [index, item] of node.entries()) yield* values(item, `${at}/${index}`)
  if (!isNode(node)) return
  for (const group of ['properties', 'definitions'])
    for (const [key, each] of Object.entries(isNode(node[group]) ? node[group] : {}))
      if (isNode(each)) yield [`${at}/${group}/${key}`, each]
  for (const key of ['additionalProperties', 'items']) if (isNode(node[key])) yield [`${at}/${key}`, node[key]]
  for (const [key, each] of Object.entries(node))
    if (key !== 'examples' && key !== 'const' && key !== 'if') yield* values(each, `${at}/${key}`)
}

const all = [...values(schema, '#')]

describe('the published schema', () => {
  it('explains every key with a sentence', () => {
    expect(all.length).toBeGreaterThan(300)
    const mute = all.filter(([, node]) => {
      const text = resolved(node)['description']
      return typeof text !== 'string' || !/^\p{L}.*/u.test(text)
    })
    expect(mute.map(([at]) => at)).toEqual([])
  })

  it('gives an example of every key, and none of them is empty', () => {
    const bare = all.filter(([, node]) => {
      const examples = resolved(node)['examples']
      return !Array.isArray(examples) || examples.length === 0 || examples.some((each) => each === '' || each === null)
    })
    expect(bare.map(([at]) => at)).toEqual([])
  })

  it('explains every choice', () => {
    const choices = all.flatMap(([at, node]) =>
      (Array.isArray(node['oneOf']) ? (node['oneOf'] as Node[]) : []).map((choice) => [at, choice] as const),
    )
    expect(choices.length).toBeGreaterThan(100)
    expect(
      choices.filter(([, { description }]) => typeof description !== 'string' || description === '').map(([at]) => at),
    ).toEqual([])
  })
})

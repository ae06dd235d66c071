import { describe, expect, it } from 'vitest'
import { vesselKindNames } from './model/vessel.ts'
import { jsonSchema, schemaId } from './schema.ts'
import { testVocabulary } from './testing.ts'

type Node = Readonly<Record<string, unknown>>

const schema = jsonSchema(testVocabulary) as Node

const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null && !Array.isArray(value)

/** Every schema inside the schema, with the place where it stands. */
function* nodes(node: unknown, at: string): Generator<readonly [string, Node]> {
  if (Array.isArray(node)) for (const [index, item] of node.entries()) yield* nodes(item, `${at}/${index}`)
  if (!isNode(node)) return
  yield [at, node]
  for (const [key, value] of Object.entries(node))
    if (key !== 'examples' && key !== 'const') yield* nodes(value, `${at}/${key}`)
}

const all = [...nodes(schema, '#')]

describe('the JSON Schema of the spec', () => {
  it('is draft-07 under its address', () => {
    expect(schema['$schema']).toBe('http://json-schema.org/draft-07/schema#')
    expect(schema['$id']).toBe(schemaId)
    expect(schemaId).toBe('https://localhost/schema/coldfill-1.json')
  })

  it('has a description and an example in every key', () => {
    const keys = all.filter(([at]) => /\/properties\/[^/]+$/u.test(at) && !at.includes('/if/'))
    expect(keys.length).toBeGreaterThan(150)
    expect(
      keys
        .filter(([, node]) => typeof node['description'] !== 'string' || !Array.isArray(node['examples']))
        .map(([at]) => at),
    ).toEqual([])
  })

  it('takes no key that is not described', () => {
    const open = all.filter(
      ([at, node]) =>
        node['type'] === 'object' &&
        node['additionalProperties'] === undefined &&
        !('allOf' in node) &&
        !('if' in node) &&
        at !== '#',
    )
    expect(open.map(([at]) => at)).toEqual([])
  })

  it('refers only to what it defines', () => {
    const definitions = schema['definitions'] as Node
    const names = all.flatMap(([, node]) =>
      typeof node['$ref'] === 'string' ? [node['$ref'].replace('#/definitions/', '')] : [],
    )
    expect(names.filter((name) => !Object.hasOwn(definitions, name))).toEqual([])
    expect(names).toEqual(
      expect.arrayContaining([...vesselKindNames.map((kind) => kind.replaceAll(' ', '-')), 'contents-pipe']),
    )
  })

  it('says each choice with a line that explains it', () => {
    const choices = all.filter(([, node]) => 'oneOf' in node).flatMap(([, node]) => node['oneOf'] as Node[])
    expect(choices.length).toBeGreaterThan(50)
    expect(
      choices.filter((choice) => typeof choice['const'] !== 'string' || typeof choice['description'] !== 'string'),
    ).toEqual([])
  })

  it('offers the methods of the vocabulary', () => {
    const tank = (schema['definitions'] as Node)['expansion-tank'] as Node
    const method = (tank['properties'] as Node)['method'] as Node
    expect((method['oneOf'] as Node[]).map((choice) => choice['const'])).toEqual(['ashrae', 'en 12828', 'code minimum'])
  })
})

import { usualUnits } from '@coldfill/units'
import { parse } from 'yaml'
import { blockDocs, longestMark, markPattern } from './model/block.ts'
import type { Field } from './model/field.ts'
import {
  type BlockShape,
  type BranchShape,
  docOf,
  exampleOf,
  type FieldShape,
  type LeadShape,
  type MapShape,
  type Shape,
} from './model/shape.ts'
import type { Vocabulary } from './model/spec-model.ts'
import { specShape } from './model/spec-shape.ts'

type Schema = { readonly [key: string]: unknown }

export const schemaId = 'https://localhost/schema/coldfill-1.json'

const DRAFT = 'http://json-schema.org/draft-07/schema#'

const choices = (names: Readonly<Record<string, string>>): Schema => ({
  oneOf: Object.entries(names).map(([name, line]) => ({ const: name, description: line })),
})

const typeOf = (field: Field): Schema => {
  if (field.field === 'quantity') return { type: 'string' }
  if (field.field === 'choice') return choices(field.choices)
  if (field.field === 'integer') return { type: 'integer', minimum: field.least }
  if (field.field === 'number')
    return field.least === undefined ? { type: 'number' } : { type: 'number', minimum: field.least }
  // A server that reads YAML 1.1 takes yes and no for booleans.
  if (field.field === 'yes or no') return { enum: ['yes', 'no', true, false] }
  // A project number of digits only is a number to YAML and a text to the spec.
  return { type: ['string', 'number'] }
}

const sentence = (field: Field): string => {
  const units = field.field === 'quantity' ? [...new Set(field.kinds.flatMap((kind) => usualUnits(kind)))] : []
  return [
    field.doc,
    ...(units.length > 0 ? [`Unit: ${units.join(', ')} or another of its kind.`] : []),
    ...(field.fallback === undefined ? [] : [`Left out: ${field.fallback}.`]),
  ].join(' ')
}

/** An example as the value that YAML makes of it. */
const exampleValue = (field: Field): unknown =>
  field.field === 'integer' || field.field === 'number' ? Number(field.example) : field.example

const fieldSchema = ({ field, names }: FieldShape): Schema => ({
  description: sentence(field),
  examples: [exampleValue(field)],
  ...(names && Object.keys(names).length > 0 ? choices(names) : typeOf(field)),
})

const documented = (shape: Shape): Schema => ({ description: docOf(shape), examples: [parse(exampleOf(shape))] })

const nameOf = (words: string): string => words.replaceAll(' ', '-')

/** Writes the schema of a language whose shapes may share definitions. */
const createWriter = () => {
  const definitions: Record<string, Schema> = {}

  const refer = (name: string, shape: BlockShape): Schema => {
    definitions[name] ??= blockSchema(shape)
    return { $ref: `#/definitions/${name}` }
  }

  const blockSchema = (shape: BlockShape): Schema => ({
    ...documented(shape),
    type: 'object',
    additionalProperties: false,
    ...(shape.required.length > 0 && { required: shape.required }),
    properties: Object.fromEntries(Object.entries(shape.keys).map(([key, each]) => [key, schemaOf(each)])),
  })

  const mapSchema = (shape: MapShape): Schema => {
    const names = Object.entries(shape.names ?? {})
    const of = schemaOf(shape.of)
    if (names.length === 0)
      return {
        ...documented(shape),
        type: 'object',
        propertyNames: {
          pattern: markPattern.source.replaceAll('\\p{L}\\p{N}', 'A-Za-z0-9\\u00C0-\\uFFFF'),
          maxLength: longestMark,
        },
        additionalProperties: of,
      }
    return {
      ...documented(shape),
      type: 'object',
      additionalProperties: false,
      properties: Object.fromEntries(names.map(([name, line]) => [name, { ...of, description: line }])),
    }
  }

  /** The first branch whose leading key is there holds. */
  const leadSchema = (shape: LeadShape): Schema => {
    const entries = Object.entries(shape.branches)
    const chain = entries.reduceRight<Schema>(
      (otherwise, [key, branch]) => ({
        if: { required: [key] },
        then: refer(`contents-${key}`, branch),
        else: otherwise,
      }),
      { anyOf: entries.map(([key]) => ({ required: [key] })) },
    )
    return { ...documented(shape), type: 'object', ...chain }
  }

  const branchSchema = (shape: BranchShape): Schema => {
    const by = Object.values(shape.branches)[0]?.keys[shape.by]
    return {
      ...documented(shape),
      type: 'object',
      required: [shape.by],
      properties: by ? { [shape.by]: schemaOf(by) } : {},
      allOf: Object.entries(shape.branches).map(([value, branch]) => ({
        if: { properties: { [shape.by]: { const: value } }, required: [shape.by] },
        then: refer(nameOf(value), branch),
      })),
    }
  }

  const schemaOf = (shape: Shape): Schema => {
    if (shape.shape === 'field') return fieldSchema(shape)
    if (shape.shape === 'block') return blockSchema(shape)
    if (shape.shape === 'map') return mapSchema(shape)
    if (shape.shape === 'list') return { ...documented(shape), type: 'array', items: schemaOf(shape.of) }
    if (shape.shape === 'branch by value') return branchSchema(shape)
    if (shape.shape === 'branch by key') return leadSchema(shape)
    return { ...documented(shape), anyOf: [schemaOf(shape.text), schemaOf(shape.block)] }
  }

  return { blockSchema, definitions }
}

/** The JSON Schema of the spec, for editors that know YAML and not this language. Draft-07, which most of them read. */
export const jsonSchema = (vocabulary: Vocabulary): object => {
  const { blockSchema, definitions } = createWriter()
  const root = blockSchema(specShape(vocabulary))
  const properties = root['properties'] as Readonly<Record<string, Schema>>
  return {
    $schema: DRAFT,
    $id: schemaId,
    title: 'Coldfill spec, version 1',
    ...root,
    properties: { ...properties, coldfill: { description: blockDocs.coldfill, examples: [1], const: 1 } },
    definitions,
  }
}

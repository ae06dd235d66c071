import { blockDocs, overrideFields, selectedRowFields, selectionField, specVersion } from './block.ts'
import { contentKindNames, contentKinds } from './contents.ts'
import { demandFields, fixtureField } from './demand.ts'
import { choice, type Fields, text } from './field.ts'
import { fluidFields } from './fluid.ts'
import { codeFields, projectFields, specSectionField } from './project.ts'
import type { BlockShape, BranchShape, FieldShape, LeadShape, MapShape, Shape } from './shape.ts'
import type { Vocabulary } from './spec-model.ts'
import { pressureFields, systemFields, temperatureFields } from './system.ts'
import { type VesselKind, type VesselKindDefinition, vesselKindNames, vesselKinds } from './vessel.ts'

const fieldShapes = (fields: Fields): Record<string, FieldShape> =>
  Object.fromEntries(Object.entries(fields).map(([key, field]) => [key, { shape: 'field', field }]))

const block = (
  doc: string,
  example: string,
  keys: Readonly<Record<string, Shape>>,
  required: readonly string[] = [],
): BlockShape => ({
  shape: 'block',
  doc,
  example,
  keys,
  required,
})

const requiredIn = (fields: Fields): string[] => Object.keys(fields).filter((key) => fields[key]?.required)

const lines = (names: readonly string[], line: string): Record<string, string> =>
  Object.fromEntries(names.map((name) => [name, line]))

const fluidBlock = block(
  'A fluid by what it is made of and how strong it is.',
  '{ base: propylene glycol, strength: 30 % vol }',
  fieldShapes(fluidFields),
  requiredIn(fluidFields),
)

const selectionShape: Shape = {
  shape: 'either',
  doc: blockDocs.selection,
  example: 'auto',
  text: { shape: 'field', field: selectionField },
  block: block(
    'A row of the catalogue.',
    '{ maker: Northbeck, model: NB-400 }',
    fieldShapes(selectedRowFields),
    requiredIn(selectedRowFields),
  ),
}

const kindLine = (kind: VesselKind, vocabulary: Vocabulary): string =>
  vocabulary.kinds.includes(kind)
    ? vesselKinds[kind].doc
    : `${vesselKinds[kind].doc} This version does not size it yet.`

const vesselShape = (kind: VesselKind, vocabulary: Vocabulary, kindShape: FieldShape): BlockShape => {
  const { doc, example, fields }: VesselKindDefinition = vesselKinds[kind]
  const { method, ...others } = fields
  const offered = vocabulary.methods[kind]
  const methodShape: Record<string, Shape> = method
    ? { method: { shape: 'field', field: method, ...(offered && { names: offered }) } }
    : {}
  return block(doc, example, { kind: kindShape, ...methodShape, ...fieldShapes(others), selection: selectionShape }, [
    'kind',
    ...requiredIn(fields),
  ])
}

const vesselsShape = (vocabulary: Vocabulary): MapShape => {
  const kinds = Object.fromEntries(vesselKindNames.map((kind) => [kind, kindLine(kind, vocabulary)]))
  const kindShape: FieldShape = {
    shape: 'field',
    field: choice(kinds, blockDocs.kind, 'expansion tank', { required: true }),
  }
  const vessel: BranchShape = {
    shape: 'branch by value',
    doc: 'A vessel by its mark.',
    example: vesselKinds['expansion tank'].example,
    by: 'kind',
    branches: Object.fromEntries(vesselKindNames.map((kind) => [kind, vesselShape(kind, vocabulary, kindShape)])),
  }
  return {
    shape: 'map',
    doc: blockDocs.vessels,
    example: '{ ET-1: { kind: expansion tank } }',
    of: vessel,
    exampleKey: 'ET-1',
  }
}

const contentsShape = (vocabulary: Vocabulary): Shape => {
  const names: Readonly<Record<string, FieldShape>> = {
    pipe: {
      shape: 'field',
      field: contentKinds.pipe.fields.pipe,
      names: lines(Object.keys(vocabulary.pipes), 'a family of the pipe table'),
    },
    size: { shape: 'field', field: contentKinds.pipe.fields.size, refersTo: 'pipe size' },
    estimate: { shape: 'field', field: contentKinds.estimate.fields.estimate, names: vocabulary.emitters },
  }
  const branches = Object.fromEntries(
    contentKindNames.map((kind) => {
      const { doc, example, fields }: { doc: string; example: string; fields: Fields } = contentKinds[kind]
      const keys = Object.fromEntries(
        Object.entries(fieldShapes(fields)).map(([key, shape]) => [key, names[key] ?? shape]),
      )
      return [kind, block(doc, example, keys, [...new Set([kind, ...requiredIn(fields)])])]
    }),
  )
  const line: LeadShape = {
    shape: 'branch by key',
    doc: 'What holds the water.',
    example: contentKinds.equipment.example,
    branches,
  }
  return { shape: 'list', doc: blockDocs.contents, example: `[${contentKinds.equipment.example}]`, of: line }
}

const demandShape = (vocabulary: Vocabulary): BlockShape =>
  block(blockDocs.demand, '{ building: apartment house, fixtures: { lavatory: 60, shower: 30 } }', {
    ...fieldShapes(demandFields),
    building: {
      shape: 'field',
      field: demandFields.building,
      names: lines(vocabulary.buildings, 'a row of the table of hot water demand'),
    },
    fixtures: {
      shape: 'map',
      doc: blockDocs.fixtures,
      example: '{ lavatory: 60, shower: 30 }',
      of: { shape: 'field', field: fixtureField },
      exampleKey: 'lavatory',
      names: lines(vocabulary.fixtures, 'a fixture of the table of hot water demand'),
    },
  })

const systemShape = (vocabulary: Vocabulary): BlockShape =>
  block(
    'A system of the building by its id.',
    '{ title: Heating water, service: heating water, vessels: { ET-1: { kind: expansion tank } } }',
    {
      ...fieldShapes(systemFields),
      fluid: {
        shape: 'either',
        doc: blockDocs.fluid,
        example: 'glycol-30',
        text: { shape: 'field', field: text(blockDocs.fluid, 'glycol-30', { fallback: 'water' }), refersTo: 'fluid' },
        block: fluidBlock,
      },
      temperatures: block(
        blockDocs.temperatures,
        '{ fill: 50 °F, low: 50 °F, high: 180 °F }',
        fieldShapes(temperatureFields),
      ),
      pressure: block(
        blockDocs.pressure,
        '{ static-height: 42 ft, relief-valve: 30 psi }',
        fieldShapes(pressureFields),
      ),
      contents: contentsShape(vocabulary),
      demand: demandShape(vocabulary),
      vessels: vesselsShape(vocabulary),
    },
    requiredIn(systemFields),
  )

const assumptionsShape = (vocabulary: Vocabulary): MapShape => ({
  shape: 'map',
  doc: blockDocs.assumptions,
  example: "{ relief-margin.hydronic: { value: 10 %, reason: 'Owner''s standard, section 5.2' } }",
  of: block(
    'What replaces a documented default.',
    "{ value: 10 %, reason: 'Owner''s standard, section 5.2' }",
    fieldShapes(overrideFields),
    requiredIn(overrideFields),
  ),
  exampleKey: 'relief-margin.hydronic',
  names: Object.fromEntries(
    Object.entries(vocabulary.assumptions).map(([id, { name, value, because }]) => [
      id,
      `${name}: ${value}. ${because}`,
    ]),
  ),
})

const shapes = new WeakMap<Vocabulary, BlockShape>()

/** The whole language: from it come completion, hover, schema and reference. The same object for the same vocabulary. */
export const specShape = (vocabulary: Vocabulary): BlockShape => {
  const shape = shapes.get(vocabulary) ?? languageShape(vocabulary)
  shapes.set(vocabulary, shape)
  return shape
}

const languageShape = (vocabulary: Vocabulary): BlockShape =>
  block(
    'A spec says what the building has. It never says how big a vessel is.',
    'coldfill: 1',
    {
      coldfill: {
        shape: 'field',
        field: choice({ [specVersion]: 'the version described here' }, blockDocs.coldfill, specVersion, {
          required: true,
        }),
      },
      project: block(blockDocs.project, '{ number: FC-241, title: Fernhollow Community Clinic }', {
        ...fieldShapes(projectFields),
        codes: block(blockDocs.codes, '{ plumbing: UPC 2024, mechanical: IMC 2021 }', fieldShapes(codeFields)),
        'spec-sections': {
          shape: 'map',
          doc: blockDocs['spec-sections'],
          example: '{ expansion tank: 23 21 16 }',
          of: { shape: 'field', field: specSectionField },
          exampleKey: 'expansion tank',
          names: Object.fromEntries(vesselKindNames.map((kind) => [kind, vesselKinds[kind].doc])),
        },
      }),
      fluids: {
        shape: 'map',
        doc: blockDocs.fluids,
        example: `{ glycol-30: ${fluidBlock.example} }`,
        of: fluidBlock,
        exampleKey: 'glycol-30',
      },
      assumptions: assumptionsShape(vocabulary),
      systems: {
        shape: 'map',
        doc: blockDocs.systems,
        example: '{ HWS: { service: heating water } }',
        of: systemShape(vocabulary),
        exampleKey: 'HWS',
      },
    },
    ['coldfill'],
  )

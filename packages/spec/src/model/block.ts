import { choice, text } from './field.ts'

/** What the blocks of a spec are for, said once for completion, hover, schema and reference. */
export const blockDocs = {
  coldfill: 'Version of the spec language. It comes first.',
  project: 'What the title block and the schedules say about the project.',
  codes: 'Codes that the project adopts. They decide which limits apply and are cited.',
  'spec-sections': 'Section of the specification for each kind of vessel, as typed.',
  fluids: 'Fluids that several systems share, by an id of your own.',
  fluid: 'What fills the system: `water`, the id of a fluid, or a fluid inline.',
  assumptions: 'Documented defaults that this project replaces. A reason is always given.',
  systems: 'Systems of the building by the ids that stand on the drawings.',
  temperatures: 'Temperatures of the water in the system.',
  pressure: 'Pressures and heights of the system.',
  contents: 'What holds the water: a list of equipment, pipes, estimates and known volumes.',
  demand: 'Demand for hot water.',
  fixtures: 'Fixtures that draw hot water, each with its number.',
  vessels: 'Vessels of the system by the marks that stand on the drawings.',
  kind: 'What kind of vessel it is. It decides which other keys the vessel has.',
  selection:
    'Which row of the catalogue is taken: `auto` the smallest that does, `none` no row, or a row by maker and model.',
} as const

export const specVersion = '1'

export const overrideFields = {
  value: { ...text('The value to use instead of the default.', '10 %'), required: true as const },
  reason: {
    ...text('Why the default does not hold here. It is printed.', "Owner's standard, section 5.2"),
    required: true as const,
  },
}

export const selectionWords = {
  auto: 'the smallest row of the catalogue that satisfies every condition',
  none: 'no row: the vessel is sized and not selected',
} as const

export const selectionField = choice(selectionWords, blockDocs.selection, 'auto', { fallback: 'auto' })

export const selectedRowFields = {
  maker: { ...text('Maker of the row, as the catalogue names it.', 'Northbeck'), required: true as const },
  model: { ...text('Model of the row, as the catalogue names it.', 'NB-400'), required: true as const },
}

/** Stands where a value is still to be filled in. It is never read as a value. */
export const placeholder = '…'

export const isPlaceholder = (text: string): boolean => text === placeholder || text === '...'

/** Ids and marks: letters and digits, parted by hyphens, underscores or slashes. They are parts of paths, so they hold no dot or space. */
export const markPattern = /^[\p{L}\p{N}](?:[\p{L}\p{N}_-]*[\p{L}\p{N}])?$/u

export const longestMark = 40

import { choice, type Fields, integer, quantity, text } from './field.ts'

const note = text('A remark on where the content is known from.', 'air-handler coils, from the coil schedule')

const material = choice(
  { steel: 'grows as steel', copper: 'grows as copper', none: 'its growth is not credited' },
  'What the equipment is made of. Where it is said its growth with heat is credited.',
  'steel',
)

/** A line of `contents:` is one of these; the key of the same name tells which. Earlier kinds win where two keys stand together. */
export const contentKinds = {
  equipment: {
    doc: 'Equipment with a known content.',
    example: '{ equipment: Boilers B-1 and B-2, volume: 24 gal, count: 2, material: steel }',
    fields: {
      equipment: text('What holds the water, by its name or mark.', 'Boilers B-1 and B-2'),
      volume: quantity(['volume'], 'Content of one.', '24 gal', { required: true, positive: true }),
      count: integer(1, 'How many of them there are.', '2', { fallback: '1' }),
      material,
      note,
    },
  },
  pipe: {
    doc: 'Piping of one family and size. Its content comes from the inside diameter.',
    example: '{ pipe: copper type L, size: 2 in, length: 640 ft }',
    fields: {
      pipe: text('Family and type of the pipe, as in the pipe table.', 'copper type L'),
      size: { ...text('Size of the pipe, as its family names it.', '2 in'), required: true as const },
      length: quantity(['length'], 'Length of the pipe, supply and return together.', '640 ft', {
        required: true,
        positive: true,
      }),
      note,
    },
  },
  estimate: {
    doc: 'An estimate of the content from the output. Each class is an assumption.',
    example: '{ estimate: convectors, output: 400 MBH }',
    fields: {
      estimate: text('Class of emitter or plant with a documented content for each unit of output.', 'convectors'),
      output: quantity(['power'], 'Design output of all of them.', '400 MBH', { required: true, positive: true }),
      note,
    },
  },
  volume: {
    doc: 'A content known from elsewhere.',
    example: '{ volume: 120 gal, note: "air-handler coils, from the coil schedule" }',
    fields: {
      volume: quantity(['volume'], 'The content.', '120 gal', { required: true, positive: true }),
      material,
      note,
    },
  },
} satisfies Record<string, { readonly doc: string; readonly example: string; readonly fields: Fields }>

export type ContentKind = keyof typeof contentKinds

export const contentKindNames = Object.keys(contentKinds) as readonly ContentKind[]

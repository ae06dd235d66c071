import { linkEmitter, linkPipeFamily, linkPipeSize } from '../link/pipe.ts'
import { type ContentKind, contentKindNames, contentKinds } from '../model/contents.ts'
import type { Range } from '../finding.ts'
import type { Located } from '../model/field.ts'
import type { ContentLine, Material } from '../model/spec-model.ts'
import type { At } from '../report.ts'
import { type Block, type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './context.ts'
import { readFields } from './field.ts'
import { nearest, oneOf } from './nearest.ts'
import { expectBlock, expectList } from './shape.ts'

const EXAMPLE = 'contents: [{ equipment: Boilers B-1 and B-2, volume: 24 gal, count: 2 }]'

const kindOf = (block: Block): ContentKind | undefined =>
  contentKindNames.find((kind) => block.map.entries.some((entry) => entry.key === kind))

const unclear = (context: Context, block: Block): void => {
  const [first] = entriesOf(block)
  const near = first && nearest(first.key, contentKindNames)
  context.report.add('CF-S043', first ? keyAt(first) : block, {
    message: 'This line does not say what holds the water.',
    hint: `${near === undefined ? '' : `Did you mean \`${near}\`? `}Begin it with ${oneOf(contentKindNames)}.`,
    fixes: first && near !== undefined ? [{ title: `Write ${near}`, span: first.keySpan, text: near }] : [],
  })
}

const OWNERS: Readonly<Record<ContentKind, string>> = {
  equipment: 'A line of equipment',
  pipe: 'A line of pipe',
  estimate: 'An estimate',
  volume: 'A known volume',
}

/** What a line of one kind is read from. */
interface Line {
  readonly context: Context
  readonly block: Block
  readonly unknown: { readonly owner: string; readonly elsewhere: (key: string) => string | undefined }
  readonly where: { readonly path: string; readonly range: Range }
}

const at = (block: Block, key: string): At => {
  const found = entryOf(block, key)
  return found ? valueAt(found) : block
}

const optional = (read: {
  readonly note?: Located<string> | undefined
  readonly material?: Located<Material> | undefined
}): { note?: string; material?: Material } => ({
  ...(read.note && { note: read.note.value }),
  ...(read.material && { material: read.material.value }),
})

const readers: Readonly<Record<ContentKind, (line: Line) => ContentLine | undefined>> = {
  equipment: ({ context, block, unknown, where }) => {
    const read = readFields(context, block, contentKinds.equipment.fields, unknown)
    if (!read.equipment || !read.volume) return undefined
    const name = read.equipment.value
    return { ...where, ...optional(read), holds: 'equipment', name, volume: read.volume, count: read.count?.value ?? 1 }
  },
  pipe: ({ context, block, unknown, where }) => {
    const read = readFields(context, block, contentKinds.pipe.fields, unknown)
    const family = read.pipe && linkPipeFamily(context, at(block, 'pipe'), read.pipe.value)
    if (family === undefined || !read.size) return undefined
    const size = linkPipeSize(context, at(block, 'size'), family, read.size.value)
    if (size === undefined || !read.length) return undefined
    const { note } = optional(read)
    return { ...where, ...(note !== undefined && { note }), holds: 'pipe', family, size, length: read.length }
  },
  estimate: ({ context, block, unknown, where }) => {
    const read = readFields(context, block, contentKinds.estimate.fields, unknown)
    const emitter = read.estimate && linkEmitter(context, at(block, 'estimate'), read.estimate.value)
    if (emitter === undefined || !read.output) return undefined
    const { note } = optional(read)
    return { ...where, ...(note !== undefined && { note }), holds: 'estimate', emitter, output: read.output }
  },
  volume: ({ context, block, unknown, where }) => {
    const read = readFields(context, block, contentKinds.volume.fields, unknown)
    return read.volume ? { ...where, ...optional(read), holds: 'volume', volume: read.volume } : undefined
  },
}

const elsewhere = (key: string): string | undefined => {
  const owner = contentKindNames.find((other) => Object.hasOwn(contentKinds[other].fields, key))
  return owner === undefined
    ? undefined
    : `It belongs to a line that begins with \`${owner}\`. One line holds one thing.`
}

/** Undefined where the line was not understood; a finding says why. */
const readLine = (context: Context, entry: Entry): ContentLine | undefined => {
  const block = expectBlock(context, entry, EXAMPLE)
  if (!block) return undefined
  const kind = kindOf(block)
  if (!kind) {
    unclear(context, block)
    return undefined
  }
  const where = { path: block.path, range: context.report.lineIndex.range(at(block, kind).span) }
  return readers[kind]({ context, block, unknown: { owner: OWNERS[kind], elsewhere }, where })
}

/** `contents:` of a system; the lines that were understood. */
export const readContents = (context: Context, entry: Entry | undefined): readonly ContentLine[] =>
  entry ? expectList(context, entry, EXAMPLE).flatMap((item) => readLine(context, item) ?? []) : []

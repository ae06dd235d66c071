import type { Range } from '../finding.ts'
import type { Span } from '../parse/line-index.ts'
import { indexLines } from '../parse/line-index.ts'
import { treeForHelp } from '../parse/recent.ts'
import { below, entryOf, type SourceEntry, type SourceMap } from '../parse/source-tree.ts'
import { textBehind } from './shape-at.ts'

/** A part of the building that a person looks for in a long spec. */
export interface OutlineItem {
  readonly sort: 'building' | 'fluid' | 'system' | 'vessel'
  /** Id or mark; the number of the project for the building. */
  readonly name: string
  /** Title of the building, title or service of a system, kind of a vessel, make-up of a fluid. Empty where not said. */
  readonly detail: string
  readonly path: string
  /** The name alone. */
  readonly range: Range
  /** The name with everything that belongs to it. */
  readonly extent: Range
  readonly children: readonly OutlineItem[]
}

interface Part {
  readonly name: string
  readonly path: string
  readonly map: SourceMap | null
  readonly keySpan: Span
  readonly extent: Span
}

const partsOf = (map: SourceMap | null, key: string, path: string): Part[] => {
  const value = map ? entryOf(map, key)?.value : undefined
  if (value?.node !== 'map') return []
  const at = below(path, key)
  return value.entries.map((entry: SourceEntry) => ({
    name: entry.key,
    path: below(at, entry.key),
    map: entry.value?.node === 'map' ? entry.value : null,
    keySpan: entry.keySpan,
    extent: { start: entry.keySpan.start, end: Math.max(entry.keySpan.end, entry.value?.span.end ?? 0) },
  }))
}

/**
 * The building with its fluids and systems, and the systems with their vessels, in the order of the text. It is drawn of a text
 * with mistakes too, as far as that can be read. Null where nothing can be read.
 */
export const outlineOf = (text: string): OutlineItem | null => {
  const tree = treeForHelp(text)
  if (!tree) return null
  const lines = indexLines(text)
  const trimmed = ({ start, end }: Span): Range => {
    const source = text.slice(start, end)
    return lines.range({ start, end: start + source.trimEnd().length })
  }
  const item = (
    sort: OutlineItem['sort'],
    { name, path, keySpan, extent }: Omit<Part, 'map'>,
    detail: string,
    children: readonly OutlineItem[] = [],
  ): OutlineItem => ({ sort, name, detail, path, range: lines.range(keySpan), extent: trimmed(extent), children })

  const fluids = partsOf(tree, 'fluids', '').map((part) =>
    item(
      'fluid',
      part,
      [textBehind(part.map, 'base'), textBehind(part.map, 'strength')].filter((each) => each !== undefined).join(', '),
    ),
  )
  const systems = partsOf(tree, 'systems', '').map((part) =>
    item(
      'system',
      part,
      textBehind(part.map, 'title') ?? textBehind(part.map, 'service') ?? '',
      partsOf(part.map, 'vessels', part.path).map((vessel) =>
        item('vessel', vessel, textBehind(vessel.map, 'kind') ?? ''),
      ),
    ),
  )
  const project = entryOf(tree, 'project')
  const start = tree.entries[0]?.keySpan ?? { start: 0, end: 0 }
  return item(
    'building',
    {
      name: textBehind(project?.value, 'number') ?? '',
      path: project ? 'project' : '',
      keySpan: project?.keySpan ?? start,
      extent: { start: start.start, end: text.length },
    },
    textBehind(project?.value, 'title') ?? '',
    [...fluids, ...systems],
  )
}

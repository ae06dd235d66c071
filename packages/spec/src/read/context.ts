import type { Vocabulary } from '../model/spec-model.ts'
import type { Span } from '../parse/line-index.ts'
import { below, type SourceEntry, type SourceMap, type SourceNode } from '../parse/source-tree.ts'
import type { At, Report } from '../report.ts'

/** What every reader needs. */
export interface Context {
  readonly text: string
  readonly report: Report
  readonly vocabulary: Vocabulary
  /** Paths that a misspelled key most likely meant: they are not said to be missing as well. */
  readonly meant: Set<string>
}

/** A key with its value and path. */
export interface Entry {
  readonly key: string
  /** What a person calls it, where it is an item of a list and has no key. */
  readonly label?: string
  readonly path: string
  readonly keySpan: Span
  readonly value: SourceNode | null
}

/** A map behind a key, an id or a mark. `span` is the key, which is underlined where the whole block is meant. */
export interface Block extends At {
  readonly map: SourceMap
}

export const entriesOf = (block: Block): readonly Entry[] => block.map.entries.map((entry) => entryIn(block, entry))

export const entryOf = (block: Block, key: string): Entry | undefined => {
  const found = block.map.entries.find((entry) => entry.key === key)
  return found && entryIn(block, found)
}

const entryIn = (block: Block, { key, keySpan, value }: SourceEntry): Entry => ({
  key,
  path: below(block.path, key),
  keySpan,
  value,
})

/** What is underlined for a value: the text itself; the key where the value is a block or is missing. */
export const valueAt = (entry: Entry): At => ({
  path: entry.path,
  span: entry.value?.node === 'text' ? entry.value.span : entry.keySpan,
})

export const keyAt = (entry: Entry): At => ({ path: entry.path, span: entry.keySpan })

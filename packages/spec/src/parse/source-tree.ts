import type { Span } from './line-index.ts'

/** A text as it stands in the source: `010` stays `010`, `~` stays `~`. */
export interface SourceText {
  readonly node: 'text'
  readonly text: string
  readonly quoted: boolean
  /** Written in braces without quotes, with a comma in it. */
  readonly comma?: true
  readonly span: Span
}

export interface SourceEntry {
  readonly key: string
  readonly keySpan: Span
  /** Null where nothing is written behind the key. */
  readonly value: SourceNode | null
}

/** Entries in order; of keys that stand twice the first. */
export interface SourceMap {
  readonly node: 'map'
  readonly entries: readonly SourceEntry[]
  /** Written in braces. */
  readonly flow: boolean
  readonly span: Span
}

export interface SourceList {
  readonly node: 'list'
  readonly items: readonly (SourceNode | null)[]
  readonly flow: boolean
  readonly span: Span
}

export type SourceNode = SourceText | SourceMap | SourceList

export const entryOf = (map: SourceMap, key: string): SourceEntry | undefined =>
  map.entries.find((entry) => entry.key === key)

/** Path of a key below `path`. */
export const below = (path: string, key: string | number): string => (path === '' ? `${key}` : `${path}.${key}`)

/** Whether `path` is `ancestor` or lies in it. */
export const isWithin = (path: string, ancestor: string): boolean =>
  ancestor === '' || path === ancestor || path.startsWith(`${ancestor}.`)

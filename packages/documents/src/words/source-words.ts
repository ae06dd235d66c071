import type { ProjectResult } from '@coldfill/sizing'
import { pathWords } from './path-words.ts'

type Vessel = ProjectResult['vessels'][number]
export type TraceEntry = Vessel['trace'][number]['entries'][number]
type Citation = Extract<TraceEntry, { entry: 'step' }>['source']
type Origin = Extract<TraceEntry, { entry: 'input' }>['origin']

export const FROM_MEMORY = 'from memory; verify against the adopted edition'

/** A source of the result with the number under which the list of sources has it. */
export interface NumberedSource {
  /** `S3` */
  readonly number: string
  /** Publisher, or the title where nobody published it. */
  readonly short: string
  readonly title: string
  readonly publisher: string
  readonly edition: string
}

const given = (text: string): string => (text === 'none' ? '' : text)

/** Every source that the result cites, numbered in the order in which the result lists them. */
export const numberedSources = (result: ProjectResult): ReadonlyMap<string, NumberedSource> =>
  new Map(
    Object.entries(result.sources).map(([id, { title, edition, publisher }], index) => [
      id,
      {
        number: `S${index + 1}`,
        short: given(publisher) || title,
        title,
        publisher: given(publisher),
        edition: given(edition),
      },
    ]),
  )

/** `ASHRAE [S3], expansion tank equations`, and a word of warning where nobody had the page at hand. */
export const citationWords = (citation: Citation, result: ProjectResult, memory = FROM_MEMORY): string => {
  const source = numberedSources(result).get(citation.source)
  const name = source ? `${source.short} [${source.number}]` : citation.source
  const words = citation.locator ? `${name}, ${citation.locator}` : name
  return citation.fromMemory ? `${words} (${memory})` : words
}

/** Where the value of an input comes from, as a reader can follow it. */
export const originWords = (origin: Origin, result: ProjectResult): string => {
  switch (origin.from) {
    case 'spec':
      return `spec: ${pathWords(origin.path)}`
    case 'assumption': {
      const assumption = result.assumptions.find((candidate) => candidate.id === origin.id)
      return assumption ? `assumption ${assumption.number}: ${assumption.name}` : `assumption ${origin.id}`
    }
    case 'table':
      return citationWords(origin.citation, result, 'from memory')
    case 'catalogue':
    default:
      return 'catalogue row of the chosen vessel'
  }
}

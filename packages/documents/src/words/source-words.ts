import type { ProjectResult } from '@coldfill/sizing'

type Vessel = ProjectResult['vessels'][number]
export type TraceEntry = Vessel['trace'][number]['entries'][number]
type Citation = Extract<TraceEntry, { entry: 'step' }>['source']
type Origin = Extract<TraceEntry, { entry: 'input' }>['origin']

const FROM_MEMORY = 'from memory; verify against the adopted edition'

/** `ASHRAE Handbook 2020, chapter 13`, and the warning where nobody had the page at hand. */
export const citationWords = (citation: Citation, result: ProjectResult): string => {
  const source = result.sources[citation.source]
  const title = source ? [source.title, source.edition].filter(Boolean).join(' ') : citation.source
  const words = citation.locator ? `${title}, ${citation.locator}` : title
  return citation.fromMemory ? `${words} (${FROM_MEMORY})` : words
}

/** Where the value of an input comes from, as a reader can follow it. */
export const originWords = (origin: Origin, result: ProjectResult): string => {
  switch (origin.from) {
    case 'spec':
      return `spec: ${origin.path}`
    case 'assumption': {
      const assumption = result.assumptions.find((candidate) => candidate.id === origin.id)
      return assumption ? `assumption ${assumption.number}: ${assumption.name}` : `assumption ${origin.id}`
    }
    case 'table':
      return citationWords(origin.citation, result)
    case 'catalogue':
      return 'catalogue row of the chosen vessel'
  }
}

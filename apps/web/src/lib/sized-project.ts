import type { ProjectResult } from '@coldfill/contract'

export type Vessel = ProjectResult['vessels'][number]
export type System = ProjectResult['systems'][number]
export type TraceSection = Vessel['trace'][number]
export type TraceEntry = TraceSection['entries'][number]
export type TraceStep = Extract<TraceEntry, { entry: 'step' }>
export type TraceInput = Extract<TraceEntry, { entry: 'input' }>
export type UsedAssumption = ProjectResult['assumptions'][number]
export type Finding = ProjectResult['findings'][number]

/** A citation in words: title, edition, locator, and the warning of one given from memory. */
export const citationWords = (
  citation: { readonly source: string; readonly locator: string; readonly fromMemory?: true | undefined },
  sources: Readonly<Record<string, { readonly title: string; readonly edition: string }>>,
): string => {
  const source = sources[citation.source]
  const title = source
    ? [source.title, source.edition].filter((part) => part !== '' && part !== 'none').join(', ')
    : citation.source
  const memory = citation.fromMemory ? ' (from memory; verify against the adopted edition)' : ''
  return `${[title, citation.locator].filter(Boolean).join(', ')}${memory}`
}

import type { Outcome, ProjectState, RevisionState } from '@coldfill/contract'
import { capital } from './format.ts'

const states: Partial<Record<ProjectState | RevisionState, string>> = {
  revise: 'Revise and resubmit',
  'in review': 'Issued for review',
}

/** The word of a state as it stands in the title strip and in tables. */
export const stateWord = (state: ProjectState | RevisionState): string => states[state] ?? capital(state)

/** Good, bad or neither: never shown by colour alone, the word stands beside it. */
export const stateTone = (state: ProjectState | RevisionState): 'good' | 'held' | 'plain' => {
  if (state === 'accepted' || state === 'issued for construction') return 'good'
  if (state === 'revise' || state === 'rejected' || state === 'withdrawn') return 'held'
  return 'plain'
}

export const outcomeTone = (outcome: Outcome): 'good' | 'held' | 'plain' =>
  outcome === 'accepted' || outcome === 'accepted_noted' ? 'good' : outcome === 'information' ? 'plain' : 'held'

/** A revision inside a sentence: "the first issue", "Rev B". */
export const revisionPhrase = (label: string): string => (label === '' ? 'the first issue' : `Rev ${label}`)

/** What a set of files lacks, and why; null where it lacks nothing. */
export const missingWords = ({
  noPages,
  noPdf,
}: {
  readonly noPages: string | null
  readonly noPdf: string | null
}): string | null => {
  const pages = 'The contents list of the submittal has no page numbers'
  if (noPages !== null && noPages === noPdf)
    return `There is no PDF, and the contents list of the submittal has no page numbers. ${noPdf}`
  return (
    [
      ...(noPdf === null ? [] : [`There is no PDF. ${noPdf}`]),
      ...(noPages === null ? [] : [`${pages}. ${noPages}`]),
    ].join(' ') || null
  )
}

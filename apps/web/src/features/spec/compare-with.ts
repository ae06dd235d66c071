import { revisionSegment, revisionTitle, type Project } from '@coldfill/contract'
import type { SpecDraft } from './use-spec-draft.ts'

/** What the text in the editor is set beside. */
export type CompareWith =
  | { readonly with: 'saved' }
  /** What somebody saved meanwhile. */
  | { readonly with: 'theirs' }
  | { readonly with: 'draft'; readonly slot: string }
  | { readonly with: 'revision'; readonly segment: string }

export interface ComparedText {
  readonly title: string
  readonly text: string
}

/** The other text; null where there is none any more, undefined for a revision, which the server has. */
export const otherText = (compared: CompareWith, draft: SpecDraft): ComparedText | null | undefined => {
  if (compared.with === 'revision') return undefined
  if (compared.with === 'draft') {
    const kept = draft.offered.find((each) => each.slot === compared.slot)
    return kept ? { title: 'Kept draft', text: kept.text } : null
  }
  const theirs = compared.with === 'theirs' ? (draft.conflict ?? draft.merged?.theirs ?? null) : draft.base
  return theirs ? { title: `Saved version ${theirs.version}`, text: theirs.text } : null
}

interface Choice {
  readonly value: string
  readonly label: string
  readonly compared: CompareWith
}

/** Everything that the text can be set beside. */
export const compareChoices = (draft: SpecDraft, project: Project): readonly Choice[] => {
  const theirs = draft.conflict ?? draft.merged?.theirs
  return [
    ...(theirs
      ? [
          {
            value: 'theirs',
            label: `Version ${theirs.version}, saved meanwhile`,
            compared: { with: 'theirs' as const },
          },
        ]
      : []),
    { value: 'saved', label: `Saved version ${draft.base.version}`, compared: { with: 'saved' } },
    ...draft.offered.map((each, at) => ({
      value: `draft ${each.slot}`,
      label: draft.offered.length > 1 ? `Kept draft ${at + 1}` : 'Kept draft',
      compared: { with: 'draft' as const, slot: each.slot },
    })),
    ...project.revisions.map(({ label }) => ({
      value: `revision ${revisionSegment(label)}`,
      label: revisionTitle(label),
      compared: { with: 'revision' as const, segment: revisionSegment(label) },
    })),
  ]
}

export const choiceOf = (compared: CompareWith): string => {
  if (compared.with === 'draft') return `draft ${compared.slot}`
  return compared.with === 'revision' ? `revision ${compared.segment}` : compared.with
}

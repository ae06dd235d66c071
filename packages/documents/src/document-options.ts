import type { verificationRows } from '@coldfill/engine'
import type { UnitSystem } from '@coldfill/units'

/** Fields of the title block. `date` is an ISO date; it also dates the file, so that the same content gives the same bytes. */
export interface TitleBlock {
  readonly office: string
  /** Address and contact of the office, line by line. */
  readonly lines?: readonly string[]
  /** Captions of the three people in the words of the office; Prepared, Checked, Approved where not said. */
  readonly captions?: { readonly prepared: string; readonly checked: string; readonly approved: string }
  readonly preparedBy?: string
  readonly checkedBy?: string
  readonly approvedBy?: string
  readonly date: string
  /** Empty for the first issue, then `A`, `B` … */
  readonly revision: string
  /** `Working copy`, `Issued for review`, `Issued for construction` … */
  readonly status: string
}

/** A row of the revision block. */
export interface RevisionEntry {
  readonly revision: string
  readonly date: string
  readonly purpose: string
  readonly by: string
}

/** What a reviewer decided on this issue. */
export interface DispositionEntry {
  readonly reviewer: string
  /** In the words of the office: `Revise and resubmit`. */
  readonly outcome: string
  readonly reason: string
  readonly date: string
  /** Given on other content than this. */
  readonly stale?: boolean
}

export interface RedlinePerson {
  readonly name: string
  readonly initials: string
}

/** Where a redline stands: `column` is the name of a result, `path` a path of the spec. */
export type RedlineAnchor =
  | { readonly type: 'row'; readonly mark: string }
  | { readonly type: 'cell'; readonly mark: string; readonly column: string }
  | { readonly type: 'assumption'; readonly assumption: string }
  | { readonly type: 'spec'; readonly path: string }

export interface RedlineEntry {
  readonly number: number
  readonly anchor: RedlineAnchor
  /** The value as its author saw it, with its unit; may be empty. */
  readonly quoted: string
  readonly proposedValue: string | null
  readonly mustAnswer: boolean
  readonly state: 'open' | 'closed'
  /** The first message is the redline itself. `at` is an ISO time. */
  readonly messages: readonly { readonly author: RedlinePerson; readonly at: string; readonly text: string }[]
}

/** One result that differs from an earlier issue: SI numbers of `kind`, or words; null where there is none. */
export interface ChangedEntry {
  readonly system: string
  readonly mark: string
  readonly key: string
  readonly name: string
  readonly kind: string
  readonly was: number | string | null
  readonly now: number | string | null
}

/** Who put a value in the place of an assumption. `date` is an ISO date. */
export interface AssumptionChangeEntry {
  readonly assumption: string
  readonly by: string
  readonly date: string
}

/** A picture of the office; pixels say its proportions. */
export interface Logo {
  readonly data: Uint8Array
  readonly type: 'png' | 'jpg'
  readonly width: number
  readonly height: number
}

export interface DocumentOptions {
  readonly units: UnitSystem
  readonly titleBlock: TitleBlock
  /** Newest first, as the revision block shows them. */
  readonly revisions: readonly RevisionEntry[]
  /** SHA-256 of the content that reviewers judge; printed in footers where given. */
  readonly contentHash?: string
  /** Dispositions of the reviewers; the cover keeps blank rows for a pen where none are given. */
  readonly dispositions?: readonly DispositionEntry[]
  /** Outcomes in the words of the office, for the blank rows. */
  readonly outcomes?: readonly string[]
  /** Redlines with their answers, in order of number. */
  readonly redlines?: readonly RedlineEntry[]
  /** Who changed which assumption; the reason stands in the result. */
  readonly assumptionChanges?: readonly AssumptionChangeEntry[]
  /** Results that differ from the issue before this one, whose revision is named. */
  readonly comparison?: { readonly revision: string; readonly changed: readonly ChangedEntry[] }
  /** Why and by whom an issue for construction was made over a gate that did not pass. */
  readonly override?: { readonly reason: string; readonly by: string; readonly date: string }
  readonly logo?: Logo
  /** Cases of the verification manual, run. */
  readonly verification?: ReturnType<typeof verificationRows>
  /** Version of the engine that ran them; that of the result where not said. */
  readonly verifiedWith?: string
  /** Letter for US and A4 for SI where not said. */
  readonly paper?: 'Letter' | 'A4'
}

/** The people of the title block under their captions, also those that stay blank for a pen. */
export const peopleOf = ({
  captions,
  ...titleBlock
}: TitleBlock): readonly (readonly [caption: string, name: string])[] => [
  [captions?.prepared ?? 'Prepared', titleBlock.preparedBy ?? ''],
  [captions?.checked ?? 'Checked', titleBlock.checkedBy ?? ''],
  [captions?.approved ?? 'Approved', titleBlock.approvedBy ?? ''],
]

export const CONSTRUCTION_STATUS = 'Issued for construction'

/** Printed on every page of anything that is not issued for construction; null where it is. */
export const draftWarning = (titleBlock: TitleBlock): string | null =>
  titleBlock.status === CONSTRUCTION_STATUS ? null : `${titleBlock.status.toUpperCase()} – NOT FOR CONSTRUCTION`

/** `Rev B`; the first issue has no letter and says so. */
export const revisionWords = (revision: string): string => (revision === '' ? 'First issue' : `Rev ${revision}`)

/** Midnight UTC of the ISO date. A date that is none is a programmer's mistake and throws. */
export const dateOf = (titleBlock: TitleBlock): Date => {
  const date = new Date(`${titleBlock.date.slice(0, 10)}T00:00:00Z`)
  if (Number.isNaN(date.getTime())) throw new Error(`"${titleBlock.date}" is not an ISO date`)
  return date
}

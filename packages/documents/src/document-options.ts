import type { UnitSystem } from '@coldfill/units'

/** Fields of the title block. `date` is an ISO date; it also dates the file, so that the same content gives the same bytes. */
export interface TitleBlock {
  readonly office: string
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

export interface DocumentOptions {
  readonly units: UnitSystem
  readonly titleBlock: TitleBlock
  /** Newest first, as the revision block shows them. */
  readonly revisions: readonly RevisionEntry[]
  /** SHA-256 of the content that reviewers judge; printed in footers where given. */
  readonly contentHash?: string
  /** Letter for US and A4 for SI where not said. */
  readonly paper?: 'Letter' | 'A4'
}

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
